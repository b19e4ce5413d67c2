package coilwright.problem;

import coilwright.spring.Method;
import coilwright.spring.StressCorrection;
import java.util.OptionalDouble;

/**
 * The limits a spring must hold, defaults filled in.
 *
 * @param springIndex C [-]
 * @param activeCoils n [-]
 * @param maxPitchAngle [rad], or empty
 * @param clashAllowance travel left before solid as a share of the greatest deflection [-], or
 *     empty
 * @param gapSum whether the sum of gaps of EN 13906-1 must be left before solid
 * @param method whose allowables and formulas apply
 * @param stressCorrection which factor corrects the stress
 * @param stressAtLoad the bound at the most compressed load
 * @param stressAtSolid the bound at solid
 * @param buckling where stability is judged
 * @param minSurgeFrequency [Hz], or empty
 */
public record DesignLimits(
    Band springIndex,
    Band activeCoils,
    OptionalDouble maxPitchAngle,
    OptionalDouble clashAllowance,
    boolean gapSum,
    Method method,
    StressCorrection stressCorrection,
    StressLimit stressAtLoad,
    StressLimit stressAtSolid,
    BucklingRule buckling,
    OptionalDouble minSurgeFrequency) {

  /** What holds where the file says nothing. */
  public static final DesignLimits DEFAULTS =
      new DesignLimits(
          band(5, 12),
          band(3, 60),
          OptionalDouble.of(Math.toRadians(12)),
          OptionalDouble.of(0.15),
          false,
          Method.HANDBOOK,
          StressCorrection.BERGSTRAESSER,
          new StressLimit(true, OptionalDouble.empty()),
          new StressLimit(true, OptionalDouble.empty()),
          BucklingRule.AT_LOAD_UNLESS_GUIDED,
          OptionalDouble.empty());

  private static Band band(double min, double max) {
    return new Band(OptionalDouble.of(min), OptionalDouble.of(max));
  }
}
