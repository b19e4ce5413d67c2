package coilwright.rank;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** Which springs stand in one line, and that none is lost or repeated. */
class AlikeTest {

  @Test
  void equivalentGradesAndSizesWithinTheToleranceShareALine() {
    assertLines("1+2", "steel-a 1.4 squared 8", "steel-b 1.4 squared 8");
    assertLines("1+2", "steel-a 1.4 squared 8", "steel-a 1.397 squared 8");
    assertLines("1+2", "steel-a 1.42 squared 8", "steel-b 1.4 squared 8");
  }

  @Test
  void otherGradesSizesAndEndsStandAlone() {
    assertLines("1 2", "steel-a 1.4 squared 8", "steel-c 1.4 squared 8");
    assertLines("1 2", "steel-a 1.4 squared 8", "steel-a 1.4201 squared 8");
    assertLines("1 2", "steel-a 1.4 squared 8", "steel-a 1.4 plain 8");
  }

  /** At one rate and mean diameter n goes with d^4: (1 + 0.02/1.4)^4 is 1.0584. */
  @Test
  void coilCountsMayDifferByWhatTheToleranceExplains() {
    assertLines("1+2", "steel-a 1.4 squared 8", "steel-b 1.4 squared 8.25");
    assertLines("1+2", "steel-b 1.4 squared 8.46", "steel-a 1.4 squared 8");
    assertLines("1 2", "steel-a 1.4 squared 8", "steel-b 1.4 squared 8.5");
    assertLines("1 2", "steel-a 1.4 squared 8.5", "steel-b 1.4 squared 8");
    assertLines("1+2", "steel-a 0.3 squared 8", "steel-b 0.3 squared 10.2");
  }

  @Test
  void pairsDoNotChain() {
    assertLines("1+2 3", "steel-a 1.4 squared 8", "steel-b 1.4 squared 8", "steel-c 1.4 squared 8");
    assertLines("1+2+3", "steel-b 1.4 squared 8", "steel-a 1.4 squared 8", "steel-c 1.4 squared 8");
    assertLines(
        "1+2 3", "steel-a 1.4 squared 8", "steel-a 1.42 squared 8", "steel-a 1.44 squared 8");
  }

  @Test
  void aSpringJoinsTheFirstLineThatItIsLike() {
    assertLines(
        "1+3 2", "steel-a 1.40 squared 8", "steel-a 1.44 squared 8", "steel-a 1.42 squared 8");
  }

  @Test
  void noSpringIsLostAndLinesStandByTheirBest() {
    for (int seed = 0; seed < 40; seed++) {
      List<Ranked<SampleState>> list = SampleState.list(random(new Random(seed), 60));
      List<Line<SampleState>> lines = Alike.lines(list, AlikeTest::equivalent);
      List<Integer> ranks = new ArrayList<>();
      for (Line<SampleState> line : lines) {
        ranks.add(line.lead().rank());
        line.also().forEach(other -> ranks.add(other.rank()));
        assertThat(line.also()).allMatch(other -> other.rank() > line.lead().rank());
      }
      assertThat(lines).hasSizeBetween(2, 59);
      assertThat(lines).isSortedAccordingTo((a, b) -> a.lead().rank() - b.lead().rank());
      assertThat(ranks).containsExactlyInAnyOrderElementsOf(ranks(list));
    }
  }

  static String[] random(Random random, int count) {
    String[] springs = new String[count];
    for (int i = 0; i < count; i++) {
      springs[i] =
          "steel-"
              + "abcd".charAt(random.nextInt(4))
              + " "
              + (1.3 + 0.01 * random.nextInt(20))
              + (random.nextBoolean() ? " squared " : " plain ")
              + (6 + 0.25 * random.nextInt(8));
    }
    return springs;
  }

  static boolean equivalent(String id, String other) {
    String pair = id + " " + other;
    return id.equals(other)
        || pair.equals("steel-a steel-b")
        || pair.equals("steel-b steel-a")
        || pair.equals("steel-b steel-c")
        || pair.equals("steel-c steel-b");
  }

  private static List<Integer> ranks(List<Ranked<SampleState>> list) {
    return list.stream().map(Ranked::rank).toList();
  }

  /** The lines by the ranks in them: "1+2 3". */
  private static void assertLines(String lines, String... springs) {
    List<String> found = new ArrayList<>();
    for (Line<SampleState> line : Alike.lines(SampleState.list(springs), AlikeTest::equivalent)) {
      StringBuilder ranks = new StringBuilder().append(line.lead().rank());
      line.also().forEach(other -> ranks.append('+').append(other.rank()));
      found.add(ranks.toString());
    }
    assertThat(String.join(" ", found)).isEqualTo(lines);
  }
}
