package coilwright.cli;

import coilwright.material.Catalogue;
import coilwright.problem.Fault;
import coilwright.problem.Problem;
import coilwright.problem.ProblemReader;
import coilwright.problem.Purpose;
import coilwright.problem.Reading;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.stream.Collectors;

/** A problem file named on the command line; "-" is standard input. */
final class ProblemFile {

  /** The largest problem file [bytes]. */
  private static final int LARGEST = 1 << 20;

  private static final String REMEDY = "give the path of a problem file, or - for standard input";

  private final String name;
  private final Terminal terminal;

  /**
   * The file.
   *
   * @param name as typed
   * @param terminal whose standard input "-" means
   */
  ProblemFile(String name, Terminal terminal) {
    this.name = name;
    this.terminal = terminal;
  }

  /**
   * Reads it; every fault in it is one line of the refusal.
   *
   * @param purpose what it is read for
   * @param catalogue the grades it may name
   * @return the problem
   * @throws Refusal if it cannot be read or has faults
   */
  Problem read(Purpose purpose, Catalogue catalogue) {
    Reading reading = ProblemReader.read(bytes(), purpose, catalogue);
    return reading
        .problem()
        .orElseThrow(
            () ->
                Refusal.usage(
                    reading.faults().stream().map(this::line).collect(Collectors.joining("\n"))));
  }

  private String line(Fault fault) {
    return shown() + ": " + PlainText.line(fault.text());
  }

  private byte[] bytes() {
    if (name.isEmpty()) {
      throw Refusal.usage("FILE: its name is empty; " + REMEDY);
    }
    if (!isStandardInput() && !Files.exists(pathOf(name))) {
      throw Refusal.usage(shown() + ": no such file; " + REMEDY);
    }
    if (!isStandardInput() && Files.isDirectory(pathOf(name))) {
      throw Refusal.usage(shown() + ": is a folder; " + REMEDY);
    }
    try (InputStream in = isStandardInput() ? terminal.in() : Files.newInputStream(pathOf(name))) {
      byte[] bytes = in.readNBytes(LARGEST + 1);
      if (bytes.length > LARGEST) {
        throw Refusal.usage(shown() + ": larger than 1 MiB, the most accepted; " + REMEDY);
      }
      return bytes;
    } catch (IOException e) {
      throw Refusal.usage(shown() + ": cannot be read (" + Refusal.reason(e) + "); " + REMEDY);
    }
  }

  private boolean isStandardInput() {
    return name.equals("-");
  }

  /**
   * Whether a path is this very file, whatever name or link leads there.
   *
   * @param other the path
   */
  boolean isAt(Path other) {
    Path path = isStandardInput() ? Path.of("/dev/stdin") : pathOf(name);
    try {
      return Files.exists(path) && Files.exists(other) && Files.isSameFile(path, other);
    } catch (IOException e) {
      return false;
    }
  }

  private String shown() {
    return isStandardInput() ? "standard input" : PlainText.line(name);
  }

  /**
   * A path as typed.
   *
   * @param name as typed
   * @throws Refusal if Java cannot express it, as under a locale that lacks its letters
   */
  static Path pathOf(String name) {
    try {
      return Path.of(name);
    } catch (InvalidPathException e) {
      throw Refusal.usage(
          PlainText.line(name)
              + ": this locale cannot express the file's name; set LC_ALL=C.UTF-8, or rename the"
              + " file");
    }
  }
}
