package coilwright.search;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.problem.LimitName;
import coilwright.problem.Problem;
import coilwright.spring.CompressionState;
import coilwright.spring.EndType;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The wires that a problem offers, and how they are counted. */
class WireChoiceTest {

  private static final GradeDraft OWN = GradeDraft.of("own", 1900).diameters(0.5, 2);

  @Test
  void aGradeIsOfferedInTheSizesForWhichItHasData() {
    WireChoice choice = choice(Drafts.plain().own(OWN.grade()).sizes(0.4, 0.5, 1.4, 2, 2.1));
    assertThat(choice.wires()).extracting(wire -> wire.diameter()).containsExactly(0.5, 1.4, 2.0);
    assertThat(choice.outsideRange()).isEqualTo(2);
  }

  @Test
  void namedGradesComeInTheOrderOfTheCatalogueThenTheProblemsOwn() {
    List<String> ids = List.of("stainless-302", "music-wire");
    assertThat(choice(Drafts.plain().materials(ids).own(OWN.grade()).sizes(1.4)).wires())
        .extracting(wire -> wire.grade().id())
        .containsExactly("music-wire", "stainless-302", "own");
  }

  @Test
  void aWireOutsideItsGradesDiametersCountsOnceForEachEndTypeUnderWireRangeOnly() {
    ProblemDraft draft =
        Drafts.plain()
            .own(OWN.grade())
            .sizes(0.4, 1.4)
            .ends(EndType.SQUARED, EndType.SQUARED_GROUND);
    Answer<CompressionState> answer = answer(draft);
    assertThat(answer.wires()).isEqualTo(2);
    assertThat(answer.ruledOut()).containsEntry(LimitName.WIRE_RANGE, 2);
    assertThat(answer.feasible().size() + answer.conflicts().size()).isEqualTo(2);
  }

  @Test
  void withNoWireInRangeNothingElseIsSaid() {
    Answer<CompressionState> answer = answer(Drafts.plain().own(OWN.grade()).sizes(0.4));
    assertThat(answer.wires()).isZero();
    assertThat(answer.candidates()).isZero();
    assertThat(answer.conflicts()).isEmpty();
    assertThat(answer.ruledOut()).containsOnlyKeys(LimitName.WIRE_RANGE);
  }

  private static WireChoice choice(ProblemDraft draft) {
    return WireChoice.of(draft.problem(), Searched.CATALOGUE);
  }

  private static Answer<CompressionState> answer(ProblemDraft draft) {
    Problem problem = draft.problem();
    return new CompressionSearch().search(problem, WireChoice.of(problem, Searched.CATALOGUE));
  }
}
