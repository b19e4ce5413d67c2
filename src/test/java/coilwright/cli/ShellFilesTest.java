package coilwright.cli;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.material.Catalogue;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import picocli.CommandLine;
import picocli.CommandLine.Model.ArgSpec;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;

/** Completion and manual pages name every command, option and argument there is. */
class ShellFilesTest {

  private static final Map<String, String> FILES = ShellFiles.all();

  static Stream<CommandSpec> commands() {
    CommandLine root = ShellFiles.commands();
    return Stream.concat(Stream.of(root), root.getSubcommands().values().stream())
        .map(CommandLine::getCommandSpec);
  }

  @Test
  void oneFileACommandAndOneForCompletion() {
    assertThat(FILES.keySet())
        .containsExactly(
            "man/coilwright.1",
            "man/coilwright-shortlist.1",
            "man/coilwright-check.1",
            "man/coilwright-materials.1",
            "man/coilwright-wires.1",
            "man/coilwright-starter.1",
            "completion/coilwright");
  }

  @ParameterizedTest
  @MethodSource("commands")
  void manualPageTellsAllOfACommand(CommandSpec command) {
    String source = FILES.get("man/" + command.qualifiedName("-") + ".1");
    String page = source.replace("\\-", "-");
    assertThat(page).contains("\n" + command.qualifiedName("-") + " - ");
    for (ArgSpec argument : command.args()) {
      assertThat(page).contains(argument.description()[0]);
      assertThat(page).contains(argument.arity().max() > 0 ? argument.paramLabel() : "");
    }
    for (OptionSpec option : command.options()) {
      assertThat(page).contains(option.names());
    }
    command.subcommands().forEach((name, sub) -> assertThat(page).contains("\n.B \"" + name + '"'));
    for (String line : command.usageMessage().footer()) {
      assertThat(page).contains(line.strip().replaceFirst("^(Exit status|Example): ?", ""));
    }
  }

  @ParameterizedTest
  @MethodSource("commands")
  void manualPageIsSoundRoff(CommandSpec command) {
    String source = FILES.get("man/" + command.qualifiedName("-") + ".1");
    assertThat(source).startsWith(".TH ").matches("[ -~\n]*").endsWith("\n");
    assertThat(source.lines())
        .allSatisfy(
            line ->
                assertThat(line)
                    .matches("[.](TH|SH|B) \"[^\"]*\".*|[.](TP|PP)|[^.'\"].*")
                    .doesNotContainPattern("(?<!\\\\)-"));
  }

  @ParameterizedTest
  @MethodSource("commands")
  void completionOffersEveryOption(CommandSpec command) {
    String part = function(command);
    for (OptionSpec option : command.options()) {
      assertThat(part).contains("'" + option.longestName() + "'");
    }
    command.subcommands().keySet().forEach(name -> assertThat(part).contains(name));
  }

  @Test
  void completionOffersTheWordsThatAreTyped() {
    String script = FILES.get("completion/coilwright");
    assertThat(script)
        .contains("(\"mass\" \"margin\" \"cost\" \"robust\") # --rank values", "\"compression\"")
        .contains("\"text\" \"json\"", "\"metric\"")
        .contains(Catalogue.load().gradeIds().stream().map(id -> '"' + id + '"').toList())
        .doesNotContain("\"METRIC\"", "\"MASS\"")
        .contains("\ncomplete -F _complete_coilwright -o default coilwright ");
    List.of("shortlist", "check")
        .forEach(name -> assertThat(function(name)).contains("compgen -f"));
  }

  private static String function(CommandSpec command) {
    return function(command.parent() == null ? "" : command.name());
  }

  private static String function(String command) {
    String script = FILES.get("completion/coilwright");
    String name = "_picocli_coilwright" + (command.isEmpty() ? "" : "_" + command) + "() {";
    int from = script.indexOf("function " + name);
    return script.substring(from, script.indexOf("\n}\n", from));
  }
}
