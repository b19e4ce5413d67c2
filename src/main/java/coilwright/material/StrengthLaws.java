package coilwright.material;

import coilwright.source.Evidence;

/** Strength laws for a grade that the user describes; their evidence is the certificate, seen. */
public final class StrengthLaws {

  private StrengthLaws() {}

  /**
   * The same strength at every diameter.
   *
   * @param mpa Rm [MPa]
   * @return the law
   * @throws IllegalArgumentException if the strength is not positive and finite
   */
  public static StrengthLaw constant(double mpa) {
    return OwnSteps.constant(mpa);
  }

  /**
   * A/d^m with d in mm.
   *
   * @param a A, the strength at 1 mm [MPa]
   * @param m exponent m [-]; zero or above
   * @return the law
   * @throws IllegalArgumentException if A is not positive or m is negative
   */
  public static StrengthLaw power(double a, double m) {
    return new PowerLaw(a, m, Evidence.SEEN);
  }

  /**
   * Steps, each up to and including its diameter; above the last there is no strength, and the law
   * refuses the diameter.
   *
   * @param upTo the diameters, rising [mm]
   * @param strength Rm of each step [MPa], as many
   * @return the law
   * @throws IllegalArgumentException if the arrays differ in length, are empty, do not rise or hold
   *     what is not positive
   */
  public static StrengthLaw steps(double[] upTo, double[] strength) {
    return OwnSteps.of(upTo, strength);
  }
}
