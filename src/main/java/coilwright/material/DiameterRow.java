package coilwright.material;

import coilwright.source.Evidence;
import coilwright.unit.Require;
import java.util.List;

/**
 * One row of a table by wire diameter.
 *
 * @param diameter d [mm]; infinite for a last step that nothing bounds
 * @param value the strength or modulus there [MPa], or the tolerance [mm]
 * @param evidence whether the row was seen or is remembered
 */
public record DiameterRow(double diameter, double value, Evidence evidence) {

  /** What two diameters may differ by, as a share, and still be one: a rounding of a conversion. */
  static final double SAME = 1e-9;

  /** Refuses what is not positive; only the diameter may be infinite. */
  public DiameterRow {
    if (!(diameter > 0)) {
      throw new IllegalArgumentException("wire diameter: " + diameter + " mm must be positive");
    }
    Require.positive(value, "value at " + diameter + " mm", "inner");
  }

  /**
   * Index of the first row that is not below a diameter.
   *
   * @param rows the rows, rising
   * @param diameter d [mm]
   * @return the index of the first row with at least that diameter, {@link #SAME} allowed
   * @throws IllegalArgumentException if the diameter is not positive or above the last row
   */
  static int indexFor(List<DiameterRow> rows, double diameter) {
    for (int i = 0; diameter > 0 && i < rows.size(); i++) {
      if (diameter <= rows.get(i).diameter() * (1 + SAME)) {
        return i;
      }
    }
    double last = rows.get(rows.size() - 1).diameter();
    throw new IllegalArgumentException(
        "wire diameter: " + diameter + " mm is outside the table, which ends at " + last + " mm");
  }

  /**
   * The rows, if there are any and their diameters rise.
   *
   * @param rows the rows
   * @return an unchangeable copy
   * @throws IllegalArgumentException if not
   */
  static List<DiameterRow> rising(List<DiameterRow> rows) {
    if (rows.isEmpty()) {
      throw new IllegalArgumentException("a table by diameter needs a row");
    }
    for (int i = 1; i < rows.size(); i++) {
      double d = rows.get(i).diameter();
      if (!(d > rows.get(i - 1).diameter())) {
        throw new IllegalArgumentException("diameters must rise: " + d + " mm does not");
      }
    }
    return List.copyOf(rows);
  }
}
