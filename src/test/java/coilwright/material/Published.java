package coilwright.material;

import coilwright.unit.Dimension;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;

/**
 * One row of a file of published check values; its text, which names a test, begins with the
 * citation.
 *
 * @param header the comment lines of the file
 * @param cells column to cell, in the file's order
 */
record Published(TableHeader header, Map<String, String> cells) {

  private static final List<String> NEEDED =
      List.of("source", "locator", "units", "rounding", "seen or from memory");

  /** The rows of a file under {@code src/test/resources/published}. */
  static Stream<Published> rows(String path) {
    String text = text("/published/" + path);
    TableHeader header = TableHeader.of(path, text);
    NEEDED.forEach(header::entry);
    List<List<String>> lines = text.lines().skip(header.lines()).map(CsvLine::cells).toList();
    return lines.stream().skip(1).map(line -> of(header, lines.get(0), line));
  }

  String text(Column column) {
    return cells.get(column.title);
  }

  double number(Column column) {
    return Double.parseDouble(text(column));
  }

  /** A quantity in the unit that the header names for the column, made inner. */
  double inner(Column column, Dimension dimension) {
    String unit = header.unitOf(column.title);
    return dimension.unit(unit).orElseThrow().toInner(number(column));
  }

  /** The tolerance as a share. */
  double tolerance() {
    return number(Column.TOLERANCE) / 100;
  }

  @Override
  public String toString() {
    return header.entry("source") + ", " + header.entry("locator") + ": " + cells.values();
  }

  private static Published of(TableHeader header, List<String> columns, List<String> line) {
    Map<String, String> cells = new LinkedHashMap<>();
    for (int i = 0; i < columns.size(); i++) {
      cells.put(columns.get(i), line.get(i));
    }
    return new Published(header, cells);
  }

  private static String text(String resource) {
    try (InputStream in = Published.class.getResourceAsStream(resource)) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** The columns that tests read. */
  enum Column {
    LABEL("label"),
    GRADE("grade"),
    DIAMETER("diameter"),
    DIAMETER_MIN("diameter_min"),
    DIAMETER_MAX("diameter_max"),
    STRENGTH("strength"),
    MAXIMUM("maximum"),
    ELASTIC_MODULUS("elastic_modulus"),
    SHEAR_MODULUS("shear_modulus"),
    MODULUS("modulus"),
    VALUE("value"),
    DENSITY("density"),
    A("a"),
    B("b"),
    C("c"),
    E("e"),
    F("f"),
    M("m"),
    TOLERANCE("tolerance");

    private final String title;

    Column(String title) {
      this.title = title;
    }
  }
}
