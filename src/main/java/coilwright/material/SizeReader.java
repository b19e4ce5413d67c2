package coilwright.material;

import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/** Builds the sizes of a series from its files. */
final class SizeReader {

  private SizeReader() {}

  /**
   * The rows of the files of a series, merged by diameter.
   *
   * @param tables its files
   * @return their rows, rising
   * @throws IllegalStateException naming file, line and column if a file by itself does not rise
   */
  static List<TableRow> rising(List<Table> tables) {
    List<TableRow> rows = new ArrayList<>();
    for (Table table : tables) {
      checkRising(table.rows());
      rows.addAll(table.rows());
    }
    if (tables.size() > 1) {
      rows.sort(Comparator.comparingDouble(SizeReader::diameter));
    }
    return rows;
  }

  /**
   * The sizes.
   *
   * @param series the series
   * @param rows the rows of its files, merged
   * @return its sizes, rising
   * @throws IllegalStateException naming file, line and column if a label or a diameter comes twice
   */
  static List<WireSize> read(WireSeries series, List<TableRow> rows) {
    checkRising(rows);
    List<WireSize> sizes = new ArrayList<>();
    Set<String> labels = new HashSet<>();
    for (TableRow row : rows) {
      String label = row.text("label");
      if (!labels.add(label)) {
        throw row.fault("label", "found \"" + label + "\" a second time");
      }
      sizes.add(new WireSize(Optional.of(series), label, diameter(row), row.evidence()));
    }
    return List.copyOf(sizes);
  }

  private static void checkRising(List<TableRow> rows) {
    double last = 0;
    for (TableRow row : rows) {
      double d = diameter(row);
      if (!(d > last)) {
        throw row.fault(
            "diameter", "found " + row.text("diameter") + ", must rise from row to row");
      }
      last = d;
    }
  }

  private static double diameter(TableRow row) {
    return row.quantity("diameter", Dimension.LENGTH);
  }
}
