package coilwright.material;

import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.List;

/** Reads rows by diameter out of a catalogue file. */
final class DiameterRows {

  /** The word for a value that nothing bounds. */
  static final String OPEN = "any";

  private DiameterRows() {}

  /**
   * The rows, converted to mm and to the inner unit of their value.
   *
   * @param rows rows of a file, with diameters rising
   * @param diameter the column of the diameters; "any" there makes an open last step
   * @param value the column of the values
   * @param dimension what the values are
   * @return one for each row
   * @throws IllegalStateException naming file, line and column if the diameters do not rise
   */
  static List<DiameterRow> of(
      List<TableRow> rows, String diameter, String value, Dimension dimension) {
    List<DiameterRow> read = new ArrayList<>();
    double last = 0;
    for (TableRow row : rows) {
      double d =
          row.text(diameter).equals(OPEN)
              ? Double.POSITIVE_INFINITY
              : row.quantity(diameter, Dimension.LENGTH);
      if (!(d > last)) {
        throw row.fault(diameter, "found " + row.text(diameter) + ", must rise from row to row");
      }
      last = d;
      read.add(new DiameterRow(d, row.quantity(value, dimension), row.evidence()));
    }
    return read;
  }
}
