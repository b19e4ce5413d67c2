package coilwright.problem;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

/** Limits are merged bound by bound with the defaults. */
class LimitsTest {

  private static final OptionalDouble NONE = OptionalDouble.empty();

  @Test
  void aBoundKeepsTheOther() {
    assertThat(limits("spring_index: {max: 14}").springIndex()).isEqualTo(band(5, 14));
    assertThat(limits("spring_index: {min: 4}").springIndex()).isEqualTo(band(4, 12));
    assertThat(limits("active_coils: {min: 2.5, max: 20}").activeCoils()).isEqualTo(band(2.5, 20));
    assertThat(limits("spring_index: {}").springIndex()).isEqualTo(band(5, 12));
    assertThat(limits("spring_index: {min: 8, max: 8}").springIndex()).isEqualTo(band(8, 8));
  }

  @Test
  void noneSwitchesABoundOrALimitOff() {
    assertThat(limits("spring_index: {min: none}").springIndex())
        .isEqualTo(new Band(NONE, OptionalDouble.of(12)));
    assertThat(limits("active_coils: {max: none}").activeCoils())
        .isEqualTo(new Band(OptionalDouble.of(3), NONE));
    assertThat(limits("active_coils: none").activeCoils()).isEqualTo(new Band(NONE, NONE));
    assertThat(limits("pitch_angle: none").maxPitchAngle()).isEmpty();
    assertThat(limits("pitch_angle: {max: none}").maxPitchAngle()).isEmpty();
    assertThat(limits("clash_allowance: none").clashAllowance()).isEmpty();
    assertThat(limits("surge_frequency: none").minSurgeFrequency()).isEmpty();
    assertThat(limits("surge_frequency: {min: none}").minSurgeFrequency()).isEmpty();
    assertThat(limits("stress_at_load: none").stressAtLoad())
        .isEqualTo(new StressLimit(false, NONE));
    assertThat(limits("stress_at_solid: {max: none}").stressAtSolid())
        .isEqualTo(new StressLimit(false, NONE));
    assertThat(limits("buckling: none").buckling()).isEqualTo(BucklingRule.NONE);
  }

  @Test
  void whatIsNotGivenIsTheDefault() {
    DesignLimits limits = limits("clash_allowance: 0 %");
    assertThat(limits.springIndex()).isEqualTo(band(5, 12));
    assertThat(limits.activeCoils()).isEqualTo(band(3, 60));
    assertThat(limits.maxPitchAngle()).hasValue(Math.toRadians(12));
    assertThat(limits.clashAllowance()).hasValue(0);
    assertThat(limits.stressAtLoad()).isEqualTo(new StressLimit(true, NONE));
    assertThat(limits.stressAtSolid()).isEqualTo(new StressLimit(true, NONE));
    assertThat(limits.buckling()).isEqualTo(BucklingRule.AT_LOAD_UNLESS_GUIDED);
    assertThat(limits.minSurgeFrequency()).isEmpty();
    assertThat(limits).isNotEqualTo(Files.problem(Files.LOADS).limits());
    assertThat(limits("clash_allowance: 15 %")).isEqualTo(Files.problem(Files.LOADS).limits());
  }

  @Test
  void bucklingThatIsAskedForIsJudgedInABoreToo() {
    assertThat(limits("buckling: at-load").buckling()).isEqualTo(BucklingRule.AT_LOAD);
  }

  private static DesignLimits limits(String line) {
    return Files.problem(Files.LOADS + "limits:\n  " + line + "\n").limits();
  }

  private static Band band(double min, double max) {
    return new Band(OptionalDouble.of(min), OptionalDouble.of(max));
  }
}
