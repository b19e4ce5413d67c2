package coilwright.spring;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The springs of one wire on one load line. */
class CompressionFamilyTest {

  private static final double D = 1.4;
  private static final LoadLine LINE = LoadLine.through(32, 18, 22, 45);
  private static final Rounding STEPS = new Rounding(0.01, 0.1, 0.001, 0.01);

  @ParameterizedTest
  @ValueSource(doubles = {0.5, 3, 8.25, 40, 150})
  void everySpringMeetsTheLoads(double coils) {
    CompressionState state = family(LINE, Rounding.NONE).at(coils);
    assertThat(state.coils()).isEqualTo(coils);
    assertThat(state.rate()).isCloseTo(2.7, withinPercentage(1e-10));
    assertThat(state.loads().get(0).force()).isCloseTo(18, within(1e-9));
    assertThat(state.loads().get(1).force()).isCloseTo(45, within(1e-9));
  }

  @Test
  void theCoilTightensAsTheCountGrows() {
    CompressionFamily family = family(LINE, STEPS);
    assertThat(family.at(family.mostCoils()).spring().springIndex()).isBetween(1.0, 1.0001);
    assertThat(family.fewestCoils()).isPositive().isLessThan(family.mostCoils());
    assertThat(family.coilsAt(family.meanDiameterAt(8))).isCloseTo(8, within(1e-9));
    assertThat(family.meanDiameterAt(9)).isLessThan(family.meanDiameterAt(8));
  }

  @Test
  void aRoundedSpringHasRoundDimensions() {
    CompressionSpring spring = family(LINE, STEPS).rounded(8).orElseThrow().spring();
    double exact = family(LINE, STEPS).meanDiameterAt(8);
    assertThat(spring.freeLength()).isEqualTo(38.7);
    assertThat(spring.meanDiameter()).isEqualTo(Rounding.toStep(exact, 0.01));
    assertThat(spring.meanDiameter()).isCloseTo(exact, within(0.005));
  }

  @Test
  void roundingThatLeavesNoCoilLeavesNoSpring() {
    CompressionFamily family = family(LINE, new Rounding(5, 0.1, 5, 0.1));
    assertThat(family.rounded(family.mostCoils())).isEmpty();
    assertThat(family(LINE, new Rounding(0.01, 1000, 0.01, 1000)).rounded(8)).isEmpty();
  }

  @Test
  void withoutRoundingNothingMoves() {
    CompressionFamily family = family(LINE, Rounding.NONE);
    assertThat(family.roundingShare(8)).isZero();
    assertThat(family.play(8)).isZero();
    assertThat(family.rounded(8).orElseThrow().spring()).isEqualTo(family.at(8).spring());
  }

  /** What rounding moves a force or a stress by stays within the stated share. */
  @ParameterizedTest
  @ValueSource(doubles = {1, 3, 5.25, 8, 12.75, 40, 90})
  void roundingMovesForcesAndStressesNoMoreThanStated(double coils) {
    CompressionFamily family = family(LINE, STEPS);
    CompressionState exact = family.at(coils);
    CompressionState rounded = family.rounded(coils).orElseThrow();
    double share = family.roundingShare(coils);
    assertThat(rounded.mostCompressed().force() / exact.mostCompressed().force())
        .isCloseTo(1, within(share));
    assertThat(
            rounded.mostCompressed().correctedShearStress()
                / exact.mostCompressed().correctedShearStress())
        .isCloseTo(1, within(share));
    assertThat(share).isLessThan(0.05);
  }

  private static CompressionFamily family(LoadLine line, Rounding rounding) {
    Duty duty =
        new Duty(
            List.of(LoadPoint.at(32, 18), LoadPoint.at(22, 45)),
            StressCorrection.BERGSTRAESSER,
            Seating.FIXED_FIXED);
    return new CompressionFamily(SampleWire.of(D), EndType.SQUARED_GROUND, line, duty, rounding);
  }
}
