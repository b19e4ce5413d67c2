package coilwright.docs;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.stream.Stream;

/**
 * The files under results/: the output of every file under problems/, as text and as JSON, and of
 * some as CSV.
 */
final class Results {

  private static final Path PROBLEMS = Path.of("problems");
  private static final Path FOLDER = Path.of("results");

  /** Written by the benchmark profile; its figures depend on the machine. */
  private static final Path BENCHMARKS = FOLDER.resolve("benchmarks.md");

  /** Problems that CSV is shown of: a shortlist, a check, and a shortlist in inches. */
  private static final List<String> AS_CSV =
      List.of("check-valve", "check-valve-offer", "mist-nozzle");

  private Results() {}

  /** The problem files, sorted. */
  static List<Path> problems() throws IOException {
    return List.copyOf(filesUnder(PROBLEMS));
  }

  /** What stands under results/, benchmarks apart. */
  static SortedSet<Path> present() throws IOException {
    SortedSet<Path> files = filesUnder(FOLDER);
    files.remove(BENCHMARKS);
    return files;
  }

  /** What should stand there: each file with its content. */
  static SortedMap<Path, String> expected() throws IOException {
    SortedMap<Path, String> files = new TreeMap<>();
    for (Path problem : problems()) {
      for (Path file : filesOf(problem)) {
        files.put(file, content(problem, file));
      }
    }
    return files;
  }

  /** The files of a problem: text and JSON, and CSV where it is shown. */
  static List<Path> filesOf(Path problem) {
    String name = PROBLEMS.relativize(problem).toString();
    String stem = name.substring(0, name.lastIndexOf('.'));
    List<Path> files = new ArrayList<>();
    files.add(FOLDER.resolve(stem + ".txt"));
    files.add(FOLDER.resolve(stem + ".json"));
    if (AS_CSV.contains(stem)) {
      files.add(FOLDER.resolve(stem + ".csv"));
    }
    return files;
  }

  private static String content(Path problem, Path file) throws IOException {
    String ending = file.toString().substring(file.toString().lastIndexOf('.') + 1);
    String format = ending.equals("txt") ? "text" : ending;
    Printed printed = Printed.by(command(problem), problem.toString(), "--format", format);
    if (printed.out().isEmpty()) {
      throw new IllegalStateException(problem + " gives no result: " + printed.err());
    }
    return printed.out();
  }

  /** A file with a design is for check. */
  static String command(Path problem) throws IOException {
    return Files.readAllLines(problem).contains("design:") ? "check" : "shortlist";
  }

  private static SortedSet<Path> filesUnder(Path folder) throws IOException {
    if (!Files.isDirectory(folder)) {
      return new TreeSet<>();
    }
    try (Stream<Path> files = Files.walk(folder)) {
      return new TreeSet<>(files.filter(Files::isRegularFile).toList());
    }
  }
}
