package coilwright.spring;

import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.unit.Require;

/** The stresses in a hook whose load is on the axis: bending at its crown, torsion at its side. */
public final class HookStress {

  /** Bending and direct tension at the loop. */
  public static final Citation BENDING =
      Citation.remembered(Source.SHIGLEY, "equations 10-34 to 10-35, hook bending");

  /** Torsion where the body bends into the loop. */
  public static final Citation TORSION =
      Citation.remembered(Source.SHIGLEY, "equations 10-36 to 10-37, hook torsion");

  /** The index of the side bend below which its stress is better avoided [-]. */
  public static final double LEAST_SIDE_INDEX = 4;

  /**
   * The loop's index at which the bending of a given force is least along a family: d(C1 K)/dC1 =
   * 0, 4 C1^2 - 8 C1 + 2 = 0 [-].
   */
  public static final double LEAST_BENDING_INDEX = 1 + Math.sqrt(0.5);

  /**
   * The side bend's index at which the torsion of a given force is least: 16 C2^2 - 32 C2 + 4 = 0
   * [-].
   */
  public static final double LEAST_TORSION_INDEX = 1 + Math.sqrt(0.75);

  private HookStress() {}

  /**
   * The factor of curvature in bending, K_A = (4 C1^2 - C1 - 1)/(4 C1 (C1 - 1)).
   *
   * @param bendIndex C1 = 2 r1/d [-], above 1
   * @return K_A [-]
   * @throws IllegalArgumentException if the index is not above 1 and finite
   * @see #BENDING
   */
  public static double bendingFactor(double bendIndex) {
    double c = Require.above(bendIndex, 1, "index of the loop", "-");
    return (4 * c * c - c - 1) / (4 * c * (c - 1));
  }

  /**
   * The factor of curvature in torsion, K_B' = (4 C2 - 1)/(4 C2 - 4).
   *
   * @param sideIndex C2 = 2 r2/d [-], above 1
   * @return K_B' [-]
   * @throws IllegalArgumentException if the index is not above 1 and finite
   * @see #TORSION
   */
  public static double torsionFactor(double sideIndex) {
    double c = Require.above(sideIndex, 1, "index of the side bend", "-");
    return (4 * c - 1) / (4 * c - 4);
  }

  /**
   * Greatest tensile stress of the loop, F (K_A 16 D/(pi d^3) + 4/(pi d^2)), for a load at D/2 from
   * the wire.
   *
   * @param force F [N]
   * @param meanDiameter D, twice the arm of the load [mm]
   * @param wireDiameter d [mm]
   * @param bendIndex C1 [-], above 1
   * @return sigma_A [MPa]
   * @throws IllegalArgumentException if the force is not finite, a diameter not positive and finite
   *     or the index not above 1
   * @see #BENDING
   */
  public static double bending(
      double force, double meanDiameter, double wireDiameter, double bendIndex) {
    double d = Require.positive(wireDiameter, "wire diameter", "mm");
    return 2 * bendingFactor(bendIndex) * ShearStress.uncorrected(force, meanDiameter, d)
        + 4 * force / (Math.PI * d * d);
  }

  /**
   * Greatest shear stress of the side bend, K_B' 8 F D/(pi d^3).
   *
   * @param force F [N]
   * @param meanDiameter D [mm]
   * @param wireDiameter d [mm]
   * @param sideIndex C2 [-], above 1
   * @return tau_B [MPa]
   * @throws IllegalArgumentException if the force is not finite, a diameter not positive and finite
   *     or the index not above 1
   * @see #TORSION
   */
  public static double torsion(
      double force, double meanDiameter, double wireDiameter, double sideIndex) {
    return torsionFactor(sideIndex) * ShearStress.uncorrected(force, meanDiameter, wireDiameter);
  }
}
