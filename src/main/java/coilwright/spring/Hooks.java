package coilwright.spring;

import coilwright.unit.Require;

/**
 * The two hooks of an extension spring, alike, but for how far they reach.
 *
 * @param type how they are formed
 * @param bendRadius mean radius r1 of the loop, as a multiple of the mean diameter [-]
 * @param sideRadius mean radius r2 of the bend from the body into the loop, likewise [-]
 * @param activeCoils active coils that each adds [-]
 */
public record Hooks(HookType type, double bendRadius, double sideRadius, double activeCoils) {

  /** Refuses radii that are not positive, and a negative share of active coils. */
  public Hooks {
    Require.positive(bendRadius, "hook bend radius", "D");
    Require.positive(sideRadius, "hook side radius", "D");
    Require.notNegative(activeCoils, "active coils of a hook", "-");
  }

  /** Active coils of both together [-]. */
  public double bothActive() {
    return 2 * activeCoils;
  }

  /**
   * The least spring index at which every bend still has an inside: coil, loop and side bend are
   * wider than their wire above it.
   */
  public double tightestIndex() {
    return Math.max(1, 0.5 / Math.min(bendRadius, sideRadius));
  }

  /** The index of the loop, C1 = 2 r1/d, at a spring index [-]. */
  public double bendIndex(double springIndex) {
    return 2 * bendRadius * springIndex;
  }

  /** The index of the side bend, C2 = 2 r2/d, at a spring index [-]. */
  public double sideIndex(double springIndex) {
    return 2 * sideRadius * springIndex;
  }

  /**
   * How far each reaches beyond the body to its inside, as it comes.
   *
   * @param meanDiameter D [mm]
   * @param wireDiameter d, coating included [mm]
   * @return the length [mm]
   */
  public double naturalLength(double meanDiameter, double wireDiameter) {
    return type.naturalShare() * (meanDiameter - wireDiameter);
  }

  /**
   * The shortest that can be bent.
   *
   * @param meanDiameter D [mm]
   * @param wireDiameter d, coating included [mm]
   * @return the length beyond the body to its inside [mm]
   */
  public double leastLength(double meanDiameter, double wireDiameter) {
    return type.leastShare() * (meanDiameter - wireDiameter);
  }

  /**
   * Developed wire of one hook: its turns of the coil, and what it reaches beyond them straight.
   *
   * @param meanDiameter D [mm]
   * @param wireDiameter d, coating included [mm]
   * @param length how far it reaches beyond the body to its inside [mm]
   * @return the wire's length [mm]
   */
  double wireLength(double meanDiameter, double wireDiameter, double length) {
    double bent = type.turns() * (meanDiameter - wireDiameter);
    return type.turns() * Math.PI * meanDiameter + Math.max(0, length - bent);
  }
}
