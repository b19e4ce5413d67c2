package coilwright.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;

/** A file in inches has the springs of the metric file that says the same. */
class InchFileTest {

  /** What names a spring by the size as the file writes it. */
  private static final Set<String> AS_TYPED = Set.of("id", "wire_size");

  private static final String LOUVRE =
      """
      spring: extension
      units: inch
      loads: [{length: 3 in, force: 3.5 lbf}, {length: 4.25 in, force: 9 lbf, tolerance: 0.5 lbf}]
      envelope: {max_outside_diameter: 0.6 in, pin: 0.15 in, max_extended_length: 4.5 in}
      make:
        hooks: [full-loop, half-loop]
        loop_planes: right-angle
        materials: [music-wire, stainless-302]
        wire_sizes: [0.039 in, 0.044 in, 0.048 in, 0.055 in]
        diameter_step: 0.0005 in
        length_step: 0.005 in
      """;

  private static final String METRIC_LOUVRE =
      """
      spring: extension
      loads:
        - {length: 76.2 mm, force: 15.56877565341175 N}
        - {length: 107.95 mm, force: 40.0339945373445 N, tolerance: 2.22411080763025 N}
      envelope: {max_outside_diameter: 15.24 mm, pin: 3.81 mm, max_extended_length: 114.3 mm}
      make:
        hooks: [full-loop, half-loop]
        loop_planes: right-angle
        materials: [music-wire, stainless-302]
        wire_sizes: [0.9906 mm, 1.1176 mm, 1.2192 mm, 1.397 mm]
        diameter_step: 0.0127 mm
        length_step: 0.127 mm
      """;

  private static final String HINGE =
      """
      spring: torsion
      units: inch
      loads: [{force: 1.2 lbf, arm: 1.5 in, angle: 20 deg}, {torque: 3.6 lbf*in, angle: 110 deg}]
      envelope: {rod: 0.25 in, diametral_clearance: 0.02 in, max_outside_diameter: 0.75 in}
      make:
        materials: [music-wire, stainless-302]
        legs: {first: 1.5 in, second: 1 in, angle: 180 deg, at_load: 2}
        wire_sizes: [0.055 in, 0.063 in, 0.067 in]
        diameter_step: 0.0005 in
      """;

  private static final String METRIC_HINGE =
      """
      spring: torsion
      loads:
        - {force: 5.3378659383126 N, arm: 38.1 mm, angle: 20 deg}
        - {torque: 406.74538449942012 N*mm, angle: 110 deg}
      envelope: {rod: 6.35 mm, diametral_clearance: 0.508 mm, max_outside_diameter: 19.05 mm}
      make:
        materials: [music-wire, stainless-302]
        legs: {first: 38.1 mm, second: 25.4 mm, angle: 180 deg, at_load: 2}
        wire_sizes: [1.397 mm, 1.6002 mm, 1.7018 mm]
        diameter_step: 0.0127 mm
      """;

  @Test
  void ofAnExtensionSpring() {
    same(LOUVRE, METRIC_LOUVRE);
  }

  @Test
  void ofATorsionSpring() {
    same(HINGE, METRIC_HINGE);
  }

  private static void same(String inch, String metric) {
    JsonNode one = candidates(inch);
    JsonNode other = candidates(metric);
    assertThat(one).hasSizeGreaterThan(10).hasSameSizeAs(other);
    List<String> wrong = new ArrayList<>();
    for (int i = 0; i < one.size(); i++) {
      Map<String, String> cells = FlatJson.of(one.get(i));
      Map<String, String> others = FlatJson.of(other.get(i));
      assertThat(others.keySet()).isEqualTo(cells.keySet());
      for (String name : cells.keySet()) {
        if (!AS_TYPED.contains(name) && !same(name, cells, others)) {
          wrong.add(i + " " + name + ": " + cells.get(name) + ", " + others.get(name));
        }
      }
    }
    assertThat(wrong).isEmpty();
  }

  private static boolean same(String name, Map<String, String> cells, Map<String, String> others) {
    String cell = cells.get(name);
    String other = others.get(name);
    if (!cell.matches("-?[0-9.]+(E-?[0-9]+)?")) {
      return other.equals(cell);
    }
    double value = Double.parseDouble(cell);
    return Math.abs(Double.parseDouble(other) - value) <= 1e-9 * Math.max(1, Math.abs(value));
  }

  private static JsonNode candidates(String problem) {
    Run run = Run.reading(problem, "shortlist", "-", "--all", "--format=json");
    assertThat(run.status()).as(run.err()).isEqualTo(Status.FOUND);
    return run.json().path("candidates");
  }
}
