package coilwright.spring;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Rounding to a shop's steps. */
class RoundingTest {

  @ParameterizedTest
  @CsvSource({
    "12.2, 0.1, 12.2",
    "12.2499, 0.1, 12.2",
    "12.2501, 0.1, 12.3",
    "0.3, 0.1, 0.3",
    "12.346, 0.01, 12.35",
    "38.66666666666667, 0.1, 38.7",
    "20.4343, 0.0127, 20.4343",
    "20.44, 0.0127, 20.4343",
    "3.1415926, 0.001, 3.142",
    "0.004, 0.01, 0",
    "12.34, 5, 10"
  })
  void theNearestStepIsTaken(double value, double step, double rounded) {
    assertThat(Rounding.toStep(value, step)).isEqualTo(rounded);
  }

  /** Every multiple is the double of its decimal, and stays when it is rounded again. */
  @ParameterizedTest
  @ValueSource(strings = {"0.01", "0.1", "0.001", "0.0127", "0.127", "0.25", "0.3"})
  void multiplesAreExactDecimals(String step) {
    for (int i = 0; i <= 500; i++) {
      double exact = new BigDecimal(step).multiply(BigDecimal.valueOf(i)).doubleValue();
      double size = Double.parseDouble(step);
      assertThat(Rounding.toStep(i * size, size)).isEqualTo(exact);
      assertThat(Rounding.toStep(exact, size)).isEqualTo(exact);
    }
  }

  @Test
  void aStepOfZeroLeavesTheValue() {
    assertThat(Rounding.toStep(Math.PI, 0)).isEqualTo(Math.PI);
    assertThat(Rounding.NONE).isEqualTo(new Rounding(0, 0, 0, 0));
  }

  @Test
  void smallSpringsHaveTheirOwnSteps() {
    Rounding rounding = new Rounding(0.01, 0.1, 0.001, 0.02);
    assertThat(rounding.diameterStepAt(4.999)).isEqualTo(0.001);
    assertThat(rounding.diameterStepAt(5)).isEqualTo(0.01);
    assertThat(rounding.lengthStepAt(4.999)).isEqualTo(0.02);
    assertThat(rounding.lengthStepAt(5)).isEqualTo(0.1);
  }
}
