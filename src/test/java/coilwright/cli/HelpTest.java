package coilwright.cli;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Every command explains itself, with an example. */
class HelpTest {

  @Test
  void rootNamesTheCommands() {
    String help = Run.of("--help").found(Status.FOUND).out();
    assertThat(help).contains("Usage: coilwright", "Example:\n  coilwright shortlist ");
    assertThat(help).contains("  shortlist  ", "  check  ", "  materials  ", "  wires  ");
    assertThat(help).contains("  starter  ").isEqualTo(Run.of("-h").out());
  }

  @Test
  void rootTellsTheVersion() {
    String version = Run.of("--version").found(Status.FOUND).out();
    assertThat(version).matches("coilwright (unpackaged|[0-9]+\\.[0-9]+\\.[0-9]+)\n");
    assertThat(Run.of("-V").out()).isEqualTo(version);
  }

  @ParameterizedTest
  @ValueSource(strings = {"shortlist", "check", "materials", "wires", "starter"})
  void everyCommandHasAnExample(String command) {
    String help = Run.of(command, "--help").found(Status.FOUND).out();
    assertThat(help).startsWith("Usage: coilwright " + command);
    assertThat(help).contains("Example:\n  coilwright " + command + " ", "--out=FILE", "--force");
    assertThat(help.lines()).allSatisfy(line -> assertThat(line).matches("[ -~]{0,80}"));
  }

  @ParameterizedTest
  @ValueSource(strings = {"shortlist", "check"})
  void commandsThatJudgeTellTheirStatuses(String command) {
    assertThat(Run.of(command, "--help").out())
        .contains("Exit status: 0 ", " 2 wrong usage or file, 3 ", "- for standard input");
  }
}
