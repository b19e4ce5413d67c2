package coilwright.search;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.problem.BucklingRule;
import coilwright.problem.Problem;
import coilwright.spring.CompressionState;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.HashSet;
import java.util.List;
import java.util.Random;
import java.util.Set;
import java.util.stream.LongStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Tightening a limit never adds a candidate, and loosening it never removes one. */
class TighteningTest {

  private static final List<BucklingRule> EVER_TIGHTER =
      List.of(BucklingRule.NONE, BucklingRule.AT_LOAD, BucklingRule.AT_SOLID);

  private static final int DRAFTS = 2;
  private static final Set<Bound> GUIDES = EnumSet.of(Bound.BORE, Bound.ROD, Bound.CLEARANCE);

  static LongStream seeds() {
    return LongStream.of(500, 501, 502, 503, 504, 505, 1500, 1501, 1502, 1503, 2500, 2501, 2502);
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void ofEveryBoundThatIsSet(long seed) {
    Random random = new Random(seed);
    Searched.drafts(seed, DRAFTS)
        .forEach(
            draft -> {
              Set<String> found = ids(draft);
              for (Bound bound : Bound.values()) {
                draft.bound(bound).ifPresent(value -> holds(draft, found, bound, value, random));
              }
            });
  }

  private static void holds(
      ProblemDraft draft, Set<String> found, Bound bound, double value, Random random) {
    double share = 0.1 * random.nextDouble();
    assertThat(found)
        .as("%s tightened by %s", bound, share)
        .containsAll(ids(draft.copy().with(bound, bound.tightened(value, share))));
    assertThat(ids(draft.copy().with(bound, bound.tightened(value, -share))))
        .as("%s loosened by %s", bound, share)
        .containsAll(found);
    if (!GUIDES.contains(bound)) { // what no longer guides the spring may let it buckle
      assertThat(ids(draft.copy().without(bound))).as("%s off", bound).containsAll(found);
    }
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void ofTheRuleOnBuckling(long seed) {
    Searched.drafts(seed, DRAFTS)
        .forEach(
            draft -> {
              List<Set<String>> found = new ArrayList<>();
              EVER_TIGHTER.forEach(rule -> found.add(ids(draft.copy().buckling(rule))));
              assertThat(found.get(0)).containsAll(found.get(1));
              assertThat(found.get(1)).containsAll(found.get(2));
            });
  }

  private static Set<String> ids(ProblemDraft draft) {
    Problem problem = draft.problem();
    Answer<CompressionState> answer =
        new CompressionSearch().search(problem, WireChoice.of(problem, Searched.CATALOGUE));
    Set<String> ids = new HashSet<>();
    answer.feasible().forEach(wire -> wire.forEach(found -> ids.add(id(found.state()))));
    return ids;
  }

  private static String id(CompressionState state) {
    return state.wire().grade().id()
        + " "
        + state.wire().size().label()
        + " "
        + state.endForm()
        + " "
        + state.coils();
  }
}
