package coilwright.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What shortlist prints and returns, and what its options do. */
class ShortlistTest {

  private static final String TOP_ONE = Run.VALVE + "rank: {top: 1, by: cost}\n";

  @TempDir private Path folder;

  @Test
  void textOfAFileAndOfStandardInputIsTheSame() {
    Run run = Run.of("shortlist", Run.file(folder, "valve.yaml", Run.VALVE)).found(Status.FOUND);
    assertThat(run.out()).startsWith("Drip-header valve\n").contains("music-wire", "squared");
    assertThat(piped(Run.VALVE).found(Status.FOUND).bytes()).isEqualTo(run.bytes());
  }

  @Test
  void shippedExampleIsSolved() {
    JsonNode json =
        Run.of("shortlist", "problems/check-valve.yaml", "--format=json").found(0).json();
    assertThat(json.path("problem").path("title").asText()).startsWith("Feed-water check valve");
    assertThat(json.path("candidates").size()).isEqualTo(12);
  }

  @Test
  void jsonNamesItsFormatAndCounts() {
    JsonNode json = piped(Run.VALVE, "--format", "json").found(Status.FOUND).json();
    assertThat(json.path("format").asInt()).isEqualTo(1);
    assertThat(json.path("search").path("wires").asInt()).isEqualTo(6);
    assertThat(json.path("candidates").size())
        .isEqualTo(json.path("search").path("feasible_wires").asInt())
        .isPositive();
  }

  @Test
  void theFilesUnitsHoldUnlessTheOptionSaysOtherwise() {
    String inch = "units: inch\n" + Run.VALVE;
    assertThat(piped(inch).found(Status.FOUND).out()).contains("bore 0.70866 in");
    assertThat(piped(inch, "--units", "metric").found(Status.FOUND).out()).contains("bore 18 mm");
    assertThat(piped(Run.VALVE, "--units=inch").found(Status.FOUND).out())
        .contains("bore 0.70866 in");
    assertThat(piped(inch, "--format", "json").found(Status.FOUND).json().path("format").asInt())
        .isEqualTo(1);
  }

  @Test
  void theProblemEchoedStandsInTheOrderOfTheList() {
    JsonNode rank =
        piped(Run.VALVE, "--format", "json", "--rank", "cost", "--top", "1")
            .found(Status.FOUND)
            .json()
            .path("problem")
            .path("rank");
    assertThat(rank.path("by").asText()).isEqualTo("cost");
    assertThat(rank.path("top").asInt()).isEqualTo(1);
  }

  @Test
  void aBoundFromTheFileIsNotLaidToAHandbook() {
    String wide = Run.VALVE + "limits: {spring_index: {max: 16}, clash_allowance: 20 %}\n";
    JsonNode checks =
        piped(wide, "--format", "json")
            .found(Status.FOUND)
            .json()
            .path("candidates")
            .path(0)
            .path("checks");
    List<String> sources = new ArrayList<>();
    checks.forEach(
        check -> {
          String limit = check.path("limit").asText() + " " + check.path("side").asText();
          sources.add(limit + ": " + check.path("source").asText());
        });
    assertThat(sources)
        .contains(
            "spring index min: common practice, no source",
            "spring index max: problem file, limits",
            "clash allowance min: problem file, limits");
  }

  @Test
  void aLimitThatNoCountMeetsIsExplainedByTheNearestWire() {
    String flat = Run.VALVE.replace("max_solid_length: 18 mm", "max_free_length: 38 mm");
    assertThat(piped(flat).found(Status.NOTHING).out())
        .contains("free length holds at no coil count", "free length 38.67 mm, allowed 38 mm");
  }

  @Test
  void nothingFoundIsPrintedAllTheSame() {
    assertThat(piped(Run.CRAMPED).found(Status.NOTHING).out()).contains("solid length");
    JsonNode json = piped(Run.CRAMPED, "--format=json").found(Status.NOTHING).json();
    assertThat(json.path("candidates").isEmpty()).isTrue();
    assertThat(json.path("conflicts").size()).isEqualTo(6);
  }

  @Test
  void freeLengthThatTheLoadsForbidFitsNothing() {
    String low = Run.VALVE.replace("bore: 18 mm", "bore: 18 mm, max_free_length: 35 mm");
    assertThat(piped(low).found(Status.NOTHING).out()).contains("free length");
  }

  @Test
  void topOverTheFilesTop() {
    assertThat(candidates(Run.VALVE, "--top", "2")).hasSize(2);
    assertThat(candidates(TOP_ONE)).hasSize(1);
    assertThat(candidates(TOP_ONE, "--top=3")).hasSize(3);
    assertThat(candidates(Run.VALVE, "--top=999999")).isEqualTo(candidates(Run.VALVE));
  }

  @Test
  void allIsCutByTheOptionOnly() {
    JsonNode json = piped(TOP_ONE, "--format=json", "--all").found(Status.FOUND).json();
    int every = json.path("search").path("candidates").asInt();
    assertThat(every).isGreaterThan(json.path("search").path("feasible_wires").asInt());
    assertThat(json.path("candidates").size()).isEqualTo(every);
    assertThat(candidates(TOP_ONE, "--all", "--top=7"))
        .hasSize(7)
        .isEqualTo(candidates(TOP_ONE, "--all").subList(0, 7));
  }

  @Test
  void rankOverTheFilesRank() {
    assertSorted("mass_g", true, "--rank=mass");
    assertSorted("cost_index", true, "--rank=cost");
    assertSorted("cost_index", true);
    assertSorted("least_margin", false, "--rank=margin");
  }

  @Test
  void metricUnitsAreAccepted() {
    assertThat(piped(Run.VALVE, "--units=metric").bytes()).isEqualTo(piped(Run.VALVE).bytes());
  }

  @Test
  void fileForCheckIsRefused() {
    piped(Run.DESIGN).refused("standard input: design (line 7): ", "left out for shortlist");
  }

  private static void assertSorted(String key, boolean rising, String... options) {
    List<Double> values = new ArrayList<>();
    String[] args = with(options, "--all", "--format=json");
    JsonNode list = piped(TOP_ONE, args).found(Status.FOUND).json().path("candidates");
    list.forEach(candidate -> values.add((rising ? 1 : -1) * candidate.path(key).asDouble()));
    assertThat(values).hasSizeGreaterThan(6).isSorted();
  }

  private static List<String> candidates(String problem, String... options) {
    List<String> ids = new ArrayList<>();
    JsonNode list = piped(problem, with(options, "--format=json")).json().path("candidates");
    list.forEach(candidate -> ids.add(candidate.path("id").asText()));
    return ids;
  }

  private static Run piped(String problem, String... options) {
    return Run.reading(problem, with(options, "shortlist", "-"));
  }

  private static String[] with(String[] options, String... more) {
    List<String> args = new ArrayList<>(List.of(more));
    args.addAll(List.of(options));
    return args.toArray(String[]::new);
  }
}
