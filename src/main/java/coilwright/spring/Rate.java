package coilwright.spring;

import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.unit.Require;

/** The law that ties the rate of a helical spring to its wire and its coil. */
public final class Rate {

  /** Where the law is published. */
  public static final Citation CITATION =
      Citation.remembered(Source.SHIGLEY, "equation 10-9; EN 13906-1, spring rate");

  private Rate() {}

  /**
   * Spring rate of a round-wire helical spring, R = G d^4 / (8 D^3 n).
   *
   * <p>Torsion of the wire only; curvature and direct shear are left out, as is usual for the rate.
   *
   * @param shearModulus G [MPa]
   * @param wireDiameter d [mm]
   * @param meanDiameter D [mm]
   * @param activeCoils n [-]
   * @return R [N/mm]
   * @throws IllegalArgumentException if an argument is not positive and finite
   * @see #CITATION
   */
  public static double of(
      double shearModulus, double wireDiameter, double meanDiameter, double activeCoils) {
    double d = Require.positive(wireDiameter, "wire diameter", "mm");
    double dia = Require.positive(meanDiameter, "mean diameter", "mm");
    double n = Require.positive(activeCoils, "active coils", "-");
    return Require.positive(shearModulus, "shear modulus", "MPa")
        * (d * d * d * d)
        / (8 * (dia * dia * dia) * n);
  }

  /**
   * The mean diameter that gives a rate with a number of coils: the same law solved for D.
   *
   * @param shearModulus G [MPa]
   * @param wireDiameter d [mm]
   * @param rate R [N/mm]
   * @param activeCoils n [-]
   * @return D [mm]
   * @throws IllegalArgumentException if an argument is not positive and finite
   */
  public static double meanDiameter(
      double shearModulus, double wireDiameter, double rate, double activeCoils) {
    double d = Require.positive(wireDiameter, "wire diameter", "mm");
    double n = Require.positive(activeCoils, "active coils", "-");
    return StrictMath.cbrt(
        Require.positive(shearModulus, "shear modulus", "MPa")
            * (d * d * d * d)
            / (8 * Require.positive(rate, "rate", "N/mm") * n));
  }

  /**
   * The number of coils that gives a rate with a mean diameter: the same law solved for n.
   *
   * @param shearModulus G [MPa]
   * @param wireDiameter d [mm]
   * @param rate R [N/mm]
   * @param meanDiameter D [mm]
   * @return n [-]
   * @throws IllegalArgumentException if an argument is not positive and finite
   */
  public static double activeCoils(
      double shearModulus, double wireDiameter, double rate, double meanDiameter) {
    return of(shearModulus, wireDiameter, meanDiameter, Require.positive(rate, "rate", "N/mm"));
  }
}
