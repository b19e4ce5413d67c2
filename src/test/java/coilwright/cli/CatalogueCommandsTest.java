package coilwright.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import org.junit.jupiter.api.Test;

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
  void wires() {
    assertThat(Run.of("wires").found(Status.FOUND).out()).contains("metric", "music-wire-gauge");
    assertThat(Run.of("wires", "metric").found(Status.FOUND).out())
        .contains("1.40")
        .doesNotContain("music-wire-gauge");
    JsonNode json = Run.of("wires", "metric", "metric", "--format=json").json();
    assertThat(json.findValuesAsText("wire_size")).contains("1.40").doesNotHaveDuplicates();
  }

  @Test
  void starterIsAValidProblem() {
    String starter = Run.of("starter", "compression").found(Status.FOUND).out();
    assertThat(starter).startsWith("# ").contains("\nloads:", "\nspring: compression");
    Run run = Run.reading(starter, "shortlist", "-");
    assertThat(run.err()).isEmpty();
    assertThat(run.status()).isIn(Status.FOUND, Status.NOTHING);
  }

  @Test
  void starterPrintsTheSchemaWithAKindOrWithout() {
    Run run = Run.of("starter", "--schema").found(Status.FOUND);
    assertThat(run.json().path("properties").path("loads").path("type").asText())
        .isEqualTo("array");
    assertThat(Run.of("starter", "compression", "--schema").found(Status.FOUND).out())
        .isEqualTo(run.out());
    Run.of("starter", "torsion", "--schema").refused("KIND: \"torsion\"");
  }
}
