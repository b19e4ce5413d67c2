package coilwright.published;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;

/**
 * One file of published check values: comment lines {@code # key: words}, a line of column names,
 * then one row a value. Cells hold neither quotes nor commas.
 *
 * @param path of the file under {@code src/test/resources/published}
 * @param header what stands under each key; a key that is repeated has its words joined
 * @param rows the cells of each row by column
 */
public record PublishedFile(
    String path, Map<String, String> header, List<Map<String, String>> rows) {

  private static final List<String> NEEDED =
      List.of("source", "locator", "group", "units", "rounding", "seen or from memory");

  private static final List<PublishedFile> ALL = readAll();

  /** Refuses a file whose header is not complete. */
  public PublishedFile {
    for (String key : NEEDED) {
      if (header.getOrDefault(key, "").isEmpty()) {
        throw new IllegalArgumentException(
            path + ": the header has no line \"# " + key + ": ...\"");
      }
    }
  }

  /** Every file, in the order of their paths. */
  public static List<PublishedFile> all() {
    return ALL;
  }

  private static List<PublishedFile> readAll() {
    try (Stream<Path> files = Files.walk(root())) {
      return files
          .filter(Files::isRegularFile)
          .map(file -> root().relativize(file).toString())
          .sorted()
          .map(PublishedFile::at)
          .toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** The file at a path under {@code src/test/resources/published}. */
  public static PublishedFile at(String path) {
    try {
      return of(path, Files.readAllLines(root().resolve(path)));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** What stands under a key. */
  public String entry(String key) {
    return header.get(key);
  }

  /** Which law the values belong to. */
  public String group() {
    return entry("group");
  }

  /** The printed table the values come from: as the header names it, or its source and locator. */
  public String table() {
    return header.getOrDefault("table", entry("source") + ", " + entry("locator"));
  }

  /** Whether every value of the file was seen; a file that mixes does not say so. */
  public boolean seen() {
    return entry("seen or from memory").equals("seen");
  }

  /** How many printed values its rows are: those with one text in a column "cell" are one. */
  public int printed() {
    Set<String> cells = new HashSet<>();
    for (int i = 0; i < rows.size(); i++) {
      cells.add(rows.get(i).getOrDefault("cell", "row " + i));
    }
    return cells.size();
  }

  private static PublishedFile of(String path, List<String> lines) {
    Map<String, String> header = new LinkedHashMap<>();
    List<String> table = new ArrayList<>();
    for (String line : lines) {
      int colon = line.indexOf(": ");
      if (line.startsWith("# ") && colon > 0) {
        header.merge(line.substring(2, colon), line.substring(colon + 2), (a, b) -> a + " " + b);
      } else {
        table.add(line);
      }
    }
    String[] columns = table.get(0).split(",", -1);
    return new PublishedFile(
        path, header, table.stream().skip(1).map(line -> row(path, columns, line)).toList());
  }

  private static Map<String, String> row(String path, String[] columns, String line) {
    String[] cells = line.split(",", -1);
    if (cells.length != columns.length || line.contains("\"")) {
      throw new IllegalArgumentException(path + ": " + line + " does not fit its columns");
    }
    Map<String, String> row = new LinkedHashMap<>();
    for (int i = 0; i < cells.length; i++) {
      row.put(columns[i], cells[i]);
    }
    return row;
  }

  private static Path root() {
    try {
      return Path.of(PublishedFile.class.getResource("/published").toURI());
    } catch (URISyntaxException e) {
      throw new IllegalStateException(e);
    }
  }
}
