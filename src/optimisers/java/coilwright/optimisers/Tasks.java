package coilwright.optimisers;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** The two benchmarks of the literature, and the problem files that a list names. */
final class Tasks {

  private static final Path LIST = Path.of("src/optimisers/resources/optimisers/problems.txt");
  private static final String SANDGREN = "src/test/resources/problems/sandgren-1990.yaml";

  private Tasks() {}

  /**
   * Every task.
   *
   * @throws IOException if the list cannot be read
   */
  static List<Task> all() throws IOException {
    List<Task> tasks = new ArrayList<>();
    tasks.add(new WeightTask());
    tasks.add(SpringTask.leastWire("discrete coil spring (Sandgren)", SANDGREN));
    for (String line : Files.readAllLines(LIST)) {
      if (!line.isBlank() && !line.startsWith("#")) {
        tasks.add(SpringTask.lightest(nameOf(line), line));
      }
    }
    return tasks;
  }

  private static String nameOf(String file) {
    String last = Path.of(file).getFileName().toString();
    return last.substring(0, last.lastIndexOf('.'));
  }
}
