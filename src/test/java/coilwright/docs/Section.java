package coilwright.docs;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;

/**
 * One part of results/benchmarks.md, from its heading to the next of the same level. Each measuring
 * profile writes its own and leaves the others as they are.
 *
 * @param title the heading without its signs
 */
public record Section(String title) {

  private static final Path FILE = Path.of("results", "benchmarks.md");
  private static final String HEADING = "## ";
  private static final String NEXT = "\n" + HEADING;

  /**
   * Writes the section.
   *
   * @param body what stands under the heading; headings in it are of a lower level
   * @throws IOException if the file cannot be read or written
   */
  public void write(String body) throws IOException {
    String text = new String(Files.readAllBytes(FILE), StandardCharsets.UTF_8);
    Files.write(FILE, replacedIn(text, body).getBytes(StandardCharsets.UTF_8));
  }

  /** A text with the section replaced, or added at the end where it has none. */
  String replacedIn(String text, String body) {
    String section = NEXT + title + "\n\n" + body.strip() + "\n";
    int start = text.indexOf(NEXT + title + "\n");
    if (start < 0) {
      return text.stripTrailing() + "\n" + section;
    }
    int end = text.indexOf(NEXT, start + 1);
    return text.substring(0, start) + section + (end < 0 ? "" : text.substring(end));
  }

  /** The machine a measurement was made on. */
  public static String machine() {
    return System.getProperty("os.name")
        + " "
        + System.getProperty("os.arch")
        + ", "
        + Runtime.getRuntime().availableProcessors()
        + " processors, Java "
        + System.getProperty("java.vm.version");
  }
}
