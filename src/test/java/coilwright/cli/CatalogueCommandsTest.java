package coilwright.cli;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.spring.Kind;
import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** What materials, wires and starter print. */
class CatalogueCommandsTest {

  @Test
  void materials() {
    String all = Run.of("materials").found(Status.FOUND).out();
    assertThat(all).contains("music-wire", "standard", "density", "cost index", "source", "seen");
    assertThat(Run.of("materials", "music-wire").found(Status.FOUND).out())
        .startsWith("music-wire")
        .doesNotContain("hard-drawn\n");
    JsonNode two =
        Run.of("materials", "hard-drawn", "music-wire", "hard-drawn", "--format", "json").json();
    assertThat(two.path("materials").findValuesAsText("id"))
        .containsExactly("hard-drawn", "music-wire");
  }

  @Test
  void textOfANamedGradeHasEverySizeAndTextOfAllASpread() {
    int sizes = Run.of("materials", "music-wire", "--format=csv").out().split("\n").length - 1;
    String named = Run.of("materials", "music-wire").found(Status.FOUND).out();
    assertThat(named.lines().filter(line -> line.endsWith("  seen"))).hasSize(sizes);
    assertThat(named).doesNotContain("name the grade");
    assertThat(Run.of("materials").found(Status.FOUND).out())
        .contains("  7 of " + sizes + " sizes; name the grade to see them all\n");
  }

  @Test
  void wires() {
    assertThat(Run.of("wires").found(Status.FOUND).out()).contains("metric", "music-wire-gauge");
    assertThat(Run.of("wires", "metric").found(Status.FOUND).out())
        .contains("1.40")
        .doesNotContain("music-wire-gauge");
    JsonNode json = Run.of("wires", "metric", "metric", "--format=json").json();
    assertThat(json.findValuesAsText("wire_size")).contains("1.40").doesNotHaveDuplicates();
  }

  @Test
  void materialsPrintsEveryGradeWithItsSources() {
    JsonNode all = Run.of("materials", "--format", "json").json().path("materials");
    assertThat(all).hasSize(27);
    String text = Run.of("materials").found(Status.FOUND).out();
    for (JsonNode grade : all) {
      assertThat(text).contains(grade.path("id").asText() + "  " + grade.path("name").asText());
      assertThat(grade.path("sources").findValuesAsText("what"))
          .as(grade.path("id").asText())
          .contains("strength", "moduli", "diameter tolerance", "density", "cost index");
      assertThat(grade.path("wires").findValuesAsText("wire_diameter_tolerance_mm"))
          .hasSizeGreaterThan(20);
    }
  }

  @Test
  void wiresPrintsEverySizeWithItsSource() {
    JsonNode sizes = Run.of("wires", "--format", "json").json().path("wires");
    assertThat(sizes.findValuesAsText("wire_series"))
        .contains("metric", "music-wire-gauge", "steel-wire-gauge", "brown-sharpe");
    assertThat(sizes.findValuesAsText("source")).hasSize(sizes.size()).doesNotContain("");
    assertThat(Run.of("wires", "music-wire-gauge").found(Status.FOUND).out())
        .contains("0.048  1.219", "[1] trade tables, music wire gauge", "[2] ASTM A228");
  }

  @Test
  void everyMemoryGradeIsTriedWhenNamedAndThenSaysSo() {
    String problem =
        """
        spring: compression
        loads: [{length: 32 mm, force: 18 N}, {length: 22 mm, force: 45 N}]
        make:
          materials: [chrome-silicon, phosphor-bronze, monel-400, en-10270-2-fdsicr]
        """;
    Run named = Run.reading(problem, "shortlist", "-", "--format", "json", "--top", "500");
    JsonNode candidates = named.json().path("candidates");
    assertThat(candidates.findValuesAsText("material"))
        .contains("chrome-silicon", "phosphor-bronze", "monel-400", "en-10270-2-fdsicr");
    assertThat(candidates.findValuesAsText("data")).containsOnly("memory");
    String unnamed = problem.replaceAll("(?s)make:.*", "make: {supply: any}\n");
    Run common = Run.reading(unnamed, "shortlist", "-", "--format", "json", "--top", "500");
    assertThat(common.json().path("candidates").findValuesAsText("data")).containsOnly("seen");
  }

  @Test
  void aWireFromMemorySaysSoWhereNothingFitsToo() {
    String problem = Run.CRAMPED.replace("[music-wire]", "[music-wire, chrome-silicon]");
    assertThat(Run.reading(problem, "shortlist", "-").found(Status.NOTHING).out())
        .contains(" music-wire, ", " chrome-silicon (memory), ")
        .doesNotContain("music-wire (memory)");
    Run json = Run.reading(problem, "shortlist", "-", "--format=json").found(Status.NOTHING);
    for (JsonNode conflict : json.json().path("conflicts")) {
      String material = conflict.path("material").asText();
      assertThat(conflict.path("reason").asText().contains(" (memory), "))
          .isEqualTo(material.equals("chrome-silicon"));
    }
  }

  @Test
  void densityFromMemoryIsSaidOfTheSpringsWithIt() {
    String both = loose("music-wire, en-10270-3-1.4310-ns");
    assertThat(warnings(both))
        .anyMatch(
            line ->
                line.startsWith("density from memory, on which mass, cost and surge frequency rest")
                    && line.contains("1.4310-ns/")
                    && !line.contains("music-wire/"));
    String own =
        loose("lot")
            + "own_materials: [{id: lot, like: en-10270-3-1.4310-ns, density: 7900 kg/m^3}]\n";
    assertThat(warnings(own)).noneMatch(line -> line.contains("density"));
    assertThat(warnings(own.replace(", density: 7900 kg/m^3", "")))
        .anyMatch(line -> line.contains("density"));
  }

  @Test
  void aToleranceTakenForTheGradeIsSaidWhereTheSolidLengthRestsOnIt() {
    String handbook = loose("stainless-302, en-10270-1-sh");
    assertThat(warnings(handbook)).noneMatch(line -> line.contains("tolerance"));
    assertThat(warnings(handbook + "limits: {stress_basis: en-13906}\n"))
        .anyMatch(
            line ->
                line.startsWith("diameter tolerance not seen for the grade but taken for it")
                    && line.contains("stainless-302/")
                    && !line.contains("-sh/"));
  }

  private static String loose(String materials) {
    return """
        spring: compression
        loads: [{length: 32 mm, force: 18 N}, {length: 22 mm, force: 45 N}]
        make: {materials: [%s], wire_series: metric}
        rank: {top: 500}
        """
        .replace("%s", materials);
  }

  private static List<String> warnings(String problem) {
    List<String> warnings = new ArrayList<>();
    Run run = Run.reading(problem, "shortlist", "-", "--format=json").found(Status.FOUND);
    run.json().path("warnings").forEach(line -> warnings.add(line.asText()));
    return warnings;
  }

  @ParameterizedTest
  @EnumSource(Kind.class)
  void starterIsAProblemWithSprings(Kind kind) {
    String starter = Run.of("starter", kind.id()).found(Status.FOUND).out();
    assertThat(starter).startsWith("# ").contains("\nloads:", "\nspring: " + kind.id());
    Run run = Run.reading(starter, "shortlist", "-");
    assertThat(run.err()).isEmpty();
    assertThat(run.status()).isEqualTo(Status.FOUND);
  }

  @Test
  void starterPrintsTheSchemaWithAKindOrWithout() {
    Run run = Run.of("starter", "--schema").found(Status.FOUND);
    for (Kind kind : Kind.values()) {
      JsonNode file = run.json().path("allOf").path(kind.ordinal()).path("then");
      assertThat(file.path("properties").path("loads").path("type").asText()).isEqualTo("array");
    }
    assertThat(Run.of("starter", "compression", "--schema").found(Status.FOUND).out())
        .isEqualTo(run.out());
    assertThat(Run.of("starter", "torsion", "--schema").found(Status.FOUND).out())
        .isEqualTo(run.out());
    Run.of("starter", "leaf", "--schema").refused("KIND: \"leaf\"");
  }
}
