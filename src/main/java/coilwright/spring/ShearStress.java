package coilwright.spring;

import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.unit.Require;

/** The torsion stress of the wire as a straight bar. */
public final class ShearStress {

  /** Where the law is published. */
  public static final Citation CITATION =
      Citation.remembered(Source.SHIGLEY, "equation 10-7 without its factor");

  /** Where the factor for direct shear is published. */
  public static final Citation DIRECT_SHEAR =
      Citation.remembered(Source.SHIGLEY, "equation 10-3, shear stress correction factor");

  private ShearStress() {}

  /**
   * The factor for direct shear alone, Ks = 1 + 0.5/C: what is left of the correction once yielding
   * has evened out the curvature's share.
   *
   * @param springIndex C [-]
   * @return Ks [-]
   * @throws IllegalArgumentException if the index is not positive and finite
   * @see #DIRECT_SHEAR
   */
  public static double directShearFactor(double springIndex) {
    return 1 + 0.5 / Require.positive(springIndex, "spring index", "-");
  }

  /**
   * Uncorrected shear stress, tau = 8 F D / (pi d^3).
   *
   * @param force F [N]
   * @param meanDiameter D [mm]
   * @param wireDiameter d [mm]
   * @return tau [MPa]
   * @throws IllegalArgumentException if the force is not finite, or a diameter not positive and
   *     finite
   * @see #CITATION
   */
  public static double uncorrected(double force, double meanDiameter, double wireDiameter) {
    double d = Require.positive(wireDiameter, "wire diameter", "mm");
    return 8
        * Require.finite(force, "force", "N")
        * Require.positive(meanDiameter, "mean diameter", "mm")
        / (Math.PI * (d * d * d));
  }
}
