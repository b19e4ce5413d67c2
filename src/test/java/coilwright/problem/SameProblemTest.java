package coilwright.problem;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** One problem written in several ways. */
class SameProblemTest {

  private static final String JSON =
      """
      {"title": "Greenhouse vent latch", "spring": "compression", "units": "metric",
      \t"loads": [
      \t\t{"length": "32 mm", "force": "18 N", "tolerance": "10 %"},
      \t\t{"length": "22 mm", "force": "45 N", "tolerance": {"plus": "3 N", "minus": "2 N"}}],
       "rate": "2.7 N/mm", "free_length": "38.67 mm", "springs_in_parallel": 2,
       "envelope": {"bore": "16 mm", "rod": "8 mm", "diametral_clearance": "0.4 mm",
         "max_outside_diameter": "15.5 mm", "min_inside_diameter": "8.5 mm",
         "max_free_length": "45 mm", "max_solid_length": "18 mm"},
       "seats": "fixed-pinned",
       "make": {"supply": "any", "materials": ["music-wire", "coil-lot-2608"],
         "exclude_materials": "hard-drawn", "wire_series": ["metric", "music-wire-gauge"],
         "ends": "squared", "hand": "left", "set_removed": false, "coil_step": 0.5,
         "diameter_step": "0.05 mm", "length_step": "0 mm"},
       "limits": {"spring_index": {"max": 14}, "active_coils": "none",
         "pitch_angle": {"max": "10 deg"}, "clash_allowance": "10 %", "stress_basis": "handbook",
         "stress_correction": "wahl", "stress_at_load": {"max": "40 %"},
         "stress_at_solid": "none", "buckling": "at-solid", "surge_frequency": {"min": "200 Hz"}},
       "own_materials": [
         {"id": "coil-lot-2608", "like": "music-wire", "tensile_strength": "1900 MPa"}],
       "rank": {"by": "robust", "top": 3}}
      """;

  private final String expected = Files.problem(FullFileTest.FULL).toString();

  @Test
  void asJson() {
    assertThat(Files.problem(JSON)).hasToString(expected);
    assertThat(Files.problem("\uFEFF \n" + JSON)).hasToString(expected);
  }

  @Test
  void jsonFaultsHaveLines() {
    assertThat(Files.faults(Files.shortlist(JSON.replace("\"rate\": \"2.7", "\"rate\": \"2.9"))))
        .containsExactly(
            "rate (line 5): 2.9 N/mm; must be 2.7 N/mm within 0.1 %, which follows from two loads"
                + " at lengths");
  }

  @Test
  void withItsKeysInAnyOrder() {
    List<String> blocks = new ArrayList<>(Arrays.asList(FullFileTest.FULL.split("\n(?=\\w)")));
    Random random = new Random(4711);
    for (int i = 0; i < 20; i++) {
      Collections.shuffle(blocks, random);
      assertThat(Files.problem(String.join("\n", blocks))).hasToString(expected);
    }
  }

  @Test
  void withQuotesAndOtherUnits() {
    String other =
        FullFileTest.FULL
            .replace("length: 32 mm", "\"length\": '3.2 cm'")
            .replace("force: 45 N", "force: \"0.045 kN\"")
            .replace("false", "\"false\"")
            .replace("bore: 16 mm", "bore: >-\n    16\n    mm");
    assertThat(Files.problem(other)).hasToString(expected);
  }

  @Test
  void withLoadsInAnyOrder() {
    String turned =
        """
        spring: compression
        loads: [{length: 22 mm, force: 45 N}, {length: 32 mm, force: 18 N}]
        """;
    assertThat(Files.problem(turned).required().orElseThrow().line())
        .isEqualTo(Files.problem(Files.LOADS).required().orElseThrow().line());
  }

  @Test
  void withEmptySections() {
    String plain = Files.problem(Files.LOADS).toString();
    String empty =
        Files.LOADS + "envelope:\nmake: {}\nlimits:\n  spring_index:\nrank:\nown_materials:\n";
    assertThat(Files.problem(empty + "design:\n")).hasToString(plain);
  }

  @Test
  void withOneValueForAListOfOne() {
    String one = "make: {materials: music-wire, wire_sizes: 1.6 mm, ends: plain}\n";
    String list = "make: {materials: [music-wire], wire_sizes: [1.6 mm], ends: [plain]}\n";
    assertThat(Files.problem(Files.LOADS + one))
        .hasToString(Files.problem(Files.LOADS + list).toString());
  }
}
