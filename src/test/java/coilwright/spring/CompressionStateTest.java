package coilwright.spring;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** A spring at its loads: what is derived agrees with the formulas it is derived from. */
class CompressionStateTest {

  private static final double EXACT = 1e-12;
  private static final double D = 1.4;
  private static final double COIL = 12.2;
  private static final double COILS = 8;
  private static final double FREE = 45;
  private static final LoadPoint ALONE_BY_FORCE =
      new LoadPoint(OptionalDouble.empty(), OptionalDouble.of(20));

  @ParameterizedTest
  @EnumSource
  void theSpringHasTheNumbersOfItsFormulas(EndType ends) {
    CompressionSpring spring = spring(ends);
    double pitch = ends.pitch(FREE, D, COILS);
    assertThat(spring.wireDiameter()).isEqualTo(D);
    assertThat(spring.springIndex()).isEqualTo(COIL / D);
    assertThat(spring.outsideDiameter()).isEqualTo(COIL + D);
    assertThat(spring.insideDiameter()).isEqualTo(COIL - D);
    assertThat(spring.totalCoils()).isEqualTo(COILS + ends.deadCoils());
    assertThat(spring.pitch()).isEqualTo(pitch);
    assertThat(spring.pitchAngle()).isEqualTo(Coil.pitchAngle(pitch, COIL));
    assertThat(spring.wireLength())
        .isEqualTo(Coil.wireLength(COIL, pitch, COILS, ends.deadCoils()));
    assertThat(spring.mass()).isEqualTo(Mass.ofWire(SampleWire.DENSITY, D, spring.wireLength()));
    CompressionState state =
        new CompressionState(
            spring,
            new Duty(List.of(LoadPoint.at(30, 2)), StressCorrection.WAHL, Seating.PINNED_PINNED));
    assertThat(state.solidLength()).isEqualTo(ends.solidLength(COILS, D));
    assertThat(state.outsideDiameterAtSolid())
        .isEqualTo(Coil.meanDiameterAtSolid(COIL, pitch, D) + D);
  }

  @Test
  void rateFrequencyAndStabilityUseTheWiresOwnModuli() {
    CompressionSpring spring = spring(EndType.SQUARED_GROUND);
    double g = SampleWire.SHEAR_MODULUS;
    assertThat(spring.rate()).isEqualTo(Rate.of(g, D, COIL, COILS));
    assertThat(spring.surgeFrequency())
        .isEqualTo(Surge.firstFrequency(D, COIL, COILS, g, SampleWire.DENSITY));
    assertThat(spring.criticalDeflection(Seating.PINNED_PINNED))
        .isEqualTo(Buckling.criticalDeflection(COIL, FREE, 1, g, SampleWire.ELASTIC_MODULUS));
  }

  @ParameterizedTest
  @EnumSource
  void loadsLieOnTheSpringsOwnLine(StressCorrection correction) {
    CompressionState state = state(correction, LoadPoint.at(38, 999), ALONE_BY_FORCE);
    LoadLine line = new LoadLine(state.rate(), FREE);
    assertLoad(state, state.loads().get(0), 38, line.forceAt(38));
    assertLoad(state, state.loads().get(1), line.lengthUnder(20), 20);
    assertLoad(state, state.solid(), state.solidLength(), line.forceAt(state.solidLength()));
    assertThat(state.correctionFactor()).isEqualTo(correction.at(COIL / D));
  }

  @Test
  void theShortestLengthIsTheMostCompressed() {
    CompressionState state =
        state(StressCorrection.WAHL, LoadPoint.at(38, 1), LoadPoint.at(30, 2), ALONE_BY_FORCE);
    assertThat(state.mostCompressed()).isEqualTo(state.loads().get(1));
    assertThat(state.clashAllowance())
        .isCloseTo((30 - state.solidLength()) / (FREE - 30), within(EXACT));
  }

  @Test
  void aLengthBeyondTheFreeOneBearsNothing() {
    LoadState load = state(StressCorrection.WAHL, LoadPoint.at(50, 1)).loads().get(0);
    assertThat(load.force()).isZero();
    assertThat(load.deflection()).isZero();
    assertThat(load.correctedShearStress()).isZero();
  }

  @Test
  void aSpringStandsUpToItsCriticalDeflection() {
    double critical = state(StressCorrection.WAHL, LoadPoint.at(30, 1)).criticalDeflection();
    CompressionState state =
        state(
            StressCorrection.WAHL,
            LoadPoint.at(FREE - 0.999 * critical, 1),
            LoadPoint.at(FREE - 1.001 * critical, 1));
    assertThat(critical).isBetween(1.0, 30.0);
    assertThat(state.stableAt(state.loads().get(0))).isTrue();
    assertThat(state.stableAt(state.loads().get(1))).isFalse();
  }

  private static void assertLoad(
      CompressionState state, LoadState load, double length, double force) {
    double stress = ShearStress.uncorrected(load.force(), COIL, D);
    assertThat(load.length()).isCloseTo(length, within(EXACT * FREE));
    assertThat(load.force()).isCloseTo(force, within(EXACT * 100));
    assertThat(load.deflection()).isCloseTo(FREE - length, within(EXACT * FREE));
    assertThat(load.shearStress()).isEqualTo(stress);
    assertThat(load.correctedShearStress()).isEqualTo(stress * state.correctionFactor());
  }

  private static CompressionState state(StressCorrection correction, LoadPoint... loads) {
    return new CompressionState(
        spring(EndType.SQUARED), new Duty(List.of(loads), correction, Seating.PINNED_PINNED));
  }

  private static CompressionSpring spring(EndType ends) {
    return new CompressionSpring(SampleWire.of(D), COIL, COILS, FREE, ends);
  }
}
