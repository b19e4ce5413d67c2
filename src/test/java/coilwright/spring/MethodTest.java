package coilwright.spring;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

/** What the two methods reckon differently. */
class MethodTest {

  private static final double EXACT = 1e-12;
  private static final double D = 2;
  private static final double TOLERANCE = SampleWire.TOLERANCE.at(D);

  @ParameterizedTest
  @EnumSource
  void theHandbooksStackNominalWire(EndType ends) {
    assertThat(Method.HANDBOOK.solidLength(ends, 8, SampleWire.of(D), 0))
        .isCloseTo(ends.solidLength(8, D), within(EXACT));
  }

  @Test
  void theStandardStacksTheGreatestWire() {
    double greatest = D + TOLERANCE;
    assertThat(TOLERANCE).isPositive();
    assertThat(standard(EndType.SQUARED_GROUND, 0)).isCloseTo(10 * greatest, within(EXACT));
    assertThat(standard(EndType.SQUARED, 0)).isCloseTo(11.5 * greatest, within(EXACT));
  }

  @Test
  void theStandardIsTheLongerSolidSpring() {
    for (EndType ends : new EndType[] {EndType.SQUARED, EndType.SQUARED_GROUND}) {
      assertThat(standard(ends, 0))
          .isGreaterThan(Method.HANDBOOK.solidLength(ends, 8, SampleWire.of(D), 0));
    }
  }

  @ParameterizedTest
  @EnumSource
  void aCoatingAddsTwiceItsThicknessToEveryWire(Method method) {
    double bare = method.solidLength(EndType.SQUARED_GROUND, 8, SampleWire.of(D), 0);
    double coated = method.solidLength(EndType.SQUARED_GROUND, 8, SampleWire.of(D), 0.01);
    assertThat(coated - bare).isCloseTo(10 * 0.02, within(EXACT));
  }

  @ParameterizedTest
  @CsvSource({"PLAIN", "PLAIN_GROUND"})
  void theStandardHasNoOpenEnds(EndType ends) {
    assertThatThrownBy(() -> Method.EN_13906.solidLength(ends, 8, SampleWire.of(D), 0))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("en-13906");
  }

  @ParameterizedTest
  @CsvSource({"12, 4", "16, 5", "20, 7"})
  void theStandardLetsTheCoilGrowAboutTwiceAsMuch(double coil, double pitch) {
    double held = Method.HANDBOOK.outsideDiameterAtSolid(coil, pitch, D, 0) - coil - D;
    double free = Method.EN_13906.outsideDiameterAtSolid(coil, pitch, D, 0) - coil - D;
    assertThat(free / held).isBetween(1.4, 1.95);
  }

  @ParameterizedTest
  @EnumSource
  void aCoilWoundTightDoesNotGrow(Method method) {
    assertThat(method.outsideDiameterAtSolid(16, D, D, 0)).isCloseTo(18, within(EXACT));
    assertThat(method.outsideDiameterAtSolid(16, D + 0.02, D, 0.01))
        .isCloseTo(18.02, within(EXACT));
  }

  @Test
  void theGapsGrowWithTheCoilsAndTheirWidth() {
    double one = GapSum.least(16, D, 1);
    assertThat(one).isCloseTo(0.0015 * 128 + 0.2, within(EXACT));
    assertThat(GapSum.least(16, D, 8)).isCloseTo(8 * one, within(EXACT));
    assertThat(GapSum.least(32, 2 * D, 1)).isCloseTo(2 * one, within(EXACT));
  }

  @Test
  void whatIsKeptIsTheGreaterOfShareAndGaps() {
    OptionalDouble none = OptionalDouble.empty();
    assertThat(new Travel(10, none, false).toSolid(16, D, 8)).isEqualTo(10);
    assertThat(new Travel(10, OptionalDouble.of(0.15), false).toSolid(16, D, 8))
        .isCloseTo(11.5, within(EXACT));
    double gaps = GapSum.least(16, D, 8);
    assertThat(new Travel(10, none, true).toSolid(16, D, 8)).isCloseTo(10 + gaps, within(EXACT));
    assertThat(new Travel(10, OptionalDouble.of(0.15), true).toSolid(16, D, 8))
        .isCloseTo(10 + Math.max(1.5, gaps), within(EXACT));
    assertThat(new Travel(10, none, true).keepingNothing().toSolid(16, D, 8)).isEqualTo(10);
  }

  private static double standard(EndType ends, double coating) {
    return Method.EN_13906.solidLength(ends, 8, SampleWire.of(D), coating);
  }
}
