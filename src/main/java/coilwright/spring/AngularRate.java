package coilwright.spring;

import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.unit.Require;

/**
 * The law that ties the angular rate of a torsion spring to its wire and its coil. Its constant is
 * a choice: the theory of a bar bent without friction gives {@link #FRICTIONLESS}, measured springs
 * are about 6 % softer and handbooks take {@link #HANDBOOK}.
 */
public final class AngularRate {

  /** Where the law and the constant of the handbooks are published. */
  public static final Citation CITATION =
      Citation.remembered(Source.SHIGLEY, "equations 10-48 to 10-50, torsion spring rate");

  /** The constant c of the rate per turn that handbooks use, friction and ends included [-]. */
  public static final double HANDBOOK = 10.8;

  /** The constant c without friction, 64 / (2 pi) [-]; EN 13906-3 has it too. */
  public static final double FRICTIONLESS = 64 / (2 * Math.PI);

  private static final double TURN = 2 * Math.PI;

  private AngularRate() {}

  /**
   * Rate of a torsion spring of round wire, R = E d^4 / (c D n) per turn, here per radian.
   *
   * <p>Bending of the wire as of a straight bar; curvature, which makes it stiffer by about 1/(4
   * C^2), and pitch are left out, as is usual for the rate.
   *
   * @param elasticModulus E [MPa]
   * @param wireDiameter d [mm]
   * @param meanDiameter D [mm]
   * @param activeCoils n, those of the legs included [-]
   * @param constant c [-]
   * @return R [N mm/rad]
   * @throws IllegalArgumentException if an argument is not positive and finite
   * @see #CITATION
   */
  public static double of(
      double elasticModulus,
      double wireDiameter,
      double meanDiameter,
      double activeCoils,
      double constant) {
    double d = Require.positive(wireDiameter, "wire diameter", "mm");
    return Require.positive(elasticModulus, "elastic modulus", "MPa")
        * (d * d * d * d)
        / (Require.positive(constant, "rate constant", "-")
            * TURN
            * Require.positive(meanDiameter, "mean diameter", "mm")
            * Require.positive(activeCoils, "active coils", "-"));
  }

  /**
   * The product of mean diameter and active coils that gives a rate: the same law solved for D n.
   *
   * @param elasticModulus E [MPa]
   * @param wireDiameter d [mm]
   * @param rate R [N mm/rad]
   * @param constant c [-]
   * @return D n [mm]
   * @throws IllegalArgumentException if an argument is not positive and finite
   */
  public static double diameterTimesCoils(
      double elasticModulus, double wireDiameter, double rate, double constant) {
    return of(
        elasticModulus, wireDiameter, Require.positive(rate, "rate", "N mm/rad"), 1, constant);
  }
}
