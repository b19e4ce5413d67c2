package coilwright.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import org.junit.jupiter.api.Test;

/** What check prints and returns. */
class CheckTest {

  @Test
  void springThatHolds() {
    Run run = Run.reading(Run.DESIGN, "check", "-").found(Status.FOUND);
    assertThat(run.out()).startsWith("Drip-header valve\n").contains("stress at load");
    JsonNode spring = Run.reading(Run.DESIGN, "check", "-", "--format=json").json().path("spring");
    assertThat(spring.path("wire_diameter_mm").asDouble()).isEqualTo(1.3);
    assertThat(spring.path("checks")).isNotEmpty().allMatch(row -> row.path("holds").asBoolean());
  }

  @Test
  void springThatFailsIsPrintedAllTheSame() {
    assertThat(Run.reading(Run.WEAK, "check", "-").found(Status.NOTHING).out()).isNotEmpty();
    Run run = Run.reading(Run.WEAK, "check", "-", "--format=json").found(Status.NOTHING);
    assertThat(run.json().path("spring").path("checks"))
        .anyMatch(row -> !row.path("holds").asBoolean(true));
  }

  @Test
  void loadBeyondSolidIsStatusThree() {
    String tight = Run.DESIGN.replace("length: 22 mm", "length: 12 mm");
    Run run = Run.reading(tight, "check", "-", "--format=json").found(Status.NOTHING);
    assertThat(run.out()).contains("beyond solid");
  }

  @Test
  void fileForShortlistIsRefused() {
    Run.reading(Run.VALVE, "check", "-").refused("design", "missing", "shortlist needs none");
  }

  @Test
  void makeBesideDesignIsRefused() {
    String both = Run.DESIGN + "make: {materials: [music-wire]}\n";
    Run.reading(both, "check", "-").refused("given beside make");
    Run.reading(both, "shortlist", "-").refused("given beside make");
  }
}
