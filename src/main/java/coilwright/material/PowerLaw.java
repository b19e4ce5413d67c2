package coilwright.material;

import coilwright.source.Evidence;
import coilwright.unit.Require;

/**
 * A strength that falls with a power of the diameter, Rm = A/d^m with d in mm.
 *
 * @param a A, the strength at 1 mm [MPa]
 * @param m exponent m [-]; zero or above
 * @param evidence whether A and m were seen or are remembered
 */
public record PowerLaw(double a, double m, Evidence evidence) implements StrengthLaw {

  /** Refuses a strength that is not positive and an exponent below zero. */
  public PowerLaw {
    Require.positive(a, "strength at 1 mm", "MPa");
    Require.notNegative(m, "exponent", "-");
  }

  @Override
  public double at(double diameter) {
    return a / StrictMath.pow(Require.positive(diameter, "wire diameter", "mm"), m);
  }

  @Override
  public Evidence evidenceAt(double diameter) {
    return evidence;
  }
}
