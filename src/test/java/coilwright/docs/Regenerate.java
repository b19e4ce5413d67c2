package coilwright.docs;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.SortedMap;

/**
 * Writes the files under results/ and the quoted parts of README.md afresh, and removes results
 * that no problem file has. A person decides whether what moved should have.
 */
public final class Regenerate {

  private Regenerate() {}

  /**
   * Writes them.
   *
   * @param args not used
   * @throws IOException if a file cannot be read or written
   */
  public static void main(String[] args) throws IOException {
    SortedMap<Path, String> expected = Results.expected();
    for (Map.Entry<Path, String> file : expected.entrySet()) {
      write(file.getKey(), file.getValue());
    }
    for (Path stray : Results.present()) {
      if (!expected.containsKey(stray)) {
        Files.delete(stray);
      }
    }
    write(Readme.PATH, Readme.refreshed(Readme.text()));
  }

  private static void write(Path path, String text) throws IOException {
    if (path.getParent() != null) {
      Files.createDirectories(path.getParent());
    }
    Files.write(path, text.getBytes(StandardCharsets.UTF_8));
  }
}
