package coilwright.limit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import coilwright.material.AllowableClass;
import coilwright.material.Wire;
import coilwright.material.WireSize;
import coilwright.problem.LimitName;
import coilwright.problem.StressLimit;
import coilwright.source.Evidence;
import coilwright.source.Source;
import coilwright.spring.CompressionSpring;
import coilwright.spring.CompressionState;
import coilwright.spring.Duty;
import coilwright.spring.EndType;
import coilwright.spring.LoadPoint;
import coilwright.spring.SampleWire;
import coilwright.spring.Seating;
import coilwright.spring.ShearStress;
import coilwright.spring.StressCorrection;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The static stress bounds: which share of tensile strength applies, and which stress is held
 * against it.
 */
class AllowableTest {

  private static final double SHARE_OF_FILE = 0.41;
  private static final double SHARE_OF_GRADE = 0.33;
  private static final OptionalDouble NONE = OptionalDouble.empty();

  @ParameterizedTest
  @CsvSource({
    "COLD_DRAWN_CARBON, 0.45",
    "HARDENED_TEMPERED, 0.50",
    "AUSTENITIC_STAINLESS, 0.35",
    "NON_FERROUS, 0.35"
  })
  void theHandbookJudgesByClass(AllowableClass allowableClass, double share) {
    CompressionState state = state(allowableClass, NONE, NONE);
    for (StressBound bound : List.of(atLoad(NONE), atSolid(NONE))) {
      Finding finding = bound.judge(state);
      assertThat(finding.bound()).isCloseTo(share * SampleWire.STRENGTH, within(1e-9));
      assertThat(finding.source().source()).isEqualTo(Source.SHIGLEY);
    }
  }

  @Test
  void theGradesOwnSharesComeBeforeTheHandbooks() {
    CompressionState state =
        state(
            AllowableClass.COLD_DRAWN_CARBON,
            OptionalDouble.of(SHARE_OF_GRADE),
            OptionalDouble.of(2 * SHARE_OF_GRADE));
    assertThat(atLoad(NONE).judge(state).bound())
        .isCloseTo(SHARE_OF_GRADE * SampleWire.STRENGTH, within(1e-9));
    assertThat(atSolid(NONE).judge(state).bound())
        .isCloseTo(2 * SHARE_OF_GRADE * SampleWire.STRENGTH, within(1e-9));
  }

  @Test
  void theFilesShareComesBeforeAll() {
    CompressionState state =
        state(
            AllowableClass.COLD_DRAWN_CARBON,
            OptionalDouble.of(SHARE_OF_GRADE),
            OptionalDouble.of(SHARE_OF_GRADE));
    OptionalDouble file = OptionalDouble.of(SHARE_OF_FILE);
    for (StressBound bound : List.of(atLoad(file), atSolid(file))) {
      Finding finding = bound.judge(state);
      assertThat(finding.bound()).isCloseTo(SHARE_OF_FILE * SampleWire.STRENGTH, within(1e-9));
      assertThat(finding.source().source()).isEqualTo(Source.PROBLEM_FILE);
    }
  }

  @Test
  void theCorrectedStressIsJudgedAtItsPlace() {
    CompressionState state = state(AllowableClass.COLD_DRAWN_CARBON, NONE, NONE);
    double factor = StressCorrection.WAHL.at(8);
    double atLoad = factor * ShearStress.uncorrected(state.rate() * 20, 16, 2);
    double atSolid = factor * ShearStress.uncorrected(state.rate() * (60 - 20), 16, 2);
    assertThat(atLoad(NONE).judge(state).value()).isCloseTo(atLoad, within(1e-9));
    assertThat(atSolid(NONE).judge(state).value()).isCloseTo(atSolid, within(1e-9));
    assertThat(atLoad(NONE).name()).isEqualTo(LimitName.STRESS_AT_LOAD);
    assertThat(atSolid(NONE).name()).isEqualTo(LimitName.STRESS_AT_SOLID);
  }

  @Test
  void theCheckNamesItsDefinition() {
    assertThat(atLoad(NONE).judge(state(AllowableClass.NON_FERROUS, NONE, NONE)).check())
        .hasFieldOrPropertyWithValue("side", Side.MAX)
        .hasFieldOrPropertyWithValue("definition", "corrected, Wahl");
  }

  private static StressBound atLoad(OptionalDouble share) {
    return StressBound.atLoad(
        new StressLimit(true, share), StressBasis.HANDBOOK, StressCorrection.WAHL, false);
  }

  private static StressBound atSolid(OptionalDouble share) {
    return StressBound.atSolid(
        new StressLimit(true, share), StressBasis.HANDBOOK, StressCorrection.WAHL);
  }

  /** Eight squared and ground coils of 2 mm wire, 16 mm wide, 60 mm long, pressed to 40 mm. */
  private static CompressionState state(
      AllowableClass allowableClass, OptionalDouble atLoad, OptionalDouble atSolid) {
    Wire wire =
        new Wire(
            SampleWire.grade(allowableClass, atLoad, atSolid),
            WireSize.explicit("sample", 2),
            SampleWire.STRENGTH,
            SampleWire.SHEAR_MODULUS,
            SampleWire.ELASTIC_MODULUS,
            Evidence.SEEN);
    return new CompressionState(
        new CompressionSpring(wire, 16, 8, 60, EndType.SQUARED_GROUND),
        new Duty(
            List.of(LoadPoint.at(50, 1), LoadPoint.at(40, 2)),
            StressCorrection.WAHL,
            Seating.FIXED_FIXED));
  }
}
