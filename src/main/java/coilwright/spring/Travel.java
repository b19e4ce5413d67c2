package coilwright.spring;

import coilwright.unit.Require;
import java.util.OptionalDouble;

/**
 * How far a spring must deflect, where the lengths are left open, and what it must keep beyond:
 * from this follows the shortest free length.
 *
 * @param deflection at the greatest load [mm]
 * @param keptShare travel kept before solid, as a share of that deflection [-], or empty
 * @param gapSum whether the sum of gaps of EN 13906-1 is kept too
 */
public record Travel(double deflection, OptionalDouble keptShare, boolean gapSum) {

  /** Refuses a deflection that is not positive and finite. */
  public Travel {
    Require.positive(deflection, "deflection", "mm");
  }

  /**
   * The deflection from free to solid of the shortest spring.
   *
   * @param meanDiameter D [mm]
   * @param wireDiameter d [mm]
   * @param activeCoils n [-]
   * @return travel to solid [mm]
   * @throws IllegalArgumentException if an argument is not positive and finite
   */
  public double toSolid(double meanDiameter, double wireDiameter, double activeCoils) {
    double kept = deflection * keptShare.orElse(0);
    return deflection
        + (gapSum ? Math.max(kept, GapSum.least(meanDiameter, wireDiameter, activeCoils)) : kept);
  }

  /** The same deflection with nothing kept before solid. */
  public Travel keepingNothing() {
    return new Travel(deflection, OptionalDouble.empty(), false);
  }
}
