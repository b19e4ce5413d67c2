package coilwright.search;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.problem.LimitName;
import coilwright.problem.Problem;
import coilwright.spring.CompressionState;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** An answer is the sum of what came of each wire. */
class AnswerTest {

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("coilwright.search.Searched#seeds")
  void addsUp(long seed) {
    Problem problem = RandomDrafts.of(seed, 1).findFirst().orElseThrow().problem();
    WireChoice choice = WireChoice.of(problem, Searched.CATALOGUE);
    Answer<CompressionState> answer = new CompressionSearch().search(problem, choice);
    List<Searched> wires = Searched.wiresOf("alone", problem).toList();

    assertThat(answer.wires()).isEqualTo(wires.size());
    assertThat(answer.candidates())
        .isEqualTo(wires.stream().mapToInt(wire -> wire.counts().size()).sum());
    assertThat(answer.feasible())
        .hasSize((int) wires.stream().filter(wire -> !wire.failed()).count());
    assertThat(answer.conflicts())
        .containsExactlyElementsOf(
            wires.stream().flatMap(wire -> wire.outcome().conflict().stream()).toList());
    assertThat(answer.ruledOut())
        .isEqualTo(counted(wires, choice.outsideRange() * problem.make().ends().size()));
  }

  private static Map<LimitName, Integer> counted(List<Searched> wires, int outside) {
    Map<LimitName, Integer> counts = new EnumMap<>(LimitName.class);
    if (outside > 0) {
      counts.put(LimitName.WIRE_RANGE, outside);
    }
    wires.forEach(
        wire -> wire.outcome().ruledOutBy().forEach(name -> counts.merge(name, 1, Integer::sum)));
    return counts;
  }
}
