package coilwright.search;

import coilwright.limit.Side;
import coilwright.spring.CompressionState;

/** The numeric bounds that a problem may set, each with the way in which it cuts. */
public enum Bound {
  /** Share of tensile strength at load [-]. */
  STRESS_AT_LOAD(Side.MAX),
  /** Share of tensile strength at solid [-]. */
  STRESS_AT_SOLID(Side.MAX),
  /** Spring index [-]. */
  LEAST_INDEX(Side.MIN),
  /** Spring index [-]. */
  GREATEST_INDEX(Side.MAX),
  /** Active coils [-]. */
  FEWEST_COILS(Side.MIN),
  /** Active coils [-]. */
  MOST_COILS(Side.MAX),
  /** Pitch angle [rad]. */
  PITCH_ANGLE(Side.MAX),
  /** Share of the greatest deflection left before solid [-]. */
  CLASH_ALLOWANCE(Side.MIN),
  /** Hole it works in [mm]. */
  BORE(Side.MAX),
  /** Shaft through it [mm]. */
  ROD(Side.MIN),
  /** Between coil and bore, and coil and rod [mm]. */
  CLEARANCE(Side.MIN),
  /** Nominal outside diameter [mm]. */
  OUTSIDE_DIAMETER(Side.MAX),
  /** Nominal inside diameter [mm]. */
  INSIDE_DIAMETER(Side.MIN),
  /** Free length [mm]. */
  FREE_LENGTH(Side.MAX),
  /** Solid length [mm]. */
  SOLID_LENGTH(Side.MAX),
  /** First natural frequency [Hz]. */
  SURGE_FREQUENCY(Side.MIN);

  private final Side side;

  Bound(Side side) {
    this.side = side;
  }

  /**
   * A value that refuses more springs.
   *
   * @param value the bound [its own unit], above zero
   * @param share by how much to move it [-], 0 to 1; negative to refuse fewer
   * @return the moved bound
   */
  public double tightened(double value, double share) {
    return value * (side == Side.MAX ? 1 - share : 1 + share);
  }

  /**
   * The bound that a spring meets with nothing to spare.
   *
   * @param spring the spring
   * @param strength its tensile strength [MPa]
   * @return the bound; no clearance
   */
  public double valueOf(CompressionState spring, double strength) {
    return switch (this) {
      case STRESS_AT_LOAD -> spring.mostCompressed().correctedShearStress() / strength;
      case STRESS_AT_SOLID -> spring.solid().correctedShearStress() / strength;
      case LEAST_INDEX, GREATEST_INDEX -> spring.spring().springIndex();
      case FEWEST_COILS, MOST_COILS -> spring.coils();
      case PITCH_ANGLE -> spring.spring().pitchAngle();
      case CLASH_ALLOWANCE -> spring.clashAllowance();
      case BORE -> spring.outsideDiameterAtSolid();
      case OUTSIDE_DIAMETER -> spring.spring().outsideDiameter();
      case ROD, INSIDE_DIAMETER -> spring.spring().insideDiameter();
      case CLEARANCE -> 0;
      case FREE_LENGTH -> spring.spring().freeLength();
      case SOLID_LENGTH -> spring.solidLength();
      case SURGE_FREQUENCY -> spring.spring().surgeFrequency();
    };
  }
}
