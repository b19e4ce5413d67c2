package coilwright.material;

import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/** Builds the sizes of a series from its file. */
final class SizeReader {

  private SizeReader() {}

  /**
   * The sizes.
   *
   * @param series the series
   * @param table its file
   * @return its sizes, rising
   * @throws IllegalStateException naming file, line and column if a label comes twice or the
   *     diameters do not rise
   */
  static List<WireSize> read(WireSeries series, Table table) {
    List<WireSize> sizes = new ArrayList<>();
    Set<String> labels = new HashSet<>();
    double last = 0;
    for (TableRow row : table.rows()) {
      String label = row.text("label");
      double d = row.quantity("diameter", Dimension.LENGTH);
      if (!labels.add(label)) {
        throw row.fault("label", "found \"" + label + "\" a second time");
      }
      if (!(d > last)) {
        throw row.fault(
            "diameter", "found " + row.text("diameter") + ", must rise from row to row");
      }
      last = d;
      sizes.add(new WireSize(Optional.of(series), label, d, row.evidence()));
    }
    return List.copyOf(sizes);
  }
}
