package coilwright.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import org.junit.jupiter.api.Test;

/** What only extension and torsion springs bring into the outputs. */
class OtherKindsTest {

  private static final String PULL =
      "spring: extension\nloads: [{length: 60 mm, force: 20 N}, {length: 90 mm, force: 60 N}]\n";

  private static final String TWIST =
      "spring: torsion\nloads: [{torque: 120 N*mm, angle: 30 deg}, {torque: 400 N*mm, angle: 120 deg}]\n";

  @Test
  void legsThatAreSofterThanTheRateAreNamedAsWhatTheyAre() {
    String file = TWIST + "make: {wire_sizes: [0.5 mm], legs: {first: 3000 mm, second: 20 mm}}\n";
    Run run = Run.reading(file, "shortlist", "-").found(Status.NOTHING);
    assertThat(run.out()).contains("straight legs: the legs alone are softer than the rate\n");
    JsonNode json = Run.reading(file, "shortlist", "-", "--format", "json").json();
    assertThat(json.at("/conflicts/0/limits/0/limit").asText()).isEqualTo("legs");
    assertThat(json.at("/conflicts/0/limits/0/coils").isEmpty()).isTrue();
    assertThat(json.at("/rejected/0/limit").asText()).isEqualTo("legs");
  }

  @Test
  void hooksThatAreSofterThanTheRateAreNamedAsWhatTheyAre() {
    String file =
        "spring: extension\nloads: [{length: 20 mm, force: 200 N}]\nrate: 5800 N/mm\n"
            + "make: {wire_sizes: [0.3 mm], materials: [en-10270-1-sh]}\n";
    Run run = Run.reading(file, "shortlist", "-").found(Status.NOTHING);
    assertThat(run.out()).contains("full-loop hooks: the hooks alone are softer than the rate\n");
  }

  @Test
  void aFreeLengthAboveTheShorterLengthIsToldInNumbers() {
    String file = PULL + "make: {wire_sizes: [3 mm], materials: [en-10270-1-sh]}\n";
    assertThat(Run.reading(file, "shortlist", "-").found(Status.NOTHING).out())
        .contains("free length ")
        .contains("allowed 60 mm (inside the hooks, against the shortest loaded length");
  }

  @Test
  void sideLoopsStandBehindAllSpringsHeldToStress() {
    String file = PULL + "make: {hooks: [side-loop, full-loop]}\nrank: {top: 100}\n";
    JsonNode candidates =
        Run.reading(file, "shortlist", "-", "--format", "json").json().path("candidates");
    boolean behind = false;
    int held = 0;
    for (JsonNode candidate : candidates) {
      boolean assessed = candidate.path("stress_assessed").asBoolean();
      assertThat(assessed && behind).as(candidate.path("id").asText()).isFalse();
      behind |= !assessed;
      held += assessed ? 1 : 0;
    }
    assertThat(behind).isTrue();
    assertThat(held).isPositive();
  }

  @Test
  void theEchoOfTheCoilStepIsLeftOutWhereSomethingElseFixesTheCounts() {
    String angle = TWIST + "make: {legs: {first: 20 mm, second: 20 mm, angle: 90 deg}}\n";
    assertThat(made(angle).has("coil_step")).isFalse();
    assertThat(made(TWIST).path("coil_step").asDouble()).isEqualTo(0.25);
    assertThat(made(PULL + "make: {loop_planes: right-angle}\n").has("coil_step")).isFalse();
    assertThat(made(PULL + "make: {loop_planes: in-line}\n").path("coil_step").asDouble())
        .isEqualTo(0.5);
  }

  private static JsonNode made(String file) {
    return Run.reading(file, "shortlist", "-", "--format", "json").json().at("/problem/make");
  }

  @Test
  void withoutLegsNothingIsPaidForThem() {
    String design =
        "design: {material: music-wire, wire_diameter: 1.5 mm, mean_diameter: 17 mm, body_coils: 5";
    String bare = Run.reading(TWIST + design + "}\n", "check", "-").out();
    String legs =
        Run.reading(TWIST + design + ", legs: {first: 20 mm, second: 20 mm}}\n", "check", "-")
            .out();
    assertThat(bare).containsPattern("leg forming +0\\.00\n").doesNotContain("grinding");
    assertThat(legs).containsPattern("leg forming +[1-9]");
  }

  @Test
  void aLoadBelowTheInitialTensionDoesNotPartTheCoils() {
    String file =
        "spring: extension\nloads: [{force: 10 N}, {length: 80 mm}]\n"
            + "design: {material: music-wire, wire_diameter: 1.5 mm, mean_diameter: 13 mm,"
            + " body_coils: 20, initial_tension: 15 N, hooks: full-loop}\n";
    JsonNode spring = Run.reading(file, "check", "-", "--format", "json").json().path("spring");
    assertThat(spring.at("/loads/0/deflection_mm").asDouble()).isZero();
    assertThat(spring.at("/loads/0/length_mm").asDouble())
        .isEqualTo(spring.path("free_length_mm").asDouble());
  }

  private static final String PULLED =
      PULL
          + "envelope: {pin: 15 mm}\ndesign: {material: music-wire, wire_diameter: 1.4 mm,"
          + " mean_diameter: 11 mm, body_coils: 22, initial_tension: 8 N, hooks: full-loop";

  @Test
  void aLoopWiderThanTheCoilIsBentBySoMuchMore() {
    double usual = hookBending(PULLED + "}\n");
    assertThat(hookBending(PULLED + ", hook_bend_radius: 0.4}\n")).isGreaterThan(usual);
    assertThat(hookBending(PULLED + ", hook_bend_radius: 0.8}\n"))
        .isBetween(1.5 * usual, 1.6 * usual);
  }

  private static double hookBending(String file) {
    JsonNode json = Run.reading(file, "check", "-", "--format", "json").json();
    return json.at("/spring/loads/1/hook_bending_stress_mpa").asDouble();
  }

  @Test
  void aPinMustAlsoPassBetweenLoopAndBody() {
    String file = PULLED + ", hook_bend_radius: 0.8}\n";
    for (JsonNode check :
        Run.reading(file, "check", "-", "--format", "json").json().at("/spring/checks")) {
      if (check.path("limit").asText().equals("pin")) {
        assertThat(check.path("value").asDouble()).isEqualTo(11 - 1.4);
        assertThat(check.path("holds").asBoolean()).isFalse();
        return;
      }
    }
    throw new AssertionError("no check of the pin");
  }

  @Test
  void aListedTorsionSpringHoldsWhenItIsChecked() {
    String file =
        "spring: torsion\nloads: [{torque: 100 N*mm, angle: 0 deg}, {torque: 300 N*mm, angle: 90 deg}]\n";
    String make = "make: {diameter_step: 0.5 mm, materials: [en-10270-1-sh]}\n";
    JsonNode listed =
        Run.reading(file + make, "shortlist", "-", "--format", "json", "--all", "--top", "400")
            .json()
            .path("candidates");
    assertThat(listed).isNotEmpty();
    for (JsonNode spring : listed) {
      String design =
          "design: {material: en-10270-1-sh, wire_diameter: "
              + spring.path("wire_diameter_mm").asText()
              + " mm, mean_diameter: "
              + spring.path("mean_diameter_mm").asText()
              + " mm, body_coils: "
              + spring.path("body_coils").asText()
              + "}\n";
      Run.reading(file + design, "check", "-", "--format", "json").found(Status.FOUND);
    }
  }

  @Test
  void aSearchWithoutAnyBoundOnLengthEnds() {
    String file = "spring: extension\nloads: [{force: 1 N}]\nrate: 0.001 N/mm\n";
    JsonNode json = Run.reading(file, "shortlist", "-", "--format", "json").json();
    assertThat(json.at("/search/wires").asInt()).isPositive();
    for (JsonNode candidate : json.path("candidates")) {
      assertThat(candidate.path("body_coils").asDouble()).isLessThanOrEqualTo(500);
    }
  }
}
