package coilwright.limit;

import static coilwright.published.Published.Column.QUANTITY;
import static coilwright.published.Published.Column.VALUE;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import coilwright.material.AllowableClass;
import coilwright.material.Wire;
import coilwright.material.WireSize;
import coilwright.problem.StressLimit;
import coilwright.published.Published;
import coilwright.source.Evidence;
import coilwright.spring.AngularRate;
import coilwright.spring.BendingFactor;
import coilwright.spring.Legs;
import coilwright.spring.Method;
import coilwright.spring.SampleWire;
import coilwright.spring.TorquePoint;
import coilwright.spring.TorsionDuty;
import coilwright.spring.TorsionSpring;
import coilwright.spring.TorsionState;
import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Whose allowables apply to torsion springs, to which stress, and that no others do. */
class BendingBasisTest {

  private static final StressLimit USUAL = new StressLimit(true, OptionalDouble.empty());

  static Stream<Published> shares() {
    return Published.ofGroup("bending allowables", VALUE);
  }

  /** The share that applies is within its tolerance of the published one, and never above it. */
  @ParameterizedTest(name = "{0}")
  @MethodSource("shares")
  void shareIsAsPublishedOrSafer(Published row) {
    double share =
        switch (row.text(QUANTITY)) {
          case "en-13906 share" -> BendingBasis.EN_13906.share(AllowableClass.COLD_DRAWN_CARBON);
          case "opening" -> BendingBasis.OPENING;
          default -> BendingBasis.HANDBOOK.share(AllowableClass.valueOf(row.text(QUANTITY)));
        };
    double published = row.number(VALUE) / 100;
    assertThat(share).isCloseTo(published, row.closeness()).isLessThanOrEqualTo(published);
  }

  @ParameterizedTest
  @EnumSource
  void theStandardHasOneShareForAll(AllowableClass allowableClass) {
    assertThat(BendingBasis.EN_13906.share(allowableClass)).isEqualTo(0.70);
  }

  @Test
  void theMethodChooses() {
    assertThat(BendingBasis.of(Method.HANDBOOK)).isEqualTo(BendingBasis.HANDBOOK);
    assertThat(BendingBasis.of(Method.EN_13906)).isEqualTo(BendingBasis.EN_13906);
  }

  @ParameterizedTest
  @EnumSource
  void openingTakesAFifthAndSaysSo(BendingBasis basis) {
    Allowable closing = basis.allowable(USUAL, AllowableClass.HARDENED_TEMPERED, true);
    Allowable opening = basis.allowable(USUAL, AllowableClass.HARDENED_TEMPERED, false);
    assertThat(opening.share()).isCloseTo(0.8 * closing.share(), within(1e-15));
    assertThat(opening.source().text()).contains("less 20 % when opening");
    assertThat(closing.source().text()).doesNotContain("opening");
    assertThat(closing.source().evidence()).isEqualTo(Evidence.MEMORY);
  }

  @Test
  void theStandardsShareNamesTheOtherOneInPrint() {
    assertThat(
            BendingBasis.EN_13906
                .allowable(USUAL, AllowableClass.COLD_DRAWN_CARBON, true)
                .source()
                .text())
        .contains("0.70 Rm", "0.75 Rm", "from memory");
  }

  @Test
  void aShareOfTheFileStandsAsItIsInBothDirections() {
    StressLimit file = new StressLimit(true, OptionalDouble.of(0.75));
    for (boolean closing : new boolean[] {true, false}) {
      Allowable bound =
          BendingBasis.EN_13906.allowable(file, AllowableClass.COLD_DRAWN_CARBON, closing);
      assertThat(bound.share()).isEqualTo(0.75);
      assertThat(bound.source().text()).contains("problem file");
    }
  }

  @Test
  void eachIsHeldToItsOwnStress() {
    TorsionState state = state(SampleWire.of(2));
    Finding handbook = BendingBound.of(USUAL, BendingBasis.HANDBOOK, true).judge(state);
    Finding standard = BendingBound.of(USUAL, BendingBasis.EN_13906, true).judge(state);
    assertThat(handbook.value()).isEqualTo(state.greatest().correctedBendingStress());
    assertThat(standard.value()).isEqualTo(state.greatest().bendingStress());
    assertThat(handbook.bound()).isCloseTo(0.80 * SampleWire.STRENGTH, within(1e-9));
    assertThat(standard.bound()).isCloseTo(0.70 * SampleWire.STRENGTH, within(1e-9));
    assertThat(handbook.check().definition()).startsWith("with the inner factor Ki");
    assertThat(standard.check().definition()).startsWith("uncorrected");
  }

  /** Those of compression springs are other numbers, of another type, found by another way. */
  @ParameterizedTest
  @EnumSource
  void theAllowablesOfCompressionSpringsCannotBeUsed(AllowableClass allowableClass) {
    for (BendingBasis bending : BendingBasis.values()) {
      for (StressBasis torsion : StressBasis.values()) {
        assertThat(bending.share(allowableClass)).isNotEqualTo(torsion.share(allowableClass));
      }
    }
    Stream.of(BendingBasis.class, BendingBound.class, TorsionLimits.class)
        .flatMap(type -> Arrays.stream(type.getDeclaredMethods()))
        .map(java.lang.reflect.Method::getParameterTypes)
        .forEach(types -> assertThat(types).doesNotContain(StressBasis.class));
  }

  /** A grade's own shares are meant for torsion of the wire: they do not move the bound. */
  @Test
  void aGradesOwnSharesAreNotLookedAt() {
    OptionalDouble own = OptionalDouble.of(0.01);
    Wire wire =
        SampleWire.grade(AllowableClass.COLD_DRAWN_CARBON, own, own)
            .drawnTo(WireSize.explicit("2", 2));
    BendingBound bound = BendingBound.of(USUAL, BendingBasis.HANDBOOK, true);
    assertThat(bound.judge(state(wire)).bound())
        .isEqualTo(bound.judge(state(SampleWire.of(2))).bound());
  }

  private static TorsionState state(Wire wire) {
    TorquePoint load = new TorquePoint(OptionalDouble.empty(), OptionalDouble.of(800));
    TorsionDuty duty =
        new TorsionDuty(true, List.of(load), false, AngularRate.HANDBOOK, BendingFactor.INNER, 0);
    return new TorsionState(new TorsionSpring(wire, 16, 6, new Legs(10, 10)), duty, 0);
  }
}
