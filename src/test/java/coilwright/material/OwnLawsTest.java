package coilwright.material;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import coilwright.source.Evidence;
import org.junit.jupiter.api.Test;

/** Strengths and moduli that a user gives for a material of their own. */
class OwnLawsTest {

  @Test
  void aConstantHoldsEverywhere() {
    assertThat(StrengthLaws.constant(1900).at(0.05)).isEqualTo(1900);
    assertThat(StrengthLaws.constant(1900).at(50)).isEqualTo(1900);
    assertThat(ModulusLaws.constant(80_000).at(3)).isEqualTo(80_000);
  }

  @Test
  void aPowerLawIsAOverDToTheM() {
    StrengthLaw law = StrengthLaws.power(2211, 0.145);
    assertThat(law.at(1)).isEqualTo(2211);
    assertThat(law.at(4)).isCloseTo(2211 / Math.pow(4, 0.145), within(1e-9));
  }

  @Test
  void stepsIncludeTheirBoundAndEndAtTheLast() {
    StrengthLaw law = StrengthLaws.steps(new double[] {1, 2}, new double[] {2100, 1950});
    assertThat(law.at(0.2)).isEqualTo(2100);
    assertThat(law.at(1)).isEqualTo(2100);
    assertThat(law.at(1.000_01)).isEqualTo(1950);
    assertThat(law.at(2)).isEqualTo(1950);
    assertThatIllegalArgumentException().isThrownBy(() -> law.at(2.01));
    assertThatIllegalArgumentException().isThrownBy(() -> law.at(0));
  }

  @Test
  void aBoundSurvivesTheRoundingOfAConversion() {
    ModulusLaw law = ModulusLaws.steps(new double[] {0.063 * 25.4, 5}, new double[] {81e3, 80e3});
    assertThat(law.at(Math.nextUp(0.063 * 25.4))).isEqualTo(81e3);
    assertThat(law.at(0.063 * 25.4 * (1 + 1e-8))).isEqualTo(80e3);
  }

  @Test
  void whatAUserGivesCountsAsSeen() {
    assertThat(StrengthLaws.constant(1900).evidenceAt(1)).isEqualTo(Evidence.SEEN);
    assertThat(StrengthLaws.power(2211, 0.145).evidenceAt(1)).isEqualTo(Evidence.SEEN);
    assertThat(ModulusLaws.constant(80_000).evidenceAt(1)).isEqualTo(Evidence.SEEN);
  }

  @Test
  void refusesWhatIsNoLaw() {
    assertThatIllegalArgumentException().isThrownBy(() -> StrengthLaws.constant(0));
    assertThatIllegalArgumentException().isThrownBy(() -> StrengthLaws.constant(Double.NaN));
    assertThatIllegalArgumentException().isThrownBy(() -> StrengthLaws.power(2211, -0.1));
    assertThatIllegalArgumentException().isThrownBy(() -> StrengthLaws.power(Double.NaN, 0.1));
    refused(new double[] {}, new double[] {});
    refused(new double[] {1, 2}, new double[] {2100});
    refused(new double[] {2, 1}, new double[] {2100, 2000});
    refused(new double[] {1, 1}, new double[] {2100, 2000});
    refused(new double[] {1, Double.NaN}, new double[] {2100, 2000});
    refused(new double[] {0, 1}, new double[] {2100, 2000});
    refused(new double[] {1}, new double[] {-2100});
  }

  private static void refused(double[] upTo, double[] value) {
    assertThatIllegalArgumentException().isThrownBy(() -> StrengthLaws.steps(upTo, value));
    assertThatIllegalArgumentException().isThrownBy(() -> ModulusLaws.steps(upTo, value));
  }
}
