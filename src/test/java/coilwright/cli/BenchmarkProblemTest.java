package coilwright.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import org.junit.jupiter.api.Test;

/** The discrete coil spring of Sandgren 1990 as a problem file, solved by the command. */
class BenchmarkProblemTest {

  private static final double INCH = 25.4;

  @Test
  void theBestSpringIsTheKnownOptimum() {
    JsonNode best =
        Run.of("shortlist", "src/test/resources/problems/sandgren-1990.yaml", "--format", "json")
            .found(Status.FOUND)
            .json()
            .path("candidates")
            .path(0);
    double wire = best.path("wire_diameter_mm").asDouble() / INCH;
    double mean = best.path("mean_diameter_mm").asDouble() / INCH;
    double coils = best.path("active_coils").asDouble();
    assertThat(wire).isCloseTo(0.283, within(1e-12));
    assertThat(coils).isEqualTo(9);
    assertThat(mean).isCloseTo(1.22304, within(5e-6));
    assertThat(Math.PI * Math.PI * mean * wire * wire * (coils + 2) / 4)
        .isCloseTo(2.65856, within(5e-6));
  }
}
