package coilwright.material;

import coilwright.source.Evidence;
import coilwright.unit.Require;
import java.util.List;

/**
 * A tolerance that changes in steps of the diameter, each up to and including its own. Outside the
 * table no publication gives one: there it is the same share of the diameter as at the nearer end,
 * and counts as remembered.
 *
 * @param rows the steps, rising, with the tolerance as value [mm]
 * @param from where the first step begins [mm]
 * @param basis whether the table was seen to hold for the grade, or is taken for it
 */
record ToleranceTable(List<DiameterRow> rows, double from, Evidence basis) implements ToleranceLaw {

  /** Refuses rows that do not rise and a table that begins above its first step. */
  ToleranceTable {
    rows = DiameterRow.rising(rows);
    Require.positive(from, "first diameter", "mm");
    if (!(from < rows.get(0).diameter())) {
      throw new IllegalArgumentException("a table must begin below its first step: " + from);
    }
  }

  @Override
  public double at(double diameter) {
    Require.positive(diameter, "wire diameter", "mm");
    double inside = nearest(diameter);
    double tolerance = rows.get(DiameterRow.indexFor(rows, inside)).value();
    return holds(diameter) ? tolerance : tolerance * diameter / inside;
  }

  @Override
  public Evidence evidenceAt(double diameter) {
    if (!holds(diameter)) {
      return Evidence.MEMORY;
    }
    return basis.and(rows.get(DiameterRow.indexFor(rows, nearest(diameter))).evidence());
  }

  private boolean holds(double diameter) {
    return new DiameterRange(from, last()).contains(diameter);
  }

  private double nearest(double diameter) {
    return Math.min(Math.max(diameter, from), last());
  }

  private double last() {
    return rows.get(rows.size() - 1).diameter();
  }
}
