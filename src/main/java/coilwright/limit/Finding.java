package coilwright.limit;

import coilwright.source.Citation;

/**
 * One bound held against one spring.
 *
 * @param check what the bound asks
 * @param value what the spring has, in the dimension's inner unit; NaN where nothing can fail
 * @param bound what it must not pass, in the same unit; NaN where nothing can fail
 * @param source where the bound or the law comes from
 * @param canFail false where the check holds whatever the numbers, as for a spring that cannot
 *     buckle
 */
public record Finding(Check check, double value, double bound, Citation source, boolean canFail) {

  /** A margin this little below zero still holds: it is the rounding of the arithmetic [-]. */
  public static final double TOLERANCE = 1e-9;

  /**
   * A bound that may fail.
   *
   * @param check what the bound asks
   * @param value what the spring has
   * @param bound what it must not pass
   * @param source where the bound or the law comes from
   * @return the finding
   */
  public static Finding of(Check check, double value, double bound, Citation source) {
    return new Finding(check, value, bound, source, true);
  }

  /**
   * A check that nothing can fail.
   *
   * @param check what the bound asks
   * @param source where the law comes from
   * @return the finding, without numbers
   */
  public static Finding cannotFail(Check check, Citation source) {
    return new Finding(check, Double.NaN, Double.NaN, source, false);
  }

  /** How far the value is inside the bound, in the dimension's inner unit; negative outside. */
  public double slack() {
    return check.side().slack(value, bound);
  }

  /** Whether the margin is a share of the bound; a bound of zero leaves only the slack. */
  public boolean hasMargin() {
    return canFail && bound != 0;
  }

  /**
   * Slack over the bound's size [-]; the slack itself where the bound is zero, positive infinity
   * where the check cannot fail, NaN where a number is.
   */
  public double margin() {
    if (!canFail) {
      return Double.POSITIVE_INFINITY;
    }
    return bound == 0 ? slack() : slack() / Math.abs(bound);
  }

  /** Whether the spring holds this bound; NaN does not. */
  public boolean holds() {
    return margin() >= -TOLERANCE;
  }
}
