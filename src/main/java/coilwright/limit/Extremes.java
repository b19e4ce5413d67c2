package coilwright.limit;

import java.util.Arrays;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/**
 * Where a smooth function of the coil count turns: found between samples at even ratios, then
 * closed in on.
 */
final class Extremes {

  private static final int SAMPLES = 40;

  private Extremes() {}

  /**
   * The turns inside a range.
   *
   * @param from lower end [-], above zero
   * @param to upper end [-]
   * @param value the function
   * @return coil counts, rising; none where the range is empty
   */
  static double[] between(double from, double to, DoubleUnaryOperator value) {
    if (!(to > from)) {
      return new double[0];
    }
    double[] coils = new double[SAMPLES];
    double[] values = new double[SAMPLES];
    for (int i = 0; i < SAMPLES; i++) {
      coils[i] = from * StrictMath.pow(to / from, (double) i / (SAMPLES - 1));
      values[i] = value.applyAsDouble(coils[i]);
    }
    double[] turns = new double[SAMPLES];
    int count = 0;
    for (int i = 1; i < SAMPLES - 1; i++) {
      boolean rises = values[i] > values[i - 1];
      if (rises != values[i + 1] > values[i]) {
        turns[count++] = closed(coils[i - 1], coils[i + 1], rises, value);
      }
    }
    return Arrays.copyOf(turns, count);
  }

  private static double closed(
      double from, double to, boolean greatest, DoubleUnaryOperator value) {
    return new BrentOptimizer(1e-8, 1e-12)
        .optimize(
            new MaxEval(500),
            greatest ? GoalType.MAXIMIZE : GoalType.MINIMIZE,
            new SearchInterval(from, to),
            new UnivariateObjectiveFunction(value::applyAsDouble))
        .getPoint();
  }
}
