package coilwright.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** CSV holds what JSON holds, under the same names, in a closed set of columns. */
class CsvTest {

  private static final String TWINS =
      Run.VALVE.replace("spring:", "springs_in_parallel: 2\nspring:");

  private static final String OVERTRAVEL = Run.VALVE + "overtravel: {length: 21 mm}\n";

  private static final String BY_EN = OVERTRAVEL + "limits: {stress_basis: en-13906}\n";

  private static final String STROKE =
      Run.VALVE
          .replace("{length: 32 mm, force: 18 N, tolerance: 10 %}", "{force: 18 N}")
          .replace("{length: 22 mm, force: 45 N, tolerance: 10 %}", "{force: 45 N}")
          .replace("envelope:", "stroke: 10 mm\nenvelope:");

  @Test
  void aShortlistIsItsJsonFlattened() {
    for (String problem : new String[] {Run.VALVE, TWINS, OVERTRAVEL, BY_EN, STROKE}) {
      JsonNode candidates = shortlist(problem, "--all", "--format=json").json().path("candidates");
      CsvRows csv = csv(shortlist(problem, "--all", "--format=csv"));
      assertThat(csv.rows()).hasSize(candidates.size()).hasSizeGreaterThan(3);
      for (int i = 0; i < candidates.size(); i++) {
        same(csv.rows().get(i), FlatJson.of(candidates.get(i)), "problem_title");
      }
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"louvre-return", "shade-tensioner", "vent-flap-hinge", "bin-lid"})
  void aDemoWithHooksOrLegsIsItsJsonFlattened(String demo) {
    String problem = Run.demo(demo);
    JsonNode candidates = shortlist(problem, "--all", "--format=json").json().path("candidates");
    CsvRows csv = csv(shortlist(problem, "--all", "--format=csv", "--units=metric"));
    assertThat(csv.rows()).hasSize(candidates.size()).hasSizeGreaterThan(3);
    for (int i = 0; i < candidates.size(); i++) {
      same(csv.rows().get(i), FlatJson.of(candidates.get(i)), "problem_title");
    }
  }

  @Test
  void aCheckIsItsJsonFlattened() {
    String thick = Run.DESIGN.replace("wire_diameter: 1.3 mm", "wire_diameter: 7 mm");
    String wide = thick.replace("mean_diameter: 10.53 mm", "mean_diameter: 60 mm");
    String beyond = Run.DESIGN + "overtravel: {length: 21 mm}\n";
    for (String problem : new String[] {Run.DESIGN, Run.WEAK, beyond, wide}) {
      JsonNode json = Run.reading(problem, "check", "-", "--format=json").json();
      CsvRows csv = csv(Run.reading(problem, "check", "-", "--format=csv"));
      assertThat(csv.rows()).hasSize(1);
      assertThat(csv.rows().get(0)).containsEntry("problem_title", "Drip-header valve");
      assertThat(csv.rows().get(0)).containsEntry("holds", json.path("holds").asText());
      same(csv.rows().get(0), FlatJson.of(json.path("spring")), "problem_title", "holds");
    }
  }

  @Test
  void theProblemAloneDecidesTheColumns() {
    String three = Run.VALVE + "limits: {active_coils: {max: 4}}\n";
    Run none = shortlist(three, "--format=csv");
    assertThat(none.status()).isEqualTo(Status.NOTHING);
    assertThat(none.err()).contains("note: no spring meets the problem; --format text says why\n");
    assertThat(none.out()).hasLineCount(1).endsWith("\n");
    assertThat(csv(none).header())
        .isEqualTo(csv(shortlist(Run.VALVE, "--format=csv")).header())
        .contains("load_2_force_n", "solid_force_n", "buckling_stable", "mass_g")
        .doesNotContain("group_mass_g", "load_3_force_n");
  }

  @Test
  void whatRowsHaveNoRoomForIsSaidOnStandardError() {
    String memory = "make:\n  materials: [en-10270-1-sh]\n  wire_series: [metric]\n";
    String problem = Run.VALVE.substring(0, Run.VALVE.indexOf("make:")) + memory;
    Run run = shortlist(problem, "--format=csv");
    JsonNode warnings = shortlist(problem, "--format=json").json().path("warnings");
    List<String> notes = new ArrayList<>();
    warnings.forEach(warning -> notes.add("note: " + warning.asText() + "\n"));
    assertThat(run.err()).isNotEmpty().isEqualTo(String.join("", notes));
  }

  @Test
  void numbersAreNeverTakenForText() {
    Map<String, String> row =
        csv(Run.reading(Run.WEAK, "check", "-", "--format=csv")).rows().get(0);
    assertThat(row.get("check_nominal_load_max_margin")).matches("-[0-9]+\\.[0-9]+");
    assertThat(row.get("check_spring_index_min_unit")).isEqualTo("-");
  }

  @Test
  void whatAUserTypedIsText() {
    typed("\"=1+1\"", "'=1+1");
    typed("\"+1\"", "'+1");
    typed("\"-1\"", "'-1");
    typed("\"@cmd\"", "'@cmd");
    typed("'a \"b\", c'", "a \"b\", c");
    typed("\"a\\nb\"", "a b");
    typed("\"'x = 1\"", "'x = 1");
  }

  @Test
  void idsAndSizesOfAUserAreTextToo() {
    String own =
        Run.VALVE
                .replace("[music-wire]", "[\"=lot+1\"]")
                .replace("[1.3 mm, 1.4 mm, 1.5 mm]", "[\"+1.4 mm\"]")
            + "own_materials: [{id: \"=lot+1\", like: music-wire}]\n";
    Map<String, String> row = csv(shortlist(own, "--format=csv")).rows().get(0);
    assertThat(row).containsEntry("material", "'=lot+1").containsEntry("wire_size", "'+1.4 mm");
    assertThat(row.get("id")).startsWith("'=lot+1/+1.4 mm/squared");
  }

  @Test
  void wiresAndMaterials() {
    assertThat(Run.of("wires", "metric", "--format=csv").found(Status.FOUND).out())
        .startsWith(
            "wire_series,wire_size,wire_diameter_mm,data,source\nmetric,0.05,0.05,seen,\"EN 10270-1,");
    assertThat(Run.of("wires", "music-wire-gauge", "--format=csv", "--units=inch").out())
        .startsWith("wire_series,wire_size,wire_diameter_in,data,source\n")
        .contains("\nmusic-wire-gauge,6/0,0.004,seen,");
    JsonNode grade = Run.of("materials", "stainless-302", "--format=json").json();
    CsvRows csv = csv(Run.of("materials", "stainless-302", "--format=csv"));
    JsonNode wires = grade.path("materials").path(0).path("wires");
    assertThat(csv.rows()).hasSize(wires.size());
    for (int i = 0; i < wires.size(); i++) {
      assertThat(csv.rows().get(i)).containsAllEntriesOf(FlatJson.of(wires.get(i)));
      assertThat(csv.rows().get(i)).containsEntry("standard", "ASTM A313 type 302");
      assertThat(csv.rows().get(i).get("sources")).contains("strength: ASTM A313");
    }
  }

  private static void typed(String yaml, String cell) {
    String problem = Run.VALVE.replace("title: Drip-header valve", "title: " + yaml);
    assertThat(csv(shortlist(problem, "--format=csv", "--top=2")).rows())
        .hasSize(2)
        .allMatch(row -> row.get("problem_title").equals(cell), cell);
  }

  /** Each key has its column; a column without a key is empty. */
  private static void same(Map<String, String> row, Map<String, String> keys, String... more) {
    keys.forEach((key, value) -> assertThat(row.get(key)).as(key).isEqualTo(value));
    List<String> said = new ArrayList<>(keys.keySet());
    said.addAll(List.of(more));
    row.forEach(
        (name, cell) -> assertThat(said.contains(name) || cell.isEmpty()).as(name).isTrue());
  }

  private static CsvRows csv(Run run) {
    assertThat(run.out()).endsWith("\n").matches("[ -~\n]*");
    return CsvRows.of(run.out());
  }

  private static Run shortlist(String problem, String... options) {
    List<String> args = new ArrayList<>(List.of("shortlist", "-"));
    args.addAll(List.of(options));
    return Run.reading(problem, args.toArray(String[]::new));
  }
}
