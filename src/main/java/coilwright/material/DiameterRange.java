package coilwright.material;

import coilwright.unit.Require;

/**
 * The wire diameters for which a grade's data hold.
 *
 * @param min smallest diameter [mm]
 * @param max largest diameter [mm]; infinite where nothing bounds it
 */
public record DiameterRange(double min, double max) {

  private static final double TOLERANCE = 1e-9;

  /** Refuses a range that is empty or does not begin at zero or above. */
  public DiameterRange {
    Require.notNegative(min, "smallest diameter", "mm");
    if (!(max >= min)) {
      throw new IllegalArgumentException(
          "largest diameter: " + max + " mm must not be below the smallest, " + min + " mm");
    }
  }

  /**
   * Whether a diameter lies in the range, its ends included; a difference of one part in 10^9 is
   * taken for a rounding of a unit conversion.
   *
   * @param diameter wire diameter [mm]
   * @return true if it does
   */
  public boolean contains(double diameter) {
    return diameter >= min * (1 - TOLERANCE) && diameter <= max * (1 + TOLERANCE);
  }
}
