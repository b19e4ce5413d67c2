package coilwright.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

/** The lines of a shortlist's text against the candidates that JSON holds. */
class ShortlistLinesTest {

  private static final String WIDE =
      Run.VALVE.substring(0, Run.VALVE.indexOf("make:"))
          + """
          make:
            materials: [music-wire, en-10270-1-sh, hard-drawn]
            wire_sizes: [1.3 mm, 1.295 mm, 1.35 mm, 1.4 mm, 1.397 mm, 1.44 mm, 1.5 mm, 1.499 mm]
          """;

  private static final String CHEAP =
      WIDE.replace("en-10270-1-sh, hard-drawn", "coil-lot-2701")
          + "own_materials: [{id: coil-lot-2701, like: en-10270-1-sh, cost_index: 1.0}]\n";

  private static final Pattern ROW = Pattern.compile("(?m)^ +(\\d+)  (\\S+) .*");
  private static final Pattern ALSO = Pattern.compile("#(\\d+) (\\S+?)[, ]");

  /** A line: the rank and material that lead, and those of the others. */
  private record Line(int rank, String material, List<String> also) {}

  @Test
  void linesAndThoseAlikeAreAllCandidates() {
    List<String> all = candidates(WIDE, "--top=999");
    List<String> shown = new ArrayList<>();
    for (Line line : lines(WIDE, "--top=999")) {
      shown.add(line.rank() + " " + line.material());
      shown.addAll(line.also());
    }
    assertThat(all).hasSizeGreaterThan(25);
    assertThat(shown).hasSizeGreaterThan(lines(WIDE, "--top=999").size());
    assertThat(shown).containsExactlyInAnyOrderElementsOf(all);
  }

  @Test
  void topCountsLinesInTextAndCandidatesInJson() {
    List<Line> all = lines(WIDE, "--top=999");
    for (int top : new int[] {1, 3, 10, 12}) {
      assertThat(lines(WIDE, "--top=" + top)).isEqualTo(all.subList(0, top));
      assertThat(candidates(WIDE, "--top=" + top)).hasSize(top);
    }
    assertThat(text(WIDE, "--top=3"))
        .contains((all.size() - 3) + " more: --top " + all.size() + " shows them");
  }

  @Test
  void everyCountIsListedInItsPlace() {
    List<Line> lines = lines(WIDE, "--all");
    for (int i = 0; i < lines.size(); i++) {
      assertThat(lines.get(i).rank()).isEqualTo(i + 1);
      assertThat(lines.get(i).also()).isEmpty();
    }
    assertThat(lines).hasSameSizeAs(candidates(WIDE, "--all"));
    assertThat(text(WIDE, "--all")).doesNotContain("also:", "behind the first ten");
  }

  @Test
  void aCheapGradeLeavesRoomForOthersAndTheListSaysSo() {
    List<Line> lines = lines(CHEAP, "--rank=cost");
    List<String> materials = lines.stream().map(Line::material).toList();
    String first = materials.get(0);
    assertThat(lines).hasSize(10);
    assertThat(materials.stream().filter(first::equals).count()).isLessThanOrEqualTo(5);
    assertThat(text(CHEAP, "--rank=cost"))
        .containsPattern(
            "#\\d+ stands? behind the first ten: no material has more than half of them while"
                + " others fit");
    assertThat(text(CHEAP, "--rank=cost", "--top=2")).doesNotContain("behind the first ten");
  }

  @Test
  void warningsNameTheRanksShown() {
    List<Integer> ranks = new ArrayList<>();
    List<Line> lines = lines(WIDE);
    for (Line line : lines) {
      ranks.add(line.rank());
      line.also().forEach(other -> ranks.add(Integer.valueOf(other.split(" ")[0])));
    }
    String note = text(WIDE);
    Matcher rank = Pattern.compile("#(\\d+)").matcher(note.substring(note.indexOf("Take note")));
    int named = 0;
    while (rank.find()) {
      named++;
      assertThat(ranks).contains(Integer.valueOf(rank.group(1)));
    }
    assertThat(named).isPositive();
  }

  private static List<Line> lines(String problem, String... options) {
    List<Line> lines = new ArrayList<>();
    String text = text(problem, options);
    text = text.substring(text.indexOf(" in all. "), text.indexOf("  n active and nt"));
    for (String line : text.split("\n")) {
      Matcher row = ROW.matcher(line);
      Matcher also = ALSO.matcher(line);
      if (row.matches()) {
        lines.add(new Line(Integer.parseInt(row.group(1)), row.group(2), new ArrayList<>()));
      }
      while (line.contains(" also: ") && also.find()) {
        lines.get(lines.size() - 1).also().add(also.group(1) + " " + also.group(2));
      }
    }
    return lines;
  }

  private static String text(String problem, String... options) {
    return run(problem, "text", options).found(Status.FOUND).out();
  }

  private static List<String> candidates(String problem, String... options) {
    List<String> candidates = new ArrayList<>();
    for (JsonNode candidate : run(problem, "json", options).json().path("candidates")) {
      candidates.add(candidate.path("rank").asInt() + " " + candidate.path("material").asText());
    }
    return candidates;
  }

  private static Run run(String problem, String format, String... options) {
    List<String> args = new ArrayList<>(List.of("shortlist", "-", "--format", format));
    args.addAll(List.of(options));
    return Run.reading(problem, args.toArray(String[]::new));
  }
}
