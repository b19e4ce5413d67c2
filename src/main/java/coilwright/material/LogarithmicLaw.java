package coilwright.material;

import coilwright.source.Evidence;
import coilwright.unit.Require;

/**
 * A strength that falls with the logarithm of the diameter, Rm = intercept - slope lg d with d in
 * mm, rounded as the standard's table prints it.
 *
 * @param intercept the strength at 1 mm [MPa]
 * @param slope the fall for each factor of ten in diameter [MPa]
 * @param greatest what the strength never exceeds [MPa]; infinite where nothing bounds it
 * @param rounding the step that the result is rounded to, halves upwards [MPa]
 * @param evidence whether intercept and slope were seen or are remembered
 */
record LogarithmicLaw(
    double intercept, double slope, double greatest, double rounding, Evidence evidence)
    implements StrengthLaw {

  /** Refuses numbers that are not positive. */
  LogarithmicLaw {
    Require.positive(intercept, "strength at 1 mm", "MPa");
    Require.positive(slope, "fall for a factor of ten", "MPa");
    Require.positive(rounding, "rounding step", "MPa");
    if (!(greatest > 0)) {
      throw new IllegalArgumentException(
          "greatest strength: " + greatest + " MPa must be positive");
    }
  }

  @Override
  public double at(double diameter) {
    Require.positive(diameter, "wire diameter", "mm");
    double exact = intercept - slope * StrictMath.log10(diameter);
    return Math.min(greatest, Math.floor(exact / rounding + 0.5) * rounding);
  }

  @Override
  public Evidence evidenceAt(double diameter) {
    return evidence;
  }
}
