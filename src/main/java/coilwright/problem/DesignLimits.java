package coilwright.problem;

import coilwright.spring.Kind;
import coilwright.spring.Method;
import coilwright.spring.StressCorrection;
import java.util.OptionalDouble;

/**
 * The limits a spring must hold, defaults filled in.
 *
 * @param springIndex C [-]
 * @param activeCoils n of a compression spring, body coils of the other kinds [-]
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

  /** What holds for compression springs where the file says nothing. */
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

  /**
   * What holds where the file says nothing.
   *
   * <p>Close-wound springs have no pitch to limit, are never pressed solid and do not buckle. How
   * small an index can be wound does not depend on the kind; an extension spring's body may have
   * any number of coils.
   *
   * @param kind the kind of spring
   * @return the limits; those that only compression springs have judge nothing for the other kinds
   */
  public static DesignLimits defaults(Kind kind) {
    if (kind == Kind.COMPRESSION) {
      return DEFAULTS;
    }
    OptionalDouble none = OptionalDouble.empty();
    Band coils = DEFAULTS.activeCoils();
    return new DesignLimits(
        DEFAULTS.springIndex(),
        kind == Kind.EXTENSION ? new Band(coils.min(), none) : coils,
        none,
        none,
        false,
        DEFAULTS.method(),
        DEFAULTS.stressCorrection(),
        new StressLimit(false, none),
        new StressLimit(false, none),
        BucklingRule.NONE,
        none);
  }

  private static Band band(double min, double max) {
    return new Band(OptionalDouble.of(min), OptionalDouble.of(max));
  }
}
