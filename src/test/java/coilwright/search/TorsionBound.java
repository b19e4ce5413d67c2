package coilwright.search;

import coilwright.limit.Side;

/** The numeric bounds that a problem of a torsion spring may set, each with the way it cuts. */
public enum TorsionBound {
  /** Share of tensile strength at the greatest torque [-]. */
  STRESS(Side.MAX),
  /** Spring index [-]. */
  LEAST_INDEX(Side.MIN),
  /** Spring index [-]. */
  GREATEST_INDEX(Side.MAX),
  /** Body coils [-]. */
  FEWEST_COILS(Side.MIN),
  /** Body coils [-]. */
  MOST_COILS(Side.MAX),
  /** Hole it works in [mm]. */
  BORE(Side.MAX),
  /** Arbor through it [mm]. */
  ROD(Side.MIN),
  /** Between coil and bore, and coil and arbor [mm]. */
  CLEARANCE(Side.MIN),
  /** Nominal outside diameter [mm]. */
  OUTSIDE_DIAMETER(Side.MAX),
  /** Nominal inside diameter [mm]. */
  INSIDE_DIAMETER(Side.MIN),
  /** Body length at the greatest torque [mm]. */
  BODY_LENGTH(Side.MAX);

  private final Side side;

  TorsionBound(Side side) {
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
}
