package coilwright.limit;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.PegasusSolver;
import org.apache.commons.math3.exception.TooManyEvaluationsException;

/** Solves a closed form for the coil count, to say where a bound is expected. */
final class ClosedForm {

  /** Ratios of value and bound beyond this say only on which side they are, as logarithms. */
  private static final double FARTHEST = 3.4;

  private static final double ACCURACY = 1e-13;
  private static final int MOST_EVALUATIONS = 60;

  private ClosedForm() {}

  /**
   * The coil count at which a value comes to a bound.
   *
   * @param value the value, above zero between the counts
   * @param bound the bound, above zero
   * @param from lower coil count [-]
   * @param to upper coil count [-]
   * @return the coil count [-]; NaN where the value does not pass the bound between the counts, or
   *     too slowly
   */
  static double solve(DoubleUnaryOperator value, double bound, double from, double to) {
    UnivariateFunction excess =
        x -> clamped(StrictMath.log(value.applyAsDouble(StrictMath.exp(x)) / bound));
    double low = StrictMath.log(from);
    double high = StrictMath.log(to);
    if (!(excess.value(low) * excess.value(high) < 0)) {
      return Double.NaN;
    }
    try {
      return StrictMath.exp(
          new PegasusSolver(ACCURACY, ACCURACY, ACCURACY)
              .solve(MOST_EVALUATIONS, excess, low, high));
    } catch (TooManyEvaluationsException e) {
      return Double.NaN;
    }
  }

  private static double clamped(double excess) {
    return Math.max(-FARTHEST, Math.min(FARTHEST, excess));
  }
}
