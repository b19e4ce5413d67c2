package coilwright.material;

import coilwright.source.Evidence;
import java.util.List;

/**
 * A strength tabulated at diameters and interpolated linearly in the diameter between them, which
 * gives the same whether done in inches and ksi or in millimetres and MPa.
 *
 * @param rows the tabulated points, rising
 */
record InterpolatedTable(List<DiameterRow> rows) implements StrengthLaw {

  /** Refuses rows that do not rise. */
  InterpolatedTable {
    rows = DiameterRow.rising(rows);
  }

  @Override
  public double at(double diameter) {
    DiameterRow above = above(diameter);
    if (isAt(above, diameter)) {
      return above.value();
    }
    DiameterRow below = below(diameter);
    double share = (diameter - below.diameter()) / (above.diameter() - below.diameter());
    return below.value() + share * (above.value() - below.value());
  }

  @Override
  public Evidence evidenceAt(double diameter) {
    DiameterRow above = above(diameter);
    return isAt(above, diameter)
        ? above.evidence()
        : above.evidence().and(below(diameter).evidence());
  }

  private DiameterRow above(double diameter) {
    return rows.get(DiameterRow.indexFor(rows, diameter));
  }

  private DiameterRow below(double diameter) {
    int index = DiameterRow.indexFor(rows, diameter) - 1;
    if (index < 0) {
      throw new IllegalArgumentException(
          "wire diameter: "
              + diameter
              + " mm is outside the table, which begins at "
              + rows.get(0).diameter()
              + " mm");
    }
    return rows.get(index);
  }

  private static boolean isAt(DiameterRow row, double diameter) {
    return Math.abs(diameter - row.diameter()) <= DiameterRow.SAME * row.diameter();
  }
}
