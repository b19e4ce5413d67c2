package coilwright.rank;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.material.Catalogue;
import coilwright.problem.Problem;
import coilwright.problem.RankBy;
import coilwright.search.Answer;
import coilwright.search.Bound;
import coilwright.search.Candidate;
import coilwright.search.CompressionSearch;
import coilwright.search.GradeDraft;
import coilwright.search.ProblemDraft;
import coilwright.search.WireChoice;
import coilwright.spring.CompressionState;
import coilwright.spring.EndType;
import coilwright.spring.LoadLine;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Springs of equal merit come by material, wire diameter, ends and coils. */
class TiesTest {

  private static final Comparator<Candidate<CompressionState>> BY_NAME =
      Comparator.comparing((Candidate<CompressionState> found) -> found.state().wire().grade().id())
          .thenComparing(found -> found.state().wire().diameter())
          .thenComparing(found -> found.state().endForm())
          .thenComparing(found -> found.state().coils());

  @Test
  void whereNoStressIsJudgedAllAreEqual() {
    List<Candidate<CompressionState>> ranked =
        Order.ranked(
            answer(draft().without(Bound.STRESS_AT_LOAD, Bound.STRESS_AT_SOLID)),
            RankBy.MARGIN,
            true);
    assertThat(ranked).hasSizeGreaterThan(20).isSortedAccordingTo(BY_NAME);
  }

  @Test
  void gradesWithTheSameDataComeInTheOrderOfTheirIds() {
    List<Candidate<CompressionState>> ranked = Order.ranked(answer(draft()), RankBy.MASS, false);
    assertThat(ranked).hasSizeGreaterThan(2);
    for (int i = 0; i + 1 < ranked.size(); i += 2) {
      assertThat(ranked.get(i).state().wire().grade().id()).isEqualTo("a-steel");
      assertThat(ranked.get(i + 1).state().wire().grade().id()).isEqualTo("b-steel");
      assertThat(ranked.get(i + 1).state().mass()).isEqualTo(ranked.get(i).state().mass());
    }
  }

  @ParameterizedTest
  @EnumSource
  void theOrderInWhichSpringsWereFoundIsNoMatter(RankBy by) {
    Answer<CompressionState> answer = answer(draft());
    List<List<Candidate<CompressionState>>> shuffled = new ArrayList<>(answer.feasible());
    Collections.shuffle(shuffled, new Random(1));
    Answer<CompressionState> other =
        new Answer<>(answer.wires(), shuffled, answer.ruledOut(), answer.conflicts());
    assertThat(Order.ranked(other, by, true)).isEqualTo(Order.ranked(answer, by, true));
  }

  private static ProblemDraft draft() {
    return new ProblemDraft()
        .loads(LoadLine.through(32, 18, 22, 45), 32, 22)
        .own(GradeDraft.of("b-steel", 2000).grade(), GradeDraft.of("a-steel", 2000).grade())
        .sizes(1.5, 1.4, 1.45)
        .ends(EndType.SQUARED_GROUND, EndType.SQUARED, EndType.PLAIN);
  }

  private static Answer<CompressionState> answer(ProblemDraft draft) {
    Problem problem = draft.problem();
    return new CompressionSearch().search(problem, WireChoice.of(problem, Catalogue.load()));
  }
}
