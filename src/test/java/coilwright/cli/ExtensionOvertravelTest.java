package coilwright.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** Extension springs that must survive a length beyond their loads, or not ring too low. */
class ExtensionOvertravelTest {

  private static final String SHADE =
      """
      title: Shade-cloth tensioner
      spring: extension
      loads: [{length: 60 mm, force: 20 N}, {length: 90 mm, force: 60 N}]
      envelope: {max_extended_length: 95 mm}
      make: {materials: [music-wire], wire_sizes: [1.6 mm, 1.8 mm]}
      """;

  private static final String BEYOND = SHADE + "overtravel: {length: 94 mm}\n";

  private static final String WITHIN =
      "overtravel no farther than the loads, so that nothing more is asked";

  @Test
  void isReportedAtItsLengthAndHeldByStressAndExtendedLength() {
    JsonNode json = shortlist(BEYOND, "--format=json").json();
    assertThat(json.at("/problem/overtravel/length_mm").asDouble()).isEqualTo(94);
    assertThat(json.path("candidates")).isNotEmpty();
    for (JsonNode spring : json.path("candidates")) {
      JsonNode at = spring.path("overtravel");
      double deflection = 94 - number(spring, "free_length_mm");
      double force =
          number(spring, "initial_tension_n") + number(spring, "rate_n_per_mm") * deflection;
      assertThat(number(at, "length_mm")).isEqualTo(94);
      assertThat(number(at, "deflection_mm")).isCloseTo(deflection, within(1e-9));
      assertThat(number(at, "force_n")).isCloseTo(force, within(1e-9)).isGreaterThan(64);
      assertThat(held(spring, "body stress")).isEqualTo(number(at, "corrected_shear_stress_mpa"));
      assertThat(held(spring, "hook bending stress"))
          .isEqualTo(number(at, "hook_bending_stress_mpa"));
      assertThat(held(spring, "hook torsion stress"))
          .isEqualTo(number(at, "hook_torsion_stress_mpa"));
      assertThat(held(spring, "extended length")).isEqualTo(94);
    }
  }

  @Test
  void beyondTheSpaceItIsAConflict() {
    String far = SHADE + "overtravel: {length: 96 mm}\n";
    Run run = shortlist(far, "--format=json").found(Status.NOTHING);
    assertThat(run.json().path("rejected").toString()).contains("extended length");
    assertThat(shortlist(SHADE, "--format=json").status()).isEqualTo(Status.FOUND);
  }

  @Test
  void isInTextAndCsv() {
    assertThat(shortlist(BEYOND).out()).contains("to 94 mm, no force asked").doesNotContain(WITHIN);
    JsonNode json = shortlist(BEYOND, "--format=json").json();
    CsvRows csv = CsvRows.of(shortlist(BEYOND, "--format=csv").out());
    assertThat(csv.rows()).isNotEmpty();
    for (int i = 0; i < csv.rows().size(); i++) {
      Map<String, String> flat = FlatJson.of(json.path("candidates").get(i));
      flat.keySet().removeIf(key -> !key.startsWith("overtravel_"));
      assertThat(flat).containsKey("overtravel_hook_bending_stress_mpa");
      assertThat(csv.rows().get(i)).containsAllEntriesOf(flat);
    }
    assertThat(shortlist(SHADE, "--format=csv").out()).doesNotContain("overtravel");
  }

  @Test
  void aCheckHasItBesideItsLoads() {
    String spring =
        "spring: extension\nloads: [{force: 20 N}]\n"
            + "design: {material: music-wire, wire_diameter: 1.2 mm, mean_diameter: 9 mm,"
            + " body_coils: 21, initial_tension: 8 N, hooks: full-loop}\n";
    String far = Run.reading(spring + "overtravel: {length: 65 mm}\n", "check", "-").out();
    assertThat(far).contains("to 65 mm, no force asked").doesNotContain(WITHIN);
    assertThat(far).containsPattern("\n *overtravel +65\\.00 ");
    assertThat(Run.reading(spring + "overtravel: {length: 45 mm}\n", "check", "-").out())
        .contains(WITHIN);
  }

  @Test
  void aSurgeFrequencyLeavesOutWhatIsSlower() {
    List<Double> free = frequencies(SHADE);
    double middle = free.stream().sorted().toList().get(free.size() / 2);
    List<Double> held = frequencies(SHADE + "limits: {surge_frequency: {min: " + middle + " Hz}}");
    assertThat(free).anyMatch(frequency -> frequency < middle);
    assertThat(held).isNotEmpty().isSubsetOf(free).allMatch(frequency -> frequency >= middle);
    assertThat(held).hasSameSizeAs(free.stream().filter(one -> one >= middle).toList());
  }

  private static List<Double> frequencies(String problem) {
    List<Double> frequencies = new ArrayList<>();
    for (JsonNode spring : shortlist(problem, "--format=json").json().path("candidates")) {
      frequencies.add(number(spring, "surge_frequency_hz"));
    }
    return frequencies;
  }

  private static double held(JsonNode spring, String limit) {
    for (JsonNode check : spring.path("checks")) {
      if (check.path("limit").asText().equals(limit)) {
        assertThat(check.path("definition").asText()).endsWith(", overtravel included");
        return number(check, "value");
      }
    }
    throw new AssertionError(limit + " is not checked");
  }

  private static double number(JsonNode body, String key) {
    assertThat(body.path(key).isNumber()).as(key).isTrue();
    return body.path(key).asDouble();
  }

  private static Run shortlist(String problem, String... options) {
    List<String> args = new ArrayList<>(List.of("shortlist", "-", "--all"));
    args.addAll(List.of(options));
    return Run.reading(problem, args.toArray(String[]::new));
  }
}
