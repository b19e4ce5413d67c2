package coilwright.docs;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What README.md and DEVELOPERS.md say of the program is true of it. */
class ReadmeTest {

  private static final Pattern LINK = Pattern.compile("\\]\\(([^)#:]+)\\)");
  private static final Pattern OPTION = Pattern.compile("--[a-z]+");

  @Test
  void quotedOutputsAndTheKeyTableAreWhatTheProgramPrints() throws IOException {
    assertThat(Readme.text()).isEqualTo(Readme.refreshed(Readme.text()));
  }

  @Test
  void everyOutputBlockIsMarkedSoThatItIsHeldToTheProgram() throws IOException {
    List<String> lines = Readme.text().lines().toList();
    for (int i = 1; i < lines.size(); i++) {
      if (Readme.opensOutput(lines.get(i))) {
        assertThat(Readme.marksOutput(lines.get(i - 1))).as("line " + (i + 1)).isTrue();
      }
    }
  }

  @Test
  void itHasAtMostEightCommandLines() throws IOException {
    assertThat(commands()).hasSizeBetween(1, 8);
  }

  @ParameterizedTest
  @MethodSource("commands")
  void aCommandLineEndsWithTheStatusWrittenBelowIt(String line) throws IOException {
    Printed printed = Printed.byLine(line.substring(Readme.COMMAND.length()));
    assertThat(Readme.text()).contains(line + "\n# exit status " + printed.status() + "\n");
  }

  @ParameterizedTest
  @ValueSource(strings = {"shortlist", "check", "materials", "wires", "starter"})
  void everyCommandAndOptionIsNamed(String command) throws IOException {
    assertThat(Readme.text()).contains("`" + command);
    Matcher option = OPTION.matcher(Printed.by(command, "--help").out());
    while (option.find()) {
      assertThat(Readme.text()).contains("`" + option.group());
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"README.md", "DEVELOPERS.md"})
  void linksLeadToFiles(String name) throws IOException {
    Matcher link = LINK.matcher(Files.readString(Path.of(name)));
    while (link.find()) {
      assertThat(Path.of(link.group(1))).exists();
    }
  }

  static Stream<String> commands() throws IOException {
    return Readme.text().lines().filter(line -> line.startsWith(Readme.COMMAND));
  }
}
