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
  void theTreatmentOfTheSpringIsSaidBack() {
    assertThat(Run.reading(Run.DESIGN, "check", "-").out()).doesNotContain("  set ", "  coating ");
    String treated = Run.DESIGN + "  set_removed: true\n  coating: {thickness: 8 um}\n";
    assertThat(Run.reading(treated, "check", "-").found(Status.FOUND).out())
        .containsPattern("(?m)^  set +removed: pressed solid once before use$")
        .containsPattern("(?m)^  coating +0\\.008 mm thick$");
  }

  @Test
  void checksSayWhereTheCoatingCounts() {
    String bare = Run.DESIGN;
    assertThat(Run.reading(bare, "check", "-").out()).doesNotContain("coating included");
    assertThat(Run.reading(bare + "  coating: {thickness: 8 um}\n", "check", "-").out())
        .contains("outside diameter at solid, ends held, coating included, against bore less")
        .contains("inside diameter, free state, coating included, against rod plus")
        .contains("nominal wire diameter, coating included")
        .contains("solid length, coating included, against the length at the most compressed load")
        .contains("against the wire diameter, coating included");
  }

  @Test
  void loadBeyondSolidIsStatusThree() {
    String tight = Run.DESIGN.replace("length: 22 mm", "length: 12 mm");
    Run run = Run.reading(tight, "check", "-", "--format=json").found(Status.NOTHING);
    assertThat(run.out()).contains("beyond solid");
  }

  @Test
  void anOvertravelWithinTheLoadsIsSaid() {
    String force =
        Run.DESIGN
            .replaceAll("(?s)loads:.*envelope", "loads: [{force: 45 N}]\nenvelope")
            .concat("overtravel: {length: 21 mm}\n");
    String warning = "overtravel no farther than the loads, so that nothing more is asked";
    assertThat(Run.reading(force, "check", "-").out())
        .contains("to 21 mm, no force asked")
        .doesNotContain(warning);
    assertThat(Run.reading(force.replace("21 mm", "30 mm"), "check", "-").out()).contains(warning);
    String stroke =
        """
        spring: compression
        loads: [{force: 25 N}, {force: 70 N}]
        stroke: 15 mm
        overtravel: {length: 30 mm}
        make: {materials: [en-10270-1-sh], ends: [squared-ground]}
        """;
    assertThat(Run.reading(stroke, "shortlist", "-").out()).contains(warning + ": #1, #2");
    assertThat(Run.reading(stroke.replace("30 mm", "14 mm"), "shortlist", "-").out())
        .contains(warning + ": #3, #4\n");
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

  @Test
  void aRateAskedIsHeldAgainstTheSpringEvenWithOneLoad() {
    String stiff =
        "spring: compression\nloads: [{length: 22 mm, force: 45 N}]\nrate: 2.7 N/mm\n"
            + "design: {material: music-wire, wire_diameter: 1.7 mm, mean_diameter: 12.2 mm, "
            + "active_coils: 8, free_length: 29.663 mm, ends: squared-ground}\n";
    assertThat(Run.reading(stiff, "check", "-").found(Status.NOTHING).out())
        .contains("The spring fails: nominal load.");
  }

  @Test
  void aForceAloneIsHeldAgainstTheLineThatOtherFactsFix() {
    String soft =
        "spring: compression\nloads: [{force: 20 N}]\nrate: 3 N/mm\nfree_length: 38 mm\n"
            + "design: {material: music-wire, wire_diameter: 1.4 mm, mean_diameter: 12.2 mm, "
            + "active_coils: 8, free_length: 38 mm, ends: squared-ground}\n";
    assertThat(Run.reading(soft, "check", "-").found(Status.NOTHING).out())
        .contains("nominal load");
  }
}
