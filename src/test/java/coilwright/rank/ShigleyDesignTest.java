package coilwright.rank;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Percentage.withPercentage;

import coilwright.limit.CoilSet;
import coilwright.limit.Limit;
import coilwright.limit.Reach;
import coilwright.limit.Trail;
import coilwright.material.Catalogue;
import coilwright.material.StrengthLaws;
import coilwright.material.WireGrade;
import coilwright.problem.LimitName;
import coilwright.problem.Problem;
import coilwright.problem.RankBy;
import coilwright.published.Published;
import coilwright.published.Published.Column;
import coilwright.search.Answer;
import coilwright.search.Bound;
import coilwright.search.CompressionSearch;
import coilwright.search.Conflict;
import coilwright.search.GradeDraft;
import coilwright.search.ProblemDraft;
import coilwright.search.WireChoice;
import coilwright.spring.CompressionFamily;
import coilwright.spring.CompressionSpring;
import coilwright.spring.CompressionState;
import coilwright.spring.EndType;
import coilwright.spring.LoadLine;
import coilwright.unit.Dimension;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Shigley's Example 10-2, a music wire spring designed by trying wires: 20 lbf in 2 in, squared and
 * ground, solid length at most 1 in, free length at most 4 in. From memory, recomputed.
 *
 * <p>The book lets each wire have its own free length, and sets two limits equal: the stress at
 * solid to 0.45 Sut over a safety of 1.2, and the travel left before solid to 15 % of the
 * deflection. That leaves one coil count a wire. A problem file asks for one free length. So first
 * each wire is given the book's free length for it: the two limits must then meet at the book's
 * coil count. Then all wires are given the free length of the book's choice, rounded up to 3.28 in
 * so that quarter coils have room: the choice must again be the lightest. The book's figure of
 * merit is the mass of a flat helix times a relative cost that is the same for all.
 */
class ShigleyDesignTest {

  private static final double INCH = Dimension.LENGTH.unit("in").orElseThrow().factor();
  private static final double POUND = Dimension.FORCE.unit("lbf").orElseThrow().factor();
  private static final double KSI = Dimension.STRESS.unit("ksi").orElseThrow().factor();

  private static final double RATE = 10 * POUND / INCH;
  private static final double DEFLECTION = 2 * INCH;
  private static final double OVERRUN = 0.15;
  private static final double SHARE_AT_SOLID = 0.45 / 1.2;
  private static final double CHOSEN_FREE_LENGTH = 3.28 * INCH;

  static Stream<Published> wires() {
    return Published.rows("shigley/example-10-2-design.csv");
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("wires")
  void stressAndTravelMeetAtTheBooksCoilCount(Published row) {
    double free = row.inner(Column.FREE_LENGTH, Dimension.LENGTH);
    double modulus = row.inner(Column.SHEAR_MODULUS, Dimension.STRESS);
    double wire = row.inner(Column.WIRE_DIAMETER, Dimension.LENGTH);
    Problem problem = draft(free, modulus, wire).problem();
    CompressionFamily family = families(problem).get(0);
    double coils = row.number(Column.ACTIVE_COILS);

    assertThat(left(LimitName.STRESS_AT_SOLID, problem, family).least())
        .isCloseTo(coils, row.closeness());
    assertThat(left(LimitName.CLASH_ALLOWANCE, problem, family).greatest())
        .isCloseTo(coils, row.closeness());
    assertThat(family.meanDiameterAt(coils))
        .isCloseTo(row.inner(Column.MEAN_DIAMETER, Dimension.LENGTH), row.closeness());
  }

  @Test
  void theBooksChoiceIsTheLightest() {
    CompressionSpring best = ranked().get(0);
    assertThat(best.wireDiameter()).isCloseTo(0.080 * INCH, withPercentage(1e-9));
    assertThat(best.activeCoils()).isEqualTo(10.25);
    assertThat(best.meanDiameter()).isCloseTo(0.843 * INCH, withPercentage(1));
  }

  @Test
  void theFigureOfMeritOrdersTheWiresLikewise() {
    List<CompressionSpring> ranked = ranked();
    assertThat(ranked.stream().map(spring -> Math.round(1000 * spring.wireDiameter() / INCH)))
        .containsExactly(80L, 85L, 90L, 95L);
    assertThat(ranked.stream().map(ShigleyDesignTest::figureOfMerit))
        .isSortedAccordingTo((one, other) -> Double.compare(other, one));
  }

  @Test
  void thinnerWiresNeedMoreCoilsForStressThanAnotherLimitLeavesThem() {
    List<Conflict> conflicts = answer().conflicts();
    assertThat(conflicts).hasSize(4);
    for (Conflict conflict : conflicts) {
      assertThat(conflict.wire().diameter()).isLessThan(0.0755 * INCH);
      assertThat(conflict.limits()).hasSize(2).contains(LimitName.STRESS_AT_SOLID);
    }
  }

  /** -2.6 pi^2 d^2 Nt D/4 with d and D in inches. */
  private static double figureOfMerit(CompressionSpring spring) {
    double d = spring.wireDiameter() / INCH;
    double dia = spring.meanDiameter() / INCH;
    return -2.6 * Math.PI * Math.PI / 4 * d * d * spring.totalCoils() * dia;
  }

  private static List<CompressionSpring> ranked() {
    return Order.ranked(answer(), RankBy.MASS, false).stream()
        .map(candidate -> candidate.state().spring())
        .toList();
  }

  private static Answer<CompressionState> answer() {
    double[] sizes =
        wires().mapToDouble(row -> row.inner(Column.WIRE_DIAMETER, Dimension.LENGTH)).toArray();
    Problem problem =
        draft(CHOSEN_FREE_LENGTH, 11.75e3 * KSI, sizes)
            .with(Bound.LEAST_INDEX, 4)
            .with(Bound.MOST_COILS, 15)
            .with(Bound.SOLID_LENGTH, INCH)
            .with(Bound.FREE_LENGTH, 4 * INCH)
            .problem();
    return new CompressionSearch().search(problem, WireChoice.of(problem, Catalogue.load()));
  }

  private static ProblemDraft draft(double freeLength, double shearModulus, double... sizes) {
    return new ProblemDraft()
        .loads(new LoadLine(RATE, freeLength), freeLength - DEFLECTION)
        .own(musicWire(shearModulus))
        .sizes(sizes)
        .ends(EndType.SQUARED_GROUND)
        .with(Bound.STRESS_AT_SOLID, SHARE_AT_SOLID)
        .with(Bound.CLASH_ALLOWANCE, OVERRUN);
  }

  /** 201 ksi over the 0.145th power of the diameter in inches. */
  private static WireGrade musicWire(double shearModulus) {
    double atOneMillimetre = 201 * KSI * StrictMath.pow(INCH, 0.145);
    return GradeDraft.of("example-music-wire", 1)
        .strength(StrengthLaws.power(atOneMillimetre, 0.145))
        .moduli(shearModulus, 2.5 * shearModulus)
        .grade();
  }

  private static List<CompressionFamily> families(Problem problem) {
    return new CompressionSearch()
        .families(problem, WireChoice.of(problem, Catalogue.load()).wires());
  }

  private static CoilSet left(LimitName name, Problem problem, CompressionFamily family) {
    Limit<CompressionState> limit =
        new CompressionSearch()
            .limits(problem).stream().filter(one -> one.name() == name).findFirst().orElseThrow();
    return Reach.of(limit, new Trail<>(family));
  }
}
