package coilwright.spring;

import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.unit.Require;

/** The bending stress of the wire as a straight bar. */
public final class BendingStress {

  /** Where the law is published. */
  public static final Citation CITATION =
      Citation.remembered(Source.SHIGLEY, "equation 10-44 without its factor");

  private BendingStress() {}

  /**
   * Uncorrected bending stress, sigma = 32 M / (pi d^3).
   *
   * @param torque M [N mm]
   * @param wireDiameter d [mm]
   * @return sigma [MPa]
   * @throws IllegalArgumentException if the torque is not finite, or the diameter not positive and
   *     finite
   * @see #CITATION
   */
  public static double uncorrected(double torque, double wireDiameter) {
    double d = Require.positive(wireDiameter, "wire diameter", "mm");
    return 32 * Require.finite(torque, "torque", "N mm") / (Math.PI * (d * d * d));
  }
}
