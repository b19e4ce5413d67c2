package coilwright.search;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import coilwright.limit.CoilSet;
import coilwright.limit.Finding;
import coilwright.material.WireSize;
import coilwright.problem.LegsAsked;
import coilwright.problem.LimitName;
import coilwright.problem.Problem;
import coilwright.problem.TorqueFacts;
import coilwright.problem.TorsionDesign;
import coilwright.spring.BendingFactor;
import coilwright.spring.Hand;
import coilwright.spring.Method;
import coilwright.spring.Rounding;
import coilwright.spring.TorquePoint;
import coilwright.spring.TorsionState;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The search for torsion springs, and the check of one. */
class TorsionSearchTest {

  private static final double DEG = Math.PI / 180;
  private static final OptionalDouble NONE = OptionalDouble.empty();

  /** Two loads, 150 and 450 N mm at 30 and 90 degrees from free, in wire of 1.6 mm. */
  private static TorsionDraft plain() {
    return new TorsionDraft()
        .loads(5 / DEG, 20 * DEG, 30 * DEG, 90 * DEG)
        .legs(20, 25)
        .own(GradeDraft.of("steel", 2000).grade())
        .sizes(1.6);
  }

  private static Answer<TorsionState> search(TorsionDraft draft) {
    Problem problem = draft.problem();
    return new TorsionSearch().search(problem, WireChoice.of(problem, Searched.CATALOGUE));
  }

  private static List<Candidate<TorsionState>> found(TorsionDraft draft) {
    return search(draft).feasible().stream().flatMap(List::stream).toList();
  }

  @Test
  void findsSpringsInTheStepOfTheirCoils() {
    List<Candidate<TorsionState>> found = found(plain());
    assertThat(found).hasSizeGreaterThan(5);
    assertThat(found)
        .allSatisfy(
            spring -> {
              assertThat(spring.state().coils() * 4 % 1).isZero();
              assertThat(spring.state().massHardlyVaries()).isTrue();
              assertThat(spring.leastMargin()).isPresent();
              assertThat(spring.state().endForm()).isEqualTo("straight-legs");
            });
  }

  /** Closing by 30 degrees: legs that stand at 180 under the first load stand at 150 when free. */
  @Test
  void theLegAngleLeavesWholeCoilsAndAFraction() {
    List<Candidate<TorsionState>> found = found(plain().legs(20, 25, 180 * DEG, 1));
    assertThat(found).isNotEmpty();
    for (Candidate<TorsionState> spring : found) {
      double rest = spring.state().coils() % 1;
      assertThat(rest).isCloseTo(1 - 30.0 / 360, within(1e-9));
      assertThat(spring.state().freeLegAngle() / DEG).isCloseTo(150, within(1e-6));
      assertThat(spring.state().legAngleAt(1) / DEG).isCloseTo(180, within(1e-6));
      assertThat(spring.state().legAngleAt(2) / DEG).isCloseTo(240, within(1e-6));
    }
  }

  @Test
  void openingLegsAreWoundTheOtherWay() {
    List<Candidate<TorsionState>> found =
        found(
            new TorsionDraft()
                .opening()
                .loads(5 / DEG, 20 * DEG, 30 * DEG, 90 * DEG)
                .legs(20, 25, 180 * DEG, 2)
                .own(GradeDraft.of("steel", 2500).grade())
                .sizes(1.6));
    assertThat(found).isNotEmpty();
    for (Candidate<TorsionState> spring : found) {
      assertThat(spring.state().coils() % 1).isCloseTo(0.25, within(1e-9));
      assertThat(spring.state().freeLegAngle() / DEG).isCloseTo(270, within(1e-6));
      assertThat(spring.state().legAngleAt(2) / DEG).isCloseTo(180, within(1e-6));
    }
  }

  /** A fraction that is nothing but the rounding of the arithmetic is none. */
  @ParameterizedTest
  @ValueSource(doubles = {210, 210 + 1e-12, 210 - 1e-12, 570, -150})
  void wholeCoilsStayWhole(double angle) {
    Problem problem = plain().legs(20, 25, angle * DEG, 1).problem();
    assertThat(new TorsionSearch().step(problem).in(CoilSet.of(2.5, 5.5)))
        .containsExactly(3.0, 4.0, 5.0);
  }

  @Test
  void aWireWhoseLegsAloneAreSofterSaysSo() {
    Answer<TorsionState> answer = search(plain().sizes(0.5, 1.6));
    assertThat(answer.wires()).isEqualTo(2);
    assertThat(answer.feasible()).hasSize(1);
    assertThat(answer.ruledOut()).containsOnlyKeys(LimitName.LEGS);
    Conflict conflict = answer.conflicts().get(0);
    assertThat(conflict.wire().diameter()).isEqualTo(0.5);
    assertThat(conflict.parts()).containsExactly(new Conflict.Part(LimitName.LEGS, CoilSet.EMPTY));
  }

  /** By the cantilever: legs of length l turn by M l/(3 E I), times 10.8 over 64/(2 pi). */
  @Test
  void onlySuchWiresSaySo() {
    Random random = new Random(7);
    for (int i = 0; i < 200; i++) {
      double wire = 0.3 + 1.5 * random.nextDouble();
      double stiffness =
          3 * 200_000 * Math.PI / 64 * Math.pow(wire, 4) / 45 * 64 / (2 * Math.PI) / 10.8;
      Answer<TorsionState> answer = search(plain().sizes(wire));
      assertThat(answer.ruledOut().containsKey(LimitName.LEGS))
          .as("wire of %s mm", wire)
          .isEqualTo(stiffness <= 5 / DEG);
    }
  }

  @Test
  void torquesWithoutAnglesAreMetFromFree() {
    List<Candidate<TorsionState>> found = found(plain().torques(5 / DEG, 150, 450));
    assertThat(found).isNotEmpty();
    for (Candidate<TorsionState> spring : found) {
      assertThat(spring.state().freeAngle()).isEmpty();
      assertThat(spring.state().loads().get(1).angle()).isEmpty();
      assertThat(spring.state().loads().get(1).torque()).isCloseTo(450, within(4.5));
      assertThat(spring.state().loads().get(1).deflection() / DEG).isCloseTo(90, within(1.0));
    }
    assertThat(found.stream().map(spring -> spring.state().coils()).toList())
        .isEqualTo(found(plain()).stream().map(spring -> spring.state().coils()).toList());
  }

  /** A step of the diameter so coarse that the rate is off by more than rounding may cost. */
  @Test
  void whatRoundingCostsIsHeld() {
    TorsionDraft coarse = plain().rounding(new Rounding(1, 0, 1, 0));
    assertThat(found(coarse)).hasSizeLessThan(found(plain()).size());
    assertThat(found(coarse.legs(20, 25, 180 * DEG, 1)))
        .allSatisfy(
            spring ->
                assertThat(spring.state().greatest().torque()).isCloseTo(450, within(4.5 + 1e-6)));
  }

  @Test
  void theMethodChoosesStressAndFactor() {
    TorsionDraft draft = plain().method(Method.EN_13906);
    TorsionState state = found(draft).get(0).state();
    assertThat(state.duty().factor()).isEqualTo(BendingFactor.EN_13906);
    Finding stress = finding(found(draft).get(0), LimitName.BENDING_STRESS);
    assertThat(stress.value()).isEqualTo(state.greatest().bendingStress());
    assertThat(stress.bound()).isCloseTo(1400, within(1e-9));
  }

  @Test
  void stressRisesWithTheCoils() {
    List<Candidate<TorsionState>> found = found(plain());
    for (int i = 1; i < found.size(); i++) {
      assertThat(found.get(i).leastMargin().orElseThrow())
          .isLessThan(found.get(i - 1).leastMargin().orElseThrow() + 1e-3);
    }
  }

  /** A thick wire at a soft rate: thousands of coils would do, were they not ended. */
  @Test
  void whereNothingEndsTheCoilsTwoHundredDo() {
    TorsionDraft endless =
        plain()
            .sizes(4)
            .without(
                TorsionBound.MOST_COILS, TorsionBound.LEAST_INDEX, TorsionBound.GREATEST_INDEX);
    List<Candidate<TorsionState>> found = found(endless);
    assertThat(found.get(found.size() - 1).state().coils()).isEqualTo(200);
    assertThat(found(endless.copy().with(TorsionBound.MOST_COILS, 250)))
        .hasSizeGreaterThan(found.size());
    double length =
        found(endless.copy().with(TorsionBound.BODY_LENGTH, 900)).stream()
            .mapToDouble(spring -> spring.state().coils())
            .max()
            .orElseThrow();
    assertThat(length).isCloseTo(224, within(1.0));
  }

  /** By the coils alone a body could be unwound by more turns than it has. */
  @Test
  void aBodyThatIsWoundOffBearsNothing() {
    TorsionDraft draft =
        new TorsionDraft()
            .opening()
            .loads(5 / DEG, 0, 720 * DEG)
            .own(GradeDraft.of("steel", 2000).grade())
            .sizes(1.2)
            .stressOff()
            .coilStep(0.25)
            .without(TorsionBound.values());
    List<Candidate<TorsionState>> found = found(draft);
    assertThat(found.get(0).state().coils()).isEqualTo(2.25);
    assertThat(found)
        .allSatisfy(spring -> assertThat(spring.state().greatest().outsideDiameter()).isFinite());
  }

  private static Finding finding(Candidate<TorsionState> spring, LimitName name) {
    return spring.findings().stream()
        .filter(finding -> finding.check().limit() == name)
        .findFirst()
        .orElseThrow();
  }

  private static TorsionDesign design(double meanDiameter, double coils, LegsAsked legs) {
    return new TorsionDesign(
        "steel", WireSize.explicit("1.6 mm", 1.6), meanDiameter, coils, legs, Hand.RIGHT, 0);
  }

  private static LegsAsked legs() {
    return new LegsAsked(20, 25, NONE, 1);
  }

  private static Candidate<TorsionState> check(TorsionDraft draft) {
    return SpringCheck.of(draft.problem(), new TorsionSearch(), Searched.CATALOGUE)
        .spring()
        .orElseThrow();
  }

  /** What the search found, checked as it stands, holds the same but for the setting. */
  @Test
  void aSpringThatWasFoundHoldsWhenChecked() {
    for (Candidate<TorsionState> spring : found(plain().legs(20, 25, 180 * DEG, 1))) {
      TorsionState state = spring.state();
      LegsAsked legs = new LegsAsked(20, 25, OptionalDouble.of(180 * DEG), 1);
      Candidate<TorsionState> checked =
          check(plain().design(design(state.spring().meanDiameter(), state.coils(), legs)));
      assertThat(checked.holds()).isTrue();
      assertThat(checked.state().greatest()).isEqualTo(state.greatest());
      assertThat(finding(checked, LimitName.LEG_ANGLE).value()).isCloseTo(0, within(1e-6));
    }
  }

  /** Where its legs set it, a spring of the wrong rate keeps the line's free angle. */
  @Test
  void anAngleBetweenTheLegsFixesTheFreeAngle() {
    LegsAsked asked = new LegsAsked(0, 0, OptionalDouble.of(180 * DEG), 1);
    Candidate<TorsionState> checked = check(plain().design(design(14, 6, asked)));
    assertThat(checked.state().freeAngle()).hasValue(20 * DEG);
    assertThat(checked.state().loads().get(1).torque())
        .isCloseTo(checked.state().rate() * 90 * DEG, within(1e-9));
    assertThat(finding(checked, LimitName.NOMINAL_LOAD).value())
        .isCloseTo(Math.abs(checked.state().rate() * 90 * DEG - 450), within(1e-9));
    assertThat(finding(checked, LimitName.NOMINAL_LOAD).bound()).isCloseTo(4.5, within(1e-12));
    assertThat(finding(checked, LimitName.NOMINAL_LOAD).holds()).isFalse();
  }

  /** Else it is set as a listed one would be: it misses the two loads by as much. */
  @Test
  void aSpringWithoutAnAngleBetweenItsLegsIsSetBetweenItsLoads() {
    Candidate<TorsionState> checked = check(plain().design(design(14, 6, legs())));
    double first = checked.state().loads().get(0).torque();
    double second = checked.state().loads().get(1).torque();
    List<TorquePoint> asked = checked.state().duty().loads();
    double over = first - asked.get(0).torque().orElseThrow();
    assertThat(second - asked.get(1).torque().orElseThrow()).isCloseTo(-over, within(1e-9));
    assertThat(finding(checked, LimitName.NOMINAL_LOAD).value())
        .isCloseTo(Math.abs(over), within(1e-9));
  }

  @Test
  void oneLoadWithBothIsMetByTheSetting() {
    TorquePoint both = new TorquePoint(OptionalDouble.of(1.5), OptionalDouble.of(900));
    TorquePoint angle = new TorquePoint(OptionalDouble.of(1.2), NONE);
    Candidate<TorsionState> checked =
        check(
            plain()
                .springs(3)
                .unfixed(new TorqueFacts(NONE, NONE, NONE), angle, both)
                .design(design(14, 6, legs())));
    double rate = checked.state().rate();
    assertThat(checked.state().loads().get(1).torque()).isCloseTo(300, within(1e-9));
    assertThat(checked.state().freeAngle().orElseThrow())
        .isCloseTo(1.5 - 300 / rate, within(1e-12));
    assertThat(checked.state().loads().get(0).torque()).isCloseTo(300 - 0.3 * rate, within(1e-9));
    assertThat(checked.findings())
        .noneMatch(finding -> finding.check().limit() == LimitName.NOMINAL_LOAD);
  }

  @Test
  void aFreeAngleOfTheFileIsKept() {
    TorquePoint angle = new TorquePoint(OptionalDouble.of(1.2), NONE);
    Candidate<TorsionState> checked =
        check(
            plain()
                .unfixed(new TorqueFacts(NONE, OptionalDouble.of(0.2), NONE), angle)
                .design(design(14, 6, legs())));
    assertThat(checked.state().greatest().torque()).isCloseTo(checked.state().rate(), within(1e-9));
  }

  @Test
  void anglesAloneCountFromFree() {
    TorquePoint angle = new TorquePoint(OptionalDouble.of(1.2), NONE);
    Candidate<TorsionState> checked =
        check(
            plain()
                .unfixed(new TorqueFacts(NONE, NONE, NONE), angle)
                .design(design(14, 6, legs())));
    assertThat(checked.state().freeAngle()).hasValue(0);
    assertThat(checked.state().greatest().deflection()).isEqualTo(1.2);
  }

  @Test
  void torquesAloneHaveNoAngles() {
    TorquePoint torque = new TorquePoint(NONE, OptionalDouble.of(400));
    Candidate<TorsionState> checked =
        check(
            plain()
                .unfixed(new TorqueFacts(NONE, NONE, NONE), torque)
                .design(design(14, 6, legs())));
    assertThat(checked.state().freeAngle()).isEmpty();
    assertThat(checked.state().greatest().torque()).isCloseTo(400, within(1e-9));
    assertThat(checked.state().greatest().angle()).isEmpty();
  }

  /** Free legs of 6 coils stand at 180; wound up by 30 at 210. Up to ten coils 10 degrees. */
  @ParameterizedTest
  @CsvSource({
    "6, 210, 0, 10, true",
    "6, 201, 9, 10, true",
    "6, 199, 11, 10, false",
    "6, -150, 0, 10, true",
    "5, 216, 6, 5, false",
    "12, 196, 14, 15, true",
    "10, 210, 0, 10, true",
    "10.5, 30, 0, 15, true",
    "20, 210, 0, 15, true",
    "20.5, 30, 0, 30, true",
    "22, 236, 26, 30, true",
    "6, 30, 180, 10, false"
  })
  void theLegAngleOfAGivenSpringIsJudged(
      double coils, double angle, double apart, double tolerance, boolean holds) {
    LegsAsked legs = new LegsAsked(20, 25, OptionalDouble.of(angle * DEG), 1);
    Finding finding = finding(check(plain().design(design(14, coils, legs))), LimitName.LEG_ANGLE);
    assertThat(finding.value() / DEG).isCloseTo(apart, within(1e-9));
    assertThat(finding.bound() / DEG).isCloseTo(tolerance, within(1e-9));
    assertThat(finding.holds()).isEqualTo(holds);
    assertThat(finding.source().text()).contains("common practice", "from memory");
  }
}
