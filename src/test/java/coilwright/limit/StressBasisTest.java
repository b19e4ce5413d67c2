package coilwright.limit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import coilwright.material.AllowableClass;
import coilwright.problem.StressLimit;
import coilwright.source.Evidence;
import coilwright.spring.CompressionSpring;
import coilwright.spring.CompressionState;
import coilwright.spring.Duty;
import coilwright.spring.EndType;
import coilwright.spring.LoadPoint;
import coilwright.spring.LoadState;
import coilwright.spring.Method;
import coilwright.spring.SampleWire;
import coilwright.spring.Seating;
import coilwright.spring.StressCorrection;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Whose allowables apply, and to which stress each is held. */
class StressBasisTest {

  private static final StressLimit USUAL = new StressLimit(true, OptionalDouble.empty());
  private static final CompressionState SPRING =
      new CompressionState(
          new CompressionSpring(SampleWire.of(2), 16, 8, 60, EndType.SQUARED_GROUND),
          new Duty(
              List.of(LoadPoint.at(40, 100)), StressCorrection.BERGSTRAESSER, Seating.FIXED_FIXED));

  /** Shares of tensile strength as handbooks print them, the least of a range; from memory. */
  @ParameterizedTest
  @CsvSource({
    "HANDBOOK, COLD_DRAWN_CARBON, 0.45",
    "HANDBOOK, HARDENED_TEMPERED, 0.50",
    "HANDBOOK, AUSTENITIC_STAINLESS, 0.35",
    "HANDBOOK, NON_FERROUS, 0.35",
    "HANDBOOK_SET_REMOVED, COLD_DRAWN_CARBON, 0.60",
    "HANDBOOK_SET_REMOVED, HARDENED_TEMPERED, 0.65",
    "HANDBOOK_SET_REMOVED, AUSTENITIC_STAINLESS, 0.55",
    "HANDBOOK_SET_REMOVED, NON_FERROUS, 0.55",
    "EN_13906, COLD_DRAWN_CARBON, 0.56",
    "EN_13906, HARDENED_TEMPERED, 0.56",
    "EN_13906, AUSTENITIC_STAINLESS, 0.56",
    "EN_13906, NON_FERROUS, 0.56"
  })
  void shares(StressBasis basis, AllowableClass allowableClass, double share) {
    assertThat(basis.share(allowableClass)).isEqualTo(share);
    assertThat(basis.citation().evidence()).isEqualTo(Evidence.MEMORY);
  }

  @Test
  void setRemovalChangesTheHandbooksValuesOnly() {
    assertThat(StressBasis.of(Method.HANDBOOK, false)).isEqualTo(StressBasis.HANDBOOK);
    assertThat(StressBasis.of(Method.HANDBOOK, true)).isEqualTo(StressBasis.HANDBOOK_SET_REMOVED);
    assertThat(StressBasis.of(Method.EN_13906, false)).isEqualTo(StressBasis.EN_13906);
    assertThat(StressBasis.of(Method.EN_13906, true)).isEqualTo(StressBasis.EN_13906);
  }

  @Test
  void eachIsHeldToItsOwnStress() {
    LoadState load = SPRING.mostCompressed();
    assertThat(judged(StressBasis.HANDBOOK).value()).isEqualTo(load.correctedShearStress());
    assertThat(judged(StressBasis.HANDBOOK_SET_REMOVED).value())
        .isCloseTo(load.shearStress() * (1 + 0.5 / 8), within(1e-12 * load.shearStress()));
    assertThat(judged(StressBasis.EN_13906).value()).isEqualTo(load.shearStress());
  }

  @Test
  void theCheckSaysWhichStressAndWhoseBound() {
    assertThat(judged(StressBasis.EN_13906).check().definition()).isEqualTo("uncorrected");
    assertThat(judged(StressBasis.EN_13906).source().text()).startsWith("EN 13906-1");
    assertThat(judged(StressBasis.HANDBOOK_SET_REMOVED).check().definition())
        .isEqualTo("times 1 + 0.5/C, set removed");
  }

  /** A share of the file keeps the stress of the check that it overrides. */
  @Test
  void aShareOfTheFileKeepsTheDefinition() {
    StressLimit own = new StressLimit(true, OptionalDouble.of(0.4));
    Finding found =
        StressBound.atSolid(own, StressBasis.EN_13906, StressCorrection.WAHL).judge(SPRING);
    assertThat(found.value()).isEqualTo(SPRING.solid().shearStress());
    assertThat(found.bound()).isEqualTo(0.4 * SampleWire.STRENGTH);
    assertThat(found.source().text()).contains("problem file");
  }

  private static Finding judged(StressBasis basis) {
    return StressBound.atLoad(USUAL, basis, StressCorrection.BERGSTRAESSER, false).judge(SPRING);
  }
}
