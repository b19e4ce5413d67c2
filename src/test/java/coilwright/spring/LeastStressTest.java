package coilwright.spring;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** The index at which the corrected stress of a force is least, found by search. */
class LeastStressTest {

  @ParameterizedTest
  @EnumSource
  void theStatedIndexIsTheMinimum(StressCorrection correction) {
    double found =
        new BrentOptimizer(1e-10, 1e-12)
            .optimize(
                new MaxEval(200),
                GoalType.MINIMIZE,
                new SearchInterval(1.05, 6),
                new UnivariateObjectiveFunction(index -> stress(correction, index)))
            .getPoint();
    assertThat(correction.leastStressIndex()).isCloseTo(found, within(1e-6));
  }

  @ParameterizedTest
  @EnumSource
  void stressFallsBelowItAndRisesAbove(StressCorrection correction) {
    double least = correction.leastStressIndex();
    for (double share = 0.05; share < 0.95; share += 0.05) {
      double tighter = 1 + share * (least - 1);
      assertThat(stress(correction, tighter))
          .isGreaterThan(stress(correction, tighter + 0.01 * (least - 1)));
      assertThat(stress(correction, least / share))
          .isGreaterThan(stress(correction, 0.99 * least / share));
    }
  }

  /** Corrected stress of a unit force on a unit wire [MPa]. */
  private static double stress(StressCorrection correction, double index) {
    return correction.at(index) * ShearStress.uncorrected(1, index, 1);
  }
}
