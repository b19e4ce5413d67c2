package coilwright.spring;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

/** A torsion spring at its loads, by hand, and how it answers when its sizes change. */
class TorsionStateTest {

  private static final double EXACT = 1e-12;
  private static final TorsionSpring SPRING =
      new TorsionSpring(SampleWire.of(2), 16, 6, new Legs(20, 25));

  /** Active coils 6 + 45/(3 pi 16); rate 206000 16/(2 pi 10.8 16 n). */
  @Test
  void closingByHand() {
    double active = 6 + 45 / (3 * Math.PI * 16);
    double rate = 206_000.0 * 16 / (2 * Math.PI * 10.8 * 16 * active);
    TorsionState state = state(SPRING, true, 0.05, at(0.3, 1.3));
    TorqueState load = state.loads().get(1);
    assertThat(state.rate()).isCloseTo(rate, within(1e-9));
    assertThat(load.deflection()).isCloseTo(1.1, within(EXACT));
    assertThat(load.torque()).isCloseTo(1.1 * rate, within(1e-9));
    assertThat(load.bendingStress()).isCloseTo(32 * 1.1 * rate / (8 * Math.PI), within(1e-9));
    double inner = (4 * 64 - 8 - 1) / (4.0 * 8 * 7);
    assertThat(load.correctedBendingStress()).isCloseTo(inner * load.bendingStress(), within(1e-9));
    double turns = 1.1 / (2 * Math.PI) * 6 / active;
    double mean = 16 * 6 / (6 + turns);
    assertThat(load.insideDiameter()).isCloseTo(mean - 2, within(1e-9));
    assertThat(load.outsideDiameter()).isCloseTo(mean + 2, within(1e-9));
    assertThat(load.bodyLength()).isCloseTo((7 + turns) * 2.1, within(1e-9));
    assertThat(load.angle()).hasValue(1.3);
    assertThat(state.greatest()).isEqualTo(load);
    assertThat(state.freeBodyLength()).isCloseTo(7 * 2.1, within(1e-9));
    assertThat(state.leastInsideDiameter()).isCloseTo(mean - 2 - 0.1, within(1e-9));
    assertThat(state.greatestOutsideDiameter()).isCloseTo(18.1, within(1e-9));
  }

  @Test
  void openingUnwindsTheBody() {
    TorsionState state = state(SPRING, false, 0.05, at(-0.5, -0.9));
    TorqueState load = state.greatest();
    double turns = 1.1 / (2 * Math.PI) * 6 / SPRING.activeCoils();
    double mean = 16 * 6 / (6 - turns);
    assertThat(load.deflection()).isCloseTo(1.1, within(EXACT));
    assertThat(load.insideDiameter()).isCloseTo(mean - 2, within(1e-9));
    assertThat(load.bodyLength()).isCloseTo((7 - turns) * 2.1, within(1e-9));
    assertThat(state.leastInsideDiameter()).isCloseTo(14 - 0.1, within(1e-9));
    assertThat(state.greatestOutsideDiameter()).isCloseTo(mean + 2.1, within(1e-9));
    assertThat(state.legAngleAt(2)).isCloseTo((Math.PI - 1.1), within(1e-9));
  }

  @Test
  void aTorqueAloneGivesItsAngle() {
    TorquePoint torque = new TorquePoint(OptionalDouble.empty(), OptionalDouble.of(400));
    TorsionState state = state(SPRING, true, 0, new TorquePoint[] {torque});
    TorqueState load = state.greatest();
    assertThat(load.torque()).isCloseTo(400, within(1e-9));
    assertThat(load.angle().orElseThrow()).isCloseTo(0.2 + 400 / state.rate(), within(1e-9));
  }

  @Test
  void anAngleBeforeTheFreeOneBearsNothing() {
    TorsionState state = state(SPRING, true, 0, at(0.1, 0.15));
    assertThat(state.loads()).allSatisfy(load -> assertThat(load.torque()).isZero());
    assertThat(state.greatest().insideDiameter()).isEqualTo(14);
  }

  @Test
  void anglesWithoutReferenceAreNotReported() {
    TorsionDuty duty = new TorsionDuty(true, List.of(at(1)), false, 10.8, BendingFactor.INNER, 0);
    TorsionState state = new TorsionState(SPRING, duty, 0);
    assertThat(state.freeAngle()).isEmpty();
    assertThat(state.greatest().angle()).isEmpty();
    assertThat(state.greatest().deflection()).isEqualTo(1);
  }

  @Test
  void fewCoilsAreNoted() {
    assertThat(state(SPRING, true, 0, at(1)).fewCoils()).isFalse();
    TorsionSpring two = new TorsionSpring(SampleWire.of(2), 16, 2.75, new Legs(20, 25));
    assertThat(state(two, true, 0, at(1)).fewCoils()).isTrue();
  }

  @Test
  void twiceAsLargeInEveryLength() {
    TorsionState small = state(SPRING, true, 0.05, at(1.3));
    TorsionSpring twice = new TorsionSpring(SampleWire.of(4), 32, 6, new Legs(40, 50));
    TorsionState large = state(twice, true, 0.1, at(1.3));
    assertRatio(large.rate(), small.rate(), 8);
    assertRatio(large.mass(), small.mass(), 8);
    assertRatio(large.wireLength(), small.wireLength(), 2);
    assertRatio(large.greatest().bendingStress(), small.greatest().bendingStress(), 1);
    assertRatio(large.greatest().insideDiameter(), small.greatest().insideDiameter(), 2);
    assertRatio(large.greatest().bodyLength(), small.greatest().bodyLength(), 2);
    assertRatio(large.freeLegAngle(), small.freeLegAngle(), 1);
  }

  @Test
  void theRateGoesWithThePowersOfItsTerms() {
    double rate = AngularRate.of(200_000, 1.5, 12, 7, 10.8);
    assertRatio(AngularRate.of(100_000, 1.5, 12, 7, 10.8), rate, 0.5);
    assertRatio(AngularRate.of(200_000, 3, 12, 7, 10.8), rate, 16);
    assertRatio(AngularRate.of(200_000, 1.5, 36, 7, 10.8), rate, 1.0 / 3);
    assertRatio(AngularRate.of(200_000, 1.5, 12, 14, 10.8), rate, 0.5);
    assertRatio(AngularRate.of(200_000, 1.5, 12, 7, 5.4), rate, 2);
    assertRatio(AngularRate.FRICTIONLESS, 32 / Math.PI, 1);
    assertRatio(AngularRate.diameterTimesCoils(200_000, 1.5, rate, 10.8), 12 * 7, 1);
  }

  @Test
  void theWireIsTheBodyAlongItsHelixAndTheLegsStraight() {
    assertThat(SPRING.wireLength()).isCloseTo(new Helix(8, 2, 6).length() + 45, within(1e-4));
    assertThat(SPRING.mass()).isCloseTo(7850e-9 * Math.PI * SPRING.wireLength(), within(1e-12));
  }

  @Test
  void badDutiesAreRefused() {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new TorsionDuty(true, List.of(), true, 10.8, BendingFactor.INNER, 0));
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new TorsionDuty(true, List.of(at(1)), true, 0, BendingFactor.INNER, 0));
    assertThatIllegalArgumentException()
        .isThrownBy(
            () -> new TorsionDuty(true, List.of(at(1)), true, 10.8, BendingFactor.INNER, -1));
  }

  private static void assertRatio(double changed, double before, double ratio) {
    assertThat(changed / before).isCloseTo(ratio, within(EXACT * ratio));
  }

  private static TorsionState state(
      TorsionSpring spring, boolean closing, double coating, TorquePoint... loads) {
    TorsionDuty duty =
        new TorsionDuty(closing, List.of(loads), true, 10.8, BendingFactor.INNER, coating);
    return new TorsionState(spring, duty, 0.2);
  }

  private static TorquePoint at(double angle) {
    return new TorquePoint(OptionalDouble.of(angle), OptionalDouble.empty());
  }

  private static TorquePoint[] at(double first, double second) {
    return new TorquePoint[] {at(first), at(second)};
  }
}
