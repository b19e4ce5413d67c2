package coilwright.spring;

import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.unit.Require;

/**
 * The legs of a torsion spring: straight, leaving the body along the wire, each loaded across its
 * end.
 *
 * @param first length of the first [mm], zero or more
 * @param second length of the second [mm], zero or more
 */
public record Legs(double first, double second) {

  /** Where the active coils of the legs are published. */
  public static final Citation CITATION =
      Citation.remembered(Source.SHIGLEY, "equation 10-51, active coils of the legs");

  /** The id that stands for them in output. */
  public static final String ID = "straight-legs";

  /** Legs along the wire of a whole number of coils lie in one line and point apart [rad]. */
  private static final double IN_LINE = Math.PI;

  private static final double TURN = 2 * Math.PI;

  /** Angles no farther apart than this are the same [rad]. */
  private static final double SAME = 1e-9;

  /** A leg bends as a cantilever: by a third of what the same wire does under an even moment. */
  private static final double SHARE_OF_AN_EVEN_MOMENT = 1.0 / 3;

  /** Refuses a negative length. */
  public Legs {
    Require.notNegative(first, "first leg", "mm");
    Require.notNegative(second, "second leg", "mm");
  }

  /** Both together [mm]. */
  public double length() {
    return first + second;
  }

  /**
   * The product of mean diameter and coils that bends as much as the legs, (l1 + l2)/(3 pi): they
   * are worth (l1 + l2)/(3 pi D) active coils.
   *
   * @return D times coils [mm]
   * @see #CITATION
   */
  public double diameterTimesCoils() {
    return length() * SHARE_OF_AN_EVEN_MOMENT / Math.PI;
  }

  /**
   * The angle between the legs of a body: from the first to the second, both seen pointing away
   * from the body, along the axis, counted in the winding direction.
   *
   * @param turns how far the wire turns from leg to leg, loaded or not [rad]
   * @return the angle [rad], from 0 to below 2 pi
   */
  static double angleAfter(double turns) {
    return wrapped(IN_LINE + turns);
  }

  /**
   * What the coil count of a free body has beyond whole coils, so that its legs stand at an angle.
   *
   * @param freeAngle angle between the legs when free, as {@link #angleAfter} counts it [rad]
   * @return the fraction of a coil [-], from 0 to below 1
   */
  public static double fractionOfACoil(double freeAngle) {
    return wrapped(freeAngle - IN_LINE) / TURN;
  }

  /** Next to a whole turn is none: it is the rounding of the arithmetic. */
  private static double wrapped(double angle) {
    double rest = angle - TURN * Math.floor(angle / TURN);
    return rest < TURN - SAME ? rest : 0;
  }
}
