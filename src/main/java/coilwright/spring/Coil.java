package coilwright.spring;

import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.unit.Require;

/** Geometry of a helix of round wire: its slope, its length, and how it grows when pressed flat. */
public final class Coil {

  /** Growth of a coil whose ends cannot turn. */
  public static final Citation GROWTH =
      Citation.remembered(Source.WAHL, "diameter increase on compression, ends held");

  /** Growth of a coil whose ends can turn. */
  public static final Citation GROWTH_FREE =
      Citation.remembered(Source.EN_13906_1, "increase of the coil diameter under load");

  /** Slope and length of a helix. */
  public static final Citation HELIX = Citation.seen(Source.FIRST_PRINCIPLES, "unrolled helix");

  private Coil() {}

  /**
   * Pitch angle, alpha = atan(p / (pi D)).
   *
   * @param pitch p [mm]
   * @param meanDiameter D [mm]
   * @return alpha [rad]
   * @throws IllegalArgumentException if the pitch is not finite or the diameter not positive and
   *     finite
   */
  public static double pitchAngle(double pitch, double meanDiameter) {
    return StrictMath.atan(
        Require.finite(pitch, "pitch", "mm")
            / (Math.PI * Require.positive(meanDiameter, "mean diameter", "mm")));
  }

  /**
   * Developed length of wire: active coils along the helix, dead coils flat.
   *
   * @param meanDiameter D [mm]
   * @param pitch p [mm]
   * @param activeCoils n [-]
   * @param deadCoils coils that do not deflect [-]
   * @return length [mm]
   * @throws IllegalArgumentException if a diameter or count is not positive and finite, or the
   *     pitch not finite
   */
  public static double wireLength(
      double meanDiameter, double pitch, double activeCoils, double deadCoils) {
    double turn = Math.PI * Require.positive(meanDiameter, "mean diameter", "mm");
    double rise = Require.finite(pitch, "pitch", "mm");
    return Require.positive(activeCoils, "active coils", "-") * Math.sqrt(turn * turn + rise * rise)
        + Require.notNegative(deadCoils, "dead coils", "-") * turn;
  }

  /**
   * Mean diameter of a coil pressed to solid with its ends held from turning, sqrt(D^2 + (p^2 -
   * d^2)/pi^2).
   *
   * @param meanDiameter D when free [mm], above the wire diameter
   * @param pitch p when free [mm]
   * @param wireDiameter d [mm]
   * @return D at solid [mm]
   * @throws IllegalArgumentException if a diameter is not positive and finite, the pitch not
   *     finite, or the mean diameter below the wire's
   */
  public static double meanDiameterAtSolid(double meanDiameter, double pitch, double wireDiameter) {
    double d = Require.positive(wireDiameter, "wire diameter", "mm");
    double dia = Require.above(meanDiameter, d, "mean diameter", "mm");
    double p = Require.finite(pitch, "pitch", "mm");
    return Math.sqrt(dia * dia + (p * p - d * d) / (Math.PI * Math.PI));
  }

  /**
   * Growth of the outside diameter of a coil pressed to solid whose ends can turn, 0.1 (p^2 - 0.8 p
   * d - 0.2 d^2)/D.
   *
   * @param meanDiameter D when free [mm], above the wire diameter
   * @param pitch p when free [mm]
   * @param wireDiameter d [mm]
   * @return the growth [mm]
   * @throws IllegalArgumentException if a diameter is not positive and finite, the pitch not
   *     finite, or the mean diameter below the wire's
   */
  public static double growthFreeToTurn(double meanDiameter, double pitch, double wireDiameter) {
    double d = Require.positive(wireDiameter, "wire diameter", "mm");
    double p = Require.finite(pitch, "pitch", "mm");
    return 0.1
        * (p * p - 0.8 * p * d - 0.2 * d * d)
        / Require.above(meanDiameter, d, "mean diameter", "mm");
  }
}
