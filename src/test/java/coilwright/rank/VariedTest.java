package coilwright.rank;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** No material in more than half of the first ten lines while others are left. */
class VariedTest {

  @Test
  void aMixedListStaysAsItIs() {
    assertOrder("abababababab", "1 2 3 4 5 6 7 8 9 10 11 12", "");
    assertOrder("aaaaabbbbbaab", "1 2 3 4 5 6 7 8 9 10 11 12 13", "");
    assertOrder("abc", "1 2 3", "");
    assertOrder("", "", "");
  }

  @Test
  void whatIsTooManyFollowsBehindTheFirstTen() {
    assertOrder("aaaaaaaabbbbbb", "1 2 3 4 5 9 10 11 12 13 6 7 8 14", "6 7 8");
    assertOrder("aaaaaabbbaaabb", "1 2 3 4 5 7 8 9 13 14 6 10 11 12", "6 10 11 12");
    assertOrder("aaaaaabcdefgh", "1 2 3 4 5 7 8 9 10 11 6 12 13", "6");
  }

  @Test
  void whereOthersRunOutTheBestFillTheRest() {
    assertOrder("aaaaaaa", "1 2 3 4 5 6 7", "");
    assertOrder("aaaaaaaaaaaa", "1 2 3 4 5 6 7 8 9 10 11 12", "");
    assertOrder("aaaaaaaaaaab", "1 2 3 4 5 6 7 8 9 12 10 11", "10 11");
    assertOrder("aaaaaabb", "1 2 3 4 5 6 7 8", "");
  }

  @Test
  void nothingIsLostAndTheRuleHolds() {
    for (int seed = 0; seed < 300; seed++) {
      Random random = new Random(seed);
      StringBuilder materials = new StringBuilder();
      for (int i = random.nextInt(30); i >= 0; i--) {
        materials.append("aaaabbc".charAt(random.nextInt(2 + random.nextInt(6))));
      }
      holds(materials.toString());
    }
  }

  private static void holds(String materials) {
    List<Line<SampleState>> ranked = lines(materials);
    Varied<SampleState> varied = Varied.of(ranked);
    List<Line<SampleState>> lines = varied.lines();
    assertThat(lines).containsExactlyInAnyOrderElementsOf(ranked);
    int first = Math.min(Varied.FIRST, lines.size());
    assertRising(lines.subList(0, first));
    assertRising(lines.subList(first, lines.size()));
    for (char material : materials.toCharArray()) {
      assertRising(lines.stream().filter(line -> isOf(line, material)).toList());
    }
    Map<String, Integer> shares = new HashMap<>();
    lines.subList(0, first).forEach(line -> shares.merge(line.material(), 1, Integer::sum));
    shares.forEach(
        (material, share) -> {
          boolean othersLeft =
              lines.stream().skip(first).anyMatch(line -> !line.material().equals(material));
          assertThat(share <= 5 || !othersLeft).as(materials + ": " + material).isTrue();
        });
  }

  private static boolean isOf(Line<SampleState> line, char material) {
    return line.material().equals("steel-" + material);
  }

  private static void assertRising(List<Line<SampleState>> lines) {
    assertThat(lines).isSortedAccordingTo((a, b) -> a.lead().rank() - b.lead().rank());
  }

  private static void assertOrder(String materials, String order, String heldBack) {
    Varied<SampleState> varied = Varied.of(lines(materials));
    assertThat(ranks(varied.lines())).isEqualTo(order);
    assertThat(ranks(varied.heldBack())).isEqualTo(heldBack);
  }

  private static String ranks(List<Line<SampleState>> lines) {
    return String.join(
        " ", lines.stream().map(line -> Integer.toString(line.lead().rank())).toList());
  }

  private static List<Line<SampleState>> lines(String materials) {
    List<Line<SampleState>> lines = new ArrayList<>();
    String[] springs = new String[materials.length()];
    for (int i = 0; i < springs.length; i++) {
      springs[i] = "steel-" + materials.charAt(i) + " 1.4 squared 8";
    }
    SampleState.list(springs).forEach(spring -> lines.add(new Line<>(spring, List.of())));
    return lines;
  }
}
