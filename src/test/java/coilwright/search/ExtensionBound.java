package coilwright.search;

import coilwright.limit.Side;

/** The numeric bounds that a problem of an extension spring may set, each with its side. */
public enum ExtensionBound {
  /** Share of tensile strength [-]. */
  BODY_STRESS(Side.MAX),
  /** Share of tensile strength [-]. */
  HOOK_BENDING(Side.MAX),
  /** Share of tensile strength [-]. */
  HOOK_TORSION(Side.MAX),
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
  /** Shaft through it [mm]. */
  ROD(Side.MIN),
  /** Between coil and bore, and coil and rod [mm]. */
  CLEARANCE(Side.MIN),
  /** Nominal outside diameter [mm]. */
  OUTSIDE_DIAMETER(Side.MAX),
  /** Nominal inside diameter [mm]. */
  INSIDE_DIAMETER(Side.MIN),
  /** Free length inside the hooks [mm]. */
  FREE_LENGTH(Side.MAX),
  /** Length at the greatest load [mm]. */
  EXTENDED_LENGTH(Side.MAX),
  /** Pin that must pass the hook [mm]. */
  PIN(Side.MIN),
  /** First natural frequency [Hz]. */
  SURGE_FREQUENCY(Side.MIN);

  private final Side side;

  ExtensionBound(Side side) {
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
