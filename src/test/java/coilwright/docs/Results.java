package coilwright.docs;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.SortedMap;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.stream.Stream;

/** The files under results/: the output of every file under problems/, as text and as JSON. */
final class Results {

  private static final Path PROBLEMS = Path.of("problems");
  private static final Path FOLDER = Path.of("results");

  /** Written by the benchmark profile; its figures depend on the machine. */
  private static final Path BENCHMARKS = FOLDER.resolve("benchmarks.md");

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

  /** The text and the JSON file of a problem. */
  static List<Path> filesOf(Path problem) {
    String name = PROBLEMS.relativize(problem).toString();
    String stem = name.substring(0, name.lastIndexOf('.'));
    return List.of(FOLDER.resolve(stem + ".txt"), FOLDER.resolve(stem + ".json"));
  }

  private static String content(Path problem, Path file) throws IOException {
    String format = file.toString().endsWith(".json") ? "json" : "text";
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
