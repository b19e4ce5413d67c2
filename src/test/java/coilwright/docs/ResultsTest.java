package coilwright.docs;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.SortedMap;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The files under results/ are what the program prints today. After a change that is meant, write
 * them afresh with the command that DEVELOPERS.md gives.
 */
class ResultsTest {

  private static SortedMap<Path, String> expected;

  @BeforeAll
  static void run() throws IOException {
    expected = Results.expected();
  }

  @Test
  void everyProblemHasItsResultsAndNoResultIsStray() throws IOException {
    assertThat(Results.present()).isEqualTo(expected.keySet());
  }

  @Test
  void everyResultIsByteForByteWhatTheProgramPrints() throws IOException {
    for (Map.Entry<Path, String> file : expected.entrySet()) {
      byte[] printed = file.getValue().getBytes(StandardCharsets.UTF_8);
      assertThat(new String(Files.readAllBytes(file.getKey()), StandardCharsets.UTF_8))
          .as(file.getKey().toString())
          .isEqualTo(file.getValue());
      assertThat(Files.readAllBytes(file.getKey())).isEqualTo(printed);
    }
  }

  @ParameterizedTest
  @CsvSource({
    "check-valve.yaml, 0",
    "vent-latch.yaml, 0",
    "flap-return.yaml, 0",
    "pump-diaphragm.yaml, 0",
    "mist-nozzle.yaml, 0",
    "backwash-valve.yaml, 0",
    "float-valve.yaml, 0",
    "plunger-pump.yaml, 0",
    "check-valve-offer.yaml, 3",
    "infeasible/lid-counterbalance.yaml, 3",
    "infeasible/cold-frame-prop.yaml, 3"
  })
  void aProblemEndsWithItsStatus(String name, int status) throws IOException {
    Path problem = Path.of("problems").resolve(name);
    Printed printed = Printed.by(Results.command(problem), problem.toString());
    assertThat(printed.status()).isEqualTo(status);
    assertThat(printed.err()).isEmpty();
  }
}
