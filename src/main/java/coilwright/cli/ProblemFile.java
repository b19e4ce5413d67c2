package coilwright.cli;

import coilwright.material.Catalogue;
import coilwright.problem.Problem;
import coilwright.problem.ProblemReader;
import coilwright.problem.Purpose;
import coilwright.problem.Reading;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;

/** A problem file named on the command line; "-" is standard input. */
final class ProblemFile {

  /** One byte more than a problem file may have: enough to see that it has too many. */
  private static final int MOST_BYTES = 1024 * 1024 + 1;

  private final String name;
  private final Terminal terminal;

  ProblemFile(String name, Terminal terminal) {
    this.name = name;
    this.terminal = terminal;
  }

  /** Reads it; every fault in it is one line of the refusal. */
  Problem read(Purpose purpose, Catalogue catalogue) {
    Reading reading = ProblemReader.read(bytes(), purpose, catalogue);
    if (reading.problem().isPresent()) {
      return reading.problem().get();
    }
    StringBuilder text = new StringBuilder();
    reading
        .faults()
        .forEach(fault -> text.append(shown()).append(": ").append(fault.text()).append('\n'));
    throw Refusal.usage(text.toString().stripTrailing());
  }

  private byte[] bytes() {
    try (InputStream in = isStandardInput() ? terminal.in() : Files.newInputStream(path())) {
      return in.readNBytes(MOST_BYTES);
    } catch (NoSuchFileException e) {
      throw Refusal.usage(
          shown() + ": no such file; give the path of a problem file, or - for standard input");
    } catch (IOException e) {
      throw Refusal.usage(
          shown() + ": cannot be read (" + e.getMessage() + "); give the path of a problem file");
    }
  }

  private boolean isStandardInput() {
    return name.equals("-");
  }

  /** The file's path. */
  Path path() {
    return pathOf(name);
  }

  /** Whether a path is this very file. */
  boolean isAt(Path other) {
    try {
      return !isStandardInput() && Files.exists(other) && Files.isSameFile(path(), other);
    } catch (IOException e) {
      return false;
    }
  }

  private String shown() {
    return isStandardInput() ? "standard input" : name;
  }

  /** A path as typed; under some locales Java cannot express it. */
  static Path pathOf(String name) {
    try {
      return Path.of(name);
    } catch (InvalidPathException e) {
      throw Refusal.usage(
          name
              + ": this locale cannot express the file's name; set LC_ALL=C.UTF-8 or rename the file");
    }
  }
}
