package coilwright.rank;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Percentage.withPercentage;

import coilwright.limit.Finding;
import coilwright.limit.Side;
import coilwright.material.Catalogue;
import coilwright.problem.LimitName;
import coilwright.problem.Problem;
import coilwright.problem.RankBy;
import coilwright.search.Answer;
import coilwright.search.Candidate;
import coilwright.search.CompressionSearch;
import coilwright.search.RandomDrafts;
import coilwright.search.WireChoice;
import coilwright.spring.CompressionSpring;
import coilwright.spring.CompressionState;
import java.util.List;
import java.util.function.Predicate;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** The four orders against merits computed anew from each spring's own numbers. */
class OrderTest {

  private static final List<Answer<CompressionState>> ANSWERS =
      LongStream.range(600, 615)
          .boxed()
          .flatMap(seed -> RandomDrafts.of(seed, 5))
          .map(draft -> answer(draft.problem()))
          .filter(answer -> answer.candidates() > 0)
          .toList();

  private static Answer<CompressionState> answer(Problem problem) {
    return new CompressionSearch().search(problem, WireChoice.of(problem, Catalogue.load()));
  }

  @Test
  void thereIsSomethingToOrder() {
    assertThat(ANSWERS.size()).isGreaterThan(10);
    assertThat(ANSWERS.stream().mapToInt(Answer::candidates).sum()).isGreaterThan(300);
  }

  @ParameterizedTest
  @EnumSource
  void aSpringIsFollowedByNoneOfMoreMerit(RankBy by) {
    for (Answer<CompressionState> answer : ANSWERS) {
      List<Candidate<CompressionState>> ranked = Order.ranked(answer, by, true);
      for (int i = 1; i < ranked.size(); i++) {
        double better = merit(ranked.get(i - 1), by);
        assertThat(better).isGreaterThanOrEqualTo(merit(ranked.get(i), by) - 1e-12);
      }
    }
  }

  @ParameterizedTest
  @EnumSource
  void everyCountIsEverySpringFound(RankBy by) {
    for (Answer<CompressionState> answer : ANSWERS) {
      assertThat(Order.ranked(answer, by, true))
          .containsExactlyInAnyOrderElementsOf(
              answer.feasible().stream().flatMap(List::stream).toList());
    }
  }

  @ParameterizedTest
  @EnumSource
  void elseEachWireGivesItsBest(RankBy by) {
    for (Answer<CompressionState> answer : ANSWERS) {
      List<Candidate<CompressionState>> ranked = Order.ranked(answer, by, false);
      assertThat(ranked).hasSameSizeAs(answer.feasible());
      answer.feasible().forEach(wire -> givesItsBest(wire, ranked, by));
    }
  }

  private static void givesItsBest(
      List<Candidate<CompressionState>> wire, List<Candidate<CompressionState>> ranked, RankBy by) {
    double best = wire.stream().mapToDouble(found -> merit(found, by)).max().orElseThrow();
    assertThat(ranked.stream().filter(wire::contains))
        .singleElement()
        .satisfies(chosen -> assertThat(merit(chosen, by)).isCloseTo(best, withPercentage(1e-9)));
  }

  /** What an order looks for, greater for better. */
  private static double merit(Candidate<CompressionState> found, RankBy by) {
    return switch (by) {
      case MASS -> -mass(found.state().spring());
      case COST -> -cost(found.state().spring());
      case MARGIN -> least(found, OrderTest::isStress);
      case ROBUST -> least(found, finding -> true);
    };
  }

  private static double mass(CompressionSpring spring) {
    double turn = Math.PI * spring.meanDiameter();
    double along = spring.activeCoils() * Math.hypot(turn, spring.pitch());
    double length = along + spring.ends().deadCoils() * turn;
    double d = spring.wireDiameter();
    return Math.PI / 4 * d * d * length * spring.wire().density() * 1e-9;
  }

  /** Wire and scrap, then coiling, heat treatment and grinding as shares of both. */
  private static double cost(CompressionSpring spring) {
    double wire = spring.wire().grade().costIndex() * 1000 * mass(spring) * 1.03;
    return wire * (1 + 0.30 + 0.05 + (spring.ends().ground() ? 0.25 : 0));
  }

  private static boolean isStress(Finding finding) {
    LimitName limit = finding.check().limit();
    return limit == LimitName.STRESS_AT_LOAD || limit == LimitName.STRESS_AT_SOLID;
  }

  private static double least(Candidate<CompressionState> found, Predicate<Finding> considered) {
    return found.findings().stream()
        .filter(considered.and(Finding::canFail))
        .mapToDouble(OrderTest::margin)
        .min()
        .orElse(0);
  }

  private static double margin(Finding finding) {
    double slack = finding.value() - finding.bound();
    return (finding.check().side() == Side.MIN ? slack : -slack) / Math.abs(finding.bound());
  }
}
