package coilwright.limit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import coilwright.problem.Envelope;
import coilwright.problem.LimitName;
import coilwright.spring.BendingFactor;
import coilwright.spring.CoilTolerance;
import coilwright.spring.Legs;
import coilwright.spring.Rounding;
import coilwright.spring.SampleWire;
import coilwright.spring.TorquePoint;
import coilwright.spring.TorsionDuty;
import coilwright.spring.TorsionFamily;
import coilwright.spring.TorsionState;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Where a torsion spring is tightest in its space, and what that leaves of its coils. */
class TorsionSpaceTest {

  private static final OptionalDouble NONE = OptionalDouble.empty();
  private static final TorsionFamily CLOSING = family(true);
  private static final TorsionFamily OPENING = family(false);

  @Test
  void aClosingSpringIsTightestRoundItsArborWhenWoundUp() {
    TorsionState state = CLOSING.at(6);
    Finding arbor = judged(CLOSING, state, LimitName.ARBOR);
    assertThat(arbor.value()).isEqualTo(state.greatest().insideDiameter() - 0.1);
    assertThat(arbor.bound()).isEqualTo(10.4);
    assertThat(arbor.check().definition()).contains("wound up", "coating included");
    Finding bore = judged(CLOSING, state, LimitName.BORE);
    assertThat(bore.value()).isCloseTo(state.spring().outsideDiameter() + 0.1, within(1e-12));
    assertThat(bore.bound()).isEqualTo(29.6);
    assertThat(bore.check().definition()).contains("free state");
  }

  @Test
  void anOpeningSpringIsTightestInItsBoreWhenUnwound() {
    TorsionState state = OPENING.at(6);
    Finding arbor = judged(OPENING, state, LimitName.ARBOR);
    assertThat(arbor.value()).isCloseTo(state.spring().insideDiameter() - 0.1, within(1e-12));
    assertThat(arbor.check().definition()).contains("free state");
    Finding bore = judged(OPENING, state, LimitName.BORE);
    assertThat(bore.value()).isEqualTo(state.greatest().outsideDiameter() + 0.1);
    assertThat(bore.check().definition()).contains("unwound");
  }

  @Test
  void theBodyIsMeasuredAtTheGreatestTorque() {
    for (TorsionFamily family : List.of(CLOSING, OPENING)) {
      TorsionState state = family.at(6);
      Finding length = judged(family, state, LimitName.BODY_LENGTH);
      assertThat(length.value()).isEqualTo(state.greatest().bodyLength());
      assertThat(length.bound()).isEqualTo(20);
      assertThat(length.value() > state.freeBodyLength()).isEqualTo(family == CLOSING);
    }
  }

  @Test
  void plainDiametersAreNominal() {
    TorsionState state = CLOSING.at(6);
    assertThat(judged(CLOSING, state, LimitName.OUTSIDE_DIAMETER).value())
        .isEqualTo(state.spring().outsideDiameter());
    assertThat(judged(CLOSING, state, LimitName.INSIDE_DIAMETER).value())
        .isEqualTo(state.spring().insideDiameter());
  }

  /** Of the whole range of arbors and bores, steps of the assumed tolerance included. */
  @ParameterizedTest
  @CsvSource({
    "true, 5.2", "true, 8.3", "true, 9.8", "true, 13.6", "true, 24.6", "true, 61",
    "false, 5.2", "false, 8.3", "false, 9.8", "false, 13.6", "false, 24.6", "false, 61"
  })
  void whatAnAssumedClearanceLeavesAgreesWithAFineScan(boolean closing, double size) {
    TorsionFamily family = closing ? CLOSING : OPENING;
    Envelope space =
        new Envelope(
            OptionalDouble.of(size), OptionalDouble.of(size), NONE, NONE, NONE, NONE, NONE);
    limits(space, closing)
        .forEach(
            limit -> {
              CoilSet left = Reach.of(limit, new Trail<>(family));
              for (double coils = 0.2; coils < family.mostCoils(); coils *= 1.0005) {
                if (!near(left, coils)) {
                  assertThat(limit.judge(family.at(coils)).holds())
                      .as("%s at %s coils of %s", limit.name(), coils, left)
                      .isEqualTo(!left.intersect(CoilSet.of(coils, coils)).isEmpty());
                }
              }
            });
  }

  private static boolean near(CoilSet left, double coils) {
    return left.intervals().stream()
        .anyMatch(
            interval ->
                Math.abs(coils - interval.from()) < 1e-6 * coils
                    || Math.abs(coils - interval.to()) < 1e-6 * coils);
  }

  @Test
  void anOmittedClearanceIsTheToleranceOfTheFreeCoil() {
    TorsionState state = CLOSING.at(6);
    Envelope space = new Envelope(NONE, OptionalDouble.of(10), NONE, NONE, NONE, NONE, NONE);
    Finding arbor = limits(space, true).findFirst().orElseThrow().judge(state);
    assertThat(arbor.bound())
        .isEqualTo(
            10 + CoilTolerance.of(state.spring().meanDiameter(), state.spring().wireDiameter()));
    assertThat(arbor.check().definition()).contains("assumed");
  }

  private static Stream<Limit<TorsionState>> limits(Envelope space, boolean closing) {
    OptionalDouble length = OptionalDouble.of(20);
    return Stream.concat(
        TorsionSpace.outside(space, closing, ", coating included").stream(),
        TorsionSpace.inside(space, length, closing, ", coating included").stream());
  }

  private static Finding judged(TorsionFamily family, TorsionState state, LimitName name) {
    Envelope space =
        new Envelope(
            OptionalDouble.of(30),
            OptionalDouble.of(10),
            OptionalDouble.of(0.4),
            OptionalDouble.of(31),
            OptionalDouble.of(9),
            NONE,
            NONE);
    return limits(space, family.duty().closing())
        .filter(limit -> limit.name() == name)
        .findFirst()
        .orElseThrow()
        .judge(state);
  }

  private static TorsionFamily family(boolean closing) {
    TorquePoint load = new TorquePoint(OptionalDouble.of(closing ? 2 : -2), OptionalDouble.of(600));
    TorsionDuty duty =
        new TorsionDuty(closing, List.of(load), true, 10.8, BendingFactor.INNER, 0.05);
    return new TorsionFamily(
        SampleWire.of(1.8), new Legs(20, 20), 300, 0, false, duty, Rounding.NONE);
  }
}
