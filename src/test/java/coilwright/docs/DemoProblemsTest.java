package coilwright.docs;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.cli.Program;
import coilwright.cli.Terminal;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;

/** The demo problems show what their comments say they show. */
class DemoProblemsTest {

  private static final Path FLAP = Path.of("problems/flap-return.yaml");
  private static final Path LID = Path.of("problems/infeasible/lid-counterbalance.yaml");
  private static final Path PUMP = Path.of("problems/pump-diaphragm.yaml");

  @Test
  void bucklingDecidesWhichFlapSpringsThereAre() throws IOException {
    JsonNode judged = answer(Files.readString(FLAP));
    assertThat(judged.at("/candidates/0/limiting_check").asText()).isEqualTo("buckling");
    JsonNode first = answer(unjudged()).at("/candidates/0");
    assertThat(first.at("/wire_size").asText()).isEqualTo("1.05");
    assertThat(first.at("/buckling/stable").asBoolean()).isFalse();
    assertThat(first.at("/outside_diameter_mm").asDouble()).isBetween(8.6, 8.8);
  }

  private static String unjudged() throws IOException {
    return Files.readString(FLAP)
        .replace("buckling: at-load", "buckling: none")
        .replace("by: robust", "by: mass");
  }

  @Test
  void theLidHasNoSpringAndAWiderHoleHelps() throws IOException {
    assertThat(answer(Files.readString(LID)).at("/candidates")).isEmpty();
    assertThat(answer(Files.readString(LID).replace("18 mm", "40 mm")).at("/candidates"))
        .isNotEmpty();
  }

  @Test
  void theCheapestPumpSpringUsesUpTheOwnWire() throws IOException {
    JsonNode first = answer(Files.readString(PUMP)).at("/candidates/0");
    assertThat(first.at("/material").asText()).isEqualTo("coil-lot-2608");
    assertThat(first.at("/group_mass_g").asDouble()).isEqualTo(2 * first.at("/mass_g").asDouble());
  }

  private static JsonNode answer(String problem) throws IOException {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    Program.run(
        new Terminal(
            new ByteArrayInputStream(problem.getBytes(StandardCharsets.UTF_8)),
            out,
            new ByteArrayOutputStream()),
        "shortlist",
        "-",
        "--format",
        "json");
    return new ObjectMapper().readTree(out.toByteArray());
  }
}
