package coilwright.spring;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Extension springs along a family: what follows from what, exactly and as a shop would set it. */
class ExtensionFamilyTest {

  private static final OptionalDouble NONE = OptionalDouble.empty();
  private static final List<LoadPoint> LOADS =
      List.of(LoadPoint.at(60, 10), LoadPoint.at(85, 30), LoadPoint.at(70, 18));
  private static final double RATE = 0.8;
  private static final double ZERO = 47.5;

  @ParameterizedTest
  @ValueSource(doubles = {0.5, 7, 22.25, 60, 200})
  void everySpringMeetsTheLoads(double coils) {
    for (HookFit fit :
        List.of(
            HookFit.natural(),
            HookFit.ofHookLength(9),
            HookFit.ofFreeLength(52),
            HookFit.ofPreferredTension())) {
      ExtensionState state = family(fit, OptionalDouble.of(ZERO), LOADS, Rounding.NONE).at(coils);
      assertThat(state.coils()).isEqualTo(coils);
      assertThat(state.rate()).isCloseTo(RATE, within(1e-12));
      assertThat(state.initialTension())
          .isCloseTo(RATE * (state.freeLength() - ZERO), within(1e-9));
      assertThat(state.greatestForce()).isCloseTo(30, within(1e-9));
    }
  }

  @Test
  void theFreeLengthIsThatOfBodyAndNaturalLoops() {
    ExtensionState state = family(HookFit.natural()).at(20);
    double mean = state.spring().meanDiameter();
    assertThat(state.spring().springIndex()).isEqualTo(mean / 1.2);
    assertThat(state.freeLength()).isCloseTo(2 * (mean - 1.2) + 21 * 1.2, within(1e-12));
    assertThat(state.spring().activeCoils())
        .isCloseTo(20 + SampleWire.SHEAR_MODULUS / SampleWire.ELASTIC_MODULUS, within(1e-12));
  }

  @Test
  void hooksFollowFromWhatIsGiven() {
    assertThat(family(HookFit.ofHookLength(9)).at(20).spring().hookLength()).isEqualTo(9);
    assertThat(family(HookFit.ofFreeLength(52)).at(20).freeLength()).isCloseTo(52, within(1e-12));
    ExtensionState chosen = family(HookFit.ofPreferredTension()).at(20);
    assertThat(chosen.initialTensionStress())
        .isCloseTo(InitialTension.USUAL.middle(chosen.spring().springIndex()), within(1e-9));
  }

  @Test
  void withLengthsLeftOpenTheyFollowFromTheUsualTension() {
    List<LoadPoint> forces = List.of(force(10), force(30));
    for (HookFit fit : List.of(HookFit.natural(), HookFit.ofPreferredTension())) {
      ExtensionState state = family(fit, NONE, forces, Rounding.NONE).at(30);
      double stress = InitialTension.USUAL.middle(state.spring().springIndex());
      assertThat(state.initialTensionStress()).isCloseTo(stress, within(1e-9));
      assertThat(state.spring().hookLength())
          .isCloseTo(state.spring().insideDiameter(), within(1e-12));
      assertThat(state.extendedLength() - state.shortestLength())
          .isCloseTo(20 / RATE, within(1e-9));
    }
  }

  @Test
  void theInitialTensionIsChosenForTheLeastGreatestError() {
    Rounding coarse = new Rounding(0.5, 0.5, 0.5, 0.5);
    for (HookFit fit : List.of(HookFit.natural(), HookFit.ofPreferredTension())) {
      ExtensionState state =
          family(fit, OptionalDouble.of(ZERO), LOADS, coarse).rounded(22).orElseThrow();
      double[] forces = state.forces();
      double[] errors = {forces[0] - 10, forces[1] - 30, forces[2] - 18};
      double least = Math.min(errors[0], Math.min(errors[1], errors[2]));
      double greatest = Math.max(errors[0], Math.max(errors[1], errors[2]));
      assertThat(greatest).isCloseTo(-least, within(1e-9)).isGreaterThan(0.01);
      assertThat(state.spring().meanDiameter() % 0.5).isZero();
    }
  }

  @Test
  void onlyHooksThatFollowHaveTheirFreeLengthRounded() {
    Rounding coarse = new Rounding(0, 0.5, 0, 0.5);
    OptionalDouble zero = OptionalDouble.of(ZERO);
    double exact = family(HookFit.ofPreferredTension()).at(22).freeLength();
    assertThat(
            family(HookFit.ofPreferredTension(), zero, LOADS, coarse)
                .rounded(22)
                .orElseThrow()
                .freeLength())
        .isCloseTo(Math.rint(exact / 0.5) * 0.5, within(1e-9));
    for (HookFit fit : List.of(HookFit.natural(), HookFit.ofHookLength(9))) {
      assertThat(family(fit, zero, LOADS, coarse).rounded(22).orElseThrow().freeLength())
          .isCloseTo(family(fit).at(22).freeLength(), within(1e-9));
    }
  }

  @Test
  void aSingleLoadIsHeldTogetherWithTheLine() {
    List<LoadPoint> one = List.of(LoadPoint.at(85, 30));
    Rounding coarse = new Rounding(0.5, 0, 0.5, 0);
    ExtensionState state =
        family(HookFit.natural(), OptionalDouble.of(ZERO), one, coarse).rounded(22).orElseThrow();
    double atLoad = state.forces()[0] - 30;
    double free = state.initialTension() - RATE * (state.freeLength() - ZERO);
    assertThat(atLoad).isCloseTo(-free, within(1e-9)).isNotCloseTo(0, within(0.01));
  }

  @Test
  void noSpringIsLeftWhereCoilOrBendHasNoInside() {
    ExtensionFamily family = family(HookFit.natural());
    assertThat(family.at(family.mostCoils()).spring().sideIndex()).isCloseTo(1, within(1e-5));
    assertThat(
            family(HookFit.natural(), OptionalDouble.of(ZERO), LOADS, new Rounding(9, 0, 9, 0))
                .rounded(family.mostCoils()))
        .isEmpty();
    assertThatIllegalArgumentException()
        .isThrownBy(
            () ->
                new ExtensionSpring(
                    SampleWire.of(1), 2, 5, new Hooks(HookType.FULL_LOOP, 0.5, 0.25, 0), 1, 0));
  }

  @Test
  void aRateStifferThanTheHooksAloneLeavesNoSpring() {
    ExtensionFamily stiff =
        new ExtensionFamily(
            new ExtensionCurve(
                SampleWire.of(0.2),
                hooks(HookType.FULL_LOOP),
                HookFit.natural(),
                1e5,
                OptionalDouble.of(ZERO),
                0),
            duty(LOADS),
            Rounding.NONE);
    assertThat(stiff.hasSprings()).isFalse();
    assertThat(family(HookFit.natural()).hasSprings()).isTrue();
  }

  /**
   * Body along its helix, loops flat and whole, half hooks half, what they reach beyond straight.
   */
  @ParameterizedTest
  @EnumSource
  void theWireIsThatOfBodyAndHooks(HookType type) {
    double natural = type.naturalShare() * 14;
    ExtensionSpring spring =
        new ExtensionSpring(SampleWire.of(2), 16, 20, hooks(type), natural + 3, 0);
    double body = 20 * Math.sqrt(Math.pow(Math.PI * 16, 2) + 4);
    double turns = type == HookType.HALF_LOOP ? 0.5 : 1;
    double straight = natural + 3 - turns * 14;
    assertThat(spring.wireLength())
        .isCloseTo(body + 2 * (turns * Math.PI * 16 + straight), within(1e-9));
    assertThat(spring.mass()).isCloseTo(spring.wireLength() * Math.PI * 7850e-9, within(1e-12));
  }

  @Test
  void coatingCountsWhereCoilsTouchAndClear() {
    ExtensionSpring bare =
        new ExtensionSpring(SampleWire.of(2), 16, 20, hooks(HookType.FULL_LOOP), 14, 0);
    ExtensionSpring covered =
        new ExtensionSpring(SampleWire.of(2), 16, 20, hooks(HookType.FULL_LOOP), 14, 0.05);
    assertThat(covered.bodyLength()).isCloseTo(21 * 2.1, within(1e-12));
    assertThat(covered.loopInside()).isCloseTo(bare.loopInside() - 0.1, within(1e-12));
    assertThat(covered.rate()).isEqualTo(bare.rate());
  }

  @Test
  void aSpringIsSlackBelowItsFreeLength() {
    ExtensionState state = family(HookFit.natural()).at(22);
    List<LoadPoint> loads =
        List.of(
            new LoadPoint(OptionalDouble.of(state.freeLength() - 1), NONE),
            new LoadPoint(OptionalDouble.of(state.freeLength()), NONE),
            new LoadPoint(OptionalDouble.of(state.freeLength() + 10), NONE),
            force(state.initialTension() + 4));
    ExtensionState judged = new ExtensionState(state.spring(), state.initialTension(), duty(loads));
    double first = state.initialTension();
    assertThat(judged.forces())
        .containsExactly(new double[] {0, first, first + 8, first + 4}, within(1e-9));
    assertThat(judged.loads().get(0).shearStress()).isZero();
    assertThat(judged.loads().get(2).deflection()).isCloseTo(10, within(1e-9));
    assertThat(judged.loads().get(3).length()).isCloseTo(state.freeLength() + 5, within(1e-9));
  }

  @Test
  void anOvertravelCountsOnlyBeyondTheLoads() {
    ExtensionState state = family(HookFit.natural()).at(22);
    assertThat(beyond(state, 95).extremeForce()).isCloseTo(30 + 10 * RATE, within(1e-9));
    assertThat(beyond(state, 80).extremeForce()).isCloseTo(30, within(1e-9));
    assertThat(beyond(state, 95).extremeLength()).isEqualTo(95);
    assertThat(beyond(state, 80).extremeLength()).isCloseTo(85, within(1e-9));
    assertThat(state.extremeLength()).isCloseTo(85, within(1e-9));
  }

  private static ExtensionState beyond(ExtensionState state, double overtravel) {
    ExtensionDuty duty =
        new ExtensionDuty(LOADS, StressCorrection.WAHL, OptionalDouble.of(overtravel));
    return new ExtensionState(state.spring(), state.initialTension(), duty);
  }

  private static LoadPoint force(double force) {
    return new LoadPoint(NONE, OptionalDouble.of(force));
  }

  private static ExtensionFamily family(HookFit fit) {
    return family(fit, OptionalDouble.of(ZERO), LOADS, Rounding.NONE);
  }

  private static ExtensionFamily family(
      HookFit fit, OptionalDouble zero, List<LoadPoint> loads, Rounding rounding) {
    return new ExtensionFamily(
        new ExtensionCurve(SampleWire.of(1.2), hooks(HookType.FULL_LOOP), fit, RATE, zero, 0),
        duty(loads),
        rounding);
  }

  private static Hooks hooks(HookType type) {
    return new Hooks(
        type, 0.5, 0.25, type.activeCoils(SampleWire.SHEAR_MODULUS, SampleWire.ELASTIC_MODULUS));
  }

  private static ExtensionDuty duty(List<LoadPoint> loads) {
    return new ExtensionDuty(loads, StressCorrection.BERGSTRAESSER, NONE);
  }
}
