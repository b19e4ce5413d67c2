package coilwright.search;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import coilwright.limit.CoilSet;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The practical coil counts. */
class CoilStepTest {

  @Test
  void areMultiplesReckonedInDecimal() {
    assertThat(new CoilStep(0.1).in(CoilSet.of(0.25, 0.75)))
        .containsExactly(0.3, 0.4, 0.5, 0.6, 0.7);
    assertThat(new CoilStep(0.3).in(CoilSet.of(2.9, 3.7))).containsExactly(3.0, 3.3, 3.6);
  }

  @Test
  void includeTheBoundsOfASet() {
    assertThat(new CoilStep(0.25).in(CoilSet.of(3, 3.5))).containsExactly(3.0, 3.25, 3.5);
    assertThat(new CoilStep(0.25).in(CoilSet.of(3 + 1e-12, 3.5 - 1e-12)))
        .containsExactly(3.0, 3.25, 3.5);
  }

  @Test
  void areAboveZero() {
    assertThat(new CoilStep(1).in(CoilSet.of(0, 2))).containsExactly(1.0, 2.0);
  }

  @Test
  void riseFromRangeToRange() {
    CoilSet apart = new CoilSet(List.of(new CoilSet.Interval(0, 1), new CoilSet.Interval(3, 4)));
    assertThat(new CoilStep(1).in(apart)).containsExactly(1.0, 3.0, 4.0);
    assertThat(new CoilStep(1).in(CoilSet.EMPTY)).isEmpty();
  }

  @Test
  void aroundARangeAreThoseInsideAndTheNearestOnEitherSide() {
    assertThat(new CoilStep(0.25).around(8.05, 8.6).intervals())
        .extracting(CoilSet.Interval::from)
        .containsExactly(8.0, 8.25, 8.5, 8.75);
    assertThat(new CoilStep(1).around(0.2, 0.4).intervals())
        .extracting(CoilSet.Interval::to)
        .containsExactly(1.0);
  }

  @ParameterizedTest
  @ValueSource(doubles = {0, -0.25, Double.NaN, Double.POSITIVE_INFINITY})
  void aStepIsPositiveAndFinite(double size) {
    assertThatIllegalArgumentException().isThrownBy(() -> new CoilStep(size));
  }
}
