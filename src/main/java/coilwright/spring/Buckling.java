package coilwright.spring;

import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.unit.Require;

/** Sideways stability of a compression spring. */
public final class Buckling {

  /** Where the law is published. */
  public static final Citation CITATION =
      Citation.remembered(Source.HARINGX, "critical deflection; EN 13906-1 has the same equation");

  private Buckling() {}

  /**
   * The deflection at which a spring buckles, s/L0 = 0.5/(1 - G/E) (1 - sqrt(1 - (1 - G/E)/(0.5 +
   * G/E) (pi D/(nu L0))^2)).
   *
   * @param meanDiameter D [mm]
   * @param freeLength L0 [mm]
   * @param seatingFactor nu [-]
   * @param shearModulus G [MPa]
   * @param elasticModulus E [MPa], above G
   * @return the critical deflection [mm]; positive infinity where the spring can never buckle
   * @throws IllegalArgumentException if an argument is not positive and finite, or E not above G
   * @see #CITATION
   */
  public static double criticalDeflection(
      double meanDiameter,
      double freeLength,
      double seatingFactor,
      double shearModulus,
      double elasticModulus) {
    double l0 = Require.positive(freeLength, "free length", "mm");
    double slenderness =
        Require.positive(seatingFactor, "seating factor", "-")
            * l0
            / Require.positive(meanDiameter, "mean diameter", "mm");
    double q = ratio(shearModulus, elasticModulus);
    double turned = Math.PI / slenderness;
    double radicand = 1 - (1 - q) / (0.5 + q) * turned * turned;
    if (radicand < 0) {
      return Double.POSITIVE_INFINITY;
    }
    return l0 * 0.5 / (1 - q) * (1 - Math.sqrt(radicand));
  }

  /**
   * The mean diameter above which a spring can never buckle: the law's radicand is zero there.
   *
   * @param freeLength L0 [mm]
   * @param seatingFactor nu [-]
   * @param shearModulus G [MPa]
   * @param elasticModulus E [MPa], above G
   * @return D [mm]
   * @throws IllegalArgumentException if an argument is not positive and finite, or E not above G
   */
  public static double alwaysStableMeanDiameter(
      double freeLength, double seatingFactor, double shearModulus, double elasticModulus) {
    double q = ratio(shearModulus, elasticModulus);
    return Require.positive(seatingFactor, "seating factor", "-")
        * Require.positive(freeLength, "free length", "mm")
        / Math.PI
        * Math.sqrt((0.5 + q) / (1 - q));
  }

  private static double ratio(double shearModulus, double elasticModulus) {
    double g = Require.positive(shearModulus, "shear modulus", "MPa");
    return g / Require.above(elasticModulus, g, "elastic modulus", "MPa");
  }
}
