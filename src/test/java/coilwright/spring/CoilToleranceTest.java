package coilwright.spring;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The tolerance of the coil diameter: its order, its ends, and another publication's rule. */
class CoilToleranceTest {

  @Test
  void neverFallsAsTheCoilWidensOrItsIndexGrows() {
    for (double coil = 0.63; coil < 250; coil *= 1.02) {
      for (double index = 3.1; index < 22; index += 0.5) {
        double here = CoilTolerance.of(coil, coil / index);
        assertThat(here).isPositive().isLessThan(0.25 * coil);
        assertThat(CoilTolerance.of(1.02 * coil, 1.02 * coil / index)).isGreaterThanOrEqualTo(here);
        assertThat(CoilTolerance.of(coil, coil / (index + 0.5))).isGreaterThanOrEqualTo(here);
      }
    }
  }

  @ParameterizedTest
  @CsvSource({"10, 1.25, 0.25", "10.001, 1.25, 0.35", "10, 1.2, 0.30", "10, 0.714, 0.35"})
  void aBoundBelongsToTheRowBelowIt(double coil, double wire, double tolerance) {
    assertThat(CoilTolerance.of(coil, wire)).isEqualTo(tolerance);
  }

  /**
   * JIS B 2704 in grade 2, seen on a trade page: 1.5, 2 and 3 % of the coil for an index to 8, 15
   * and 22, at least 0.2, 0.3 and 0.5 mm. Another standard: the same order, not the same figure.
   */
  @ParameterizedTest
  @CsvSource({"4, 0.8", "8, 1.5", "12, 2", "20, 3", "40, 6", "80, 12", "30, 3", "60, 5", "25, 1.5"})
  void isOfTheOrderOfAnotherStandard(double coil, double wire) {
    double index = coil / wire;
    double other =
        index <= 8
            ? Math.max(0.2, 0.015 * coil)
            : index <= 15 ? Math.max(0.3, 0.02 * coil) : Math.max(0.5, 0.03 * coil);
    assertThat(CoilTolerance.of(coil, wire) / other).isBetween(0.6, 1.7);
  }

  @Test
  void theStepsNearADiameterAreThoseThatAClearanceCanMeet() {
    assertThat(CoilTolerance.stepsNear(10.2, 1.3)).contains(10).contains(1.3 * 8);
    assertThat(CoilTolerance.stepsNear(13, 2.2)).isEmpty();
  }
}
