package coilwright.cli;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import picocli.CommandLine;
import picocli.CommandLine.Help.Ansi;
import picocli.CommandLine.Model.ArgSpec;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.Model.PositionalParamSpec;

/** The manual page of one command, in the man macros of roff, from picocli's model of it. */
final class ManPage {

  private final CommandLine line;
  private final CommandSpec command;
  private final StringBuilder page = new StringBuilder();

  ManPage(CommandLine line) {
    this.line = line;
    this.command = line.getCommandSpec();
  }

  /** The page, ended by a line feed. */
  String text() {
    String name = command.qualifiedName("-");
    String purpose = String.join(" ", command.usageMessage().description());
    macro("TH " + quoted(name.toUpperCase(Locale.ROOT)) + " 1 \"\" \"coilwright\" \"\"");
    section("NAME");
    text(name + " - " + purpose.replaceFirst("[.]$", ""));
    section("SYNOPSIS");
    text(line.getHelp().synopsis(0).replaceAll("\\s+", " ").strip());
    section("DESCRIPTION");
    text(purpose);
    arguments();
    options();
    subcommands();
    footer();
    seeAlso();
    return page.toString();
  }

  private void arguments() {
    List<PositionalParamSpec> all = command.positionalParameters();
    if (!all.isEmpty()) {
      section("ARGUMENTS");
      all.forEach(argument -> item(argument.paramLabel(), argument));
    }
  }

  private void options() {
    section("OPTIONS");
    for (OptionSpec option : command.options()) {
      String value = option.arity().max() > 0 ? "=" + option.paramLabel() : "";
      item(String.join(", ", option.names()) + value, option);
    }
  }

  private void item(String tag, ArgSpec argument) {
    macro("TP");
    macro("B " + quoted(tag));
    text(Ansi.OFF.string(String.join(" ", argument.description())));
  }

  private void subcommands() {
    if (!command.subcommands().isEmpty()) {
      section("COMMANDS");
    }
    for (Map.Entry<String, CommandLine> sub : command.subcommands().entrySet()) {
      macro("TP");
      macro("B " + quoted(sub.getKey()));
      text(String.join(" ", sub.getValue().getCommandSpec().usageMessage().description()));
    }
  }

  /** The footer of the help: what the statuses mean, then examples, indented. */
  private void footer() {
    for (String part : command.usageMessage().footer()) {
      if (part.startsWith("Exit status: ")) {
        section("EXIT STATUS");
        text(part.substring("Exit status: ".length()));
      } else if (part.equals("Example:")) {
        section("EXAMPLES");
      } else if (part.startsWith("  ")) {
        macro("PP");
        macro("B " + quoted(part.strip()));
      }
    }
  }

  private void seeAlso() {
    section("SEE ALSO");
    CommandSpec root = command.root();
    String others =
        String.join(
            ", ",
            root.subcommands().keySet().stream().map(sub -> "coilwright-" + sub + "(1)").toList());
    text("coilwright(1), " + others);
  }

  private void section(String title) {
    macro("SH " + quoted(title));
  }

  private void macro(String words) {
    page.append('.').append(words).append('\n');
  }

  private void text(String words) {
    String plain = escaped(words);
    boolean steers = plain.startsWith(".") || plain.startsWith("'");
    page.append(steers ? "\\&" : "").append(plain).append('\n');
  }

  private static String quoted(String words) {
    return '"' + escaped(words).replace("\"", "\\(dq") + '"';
  }

  private static String escaped(String words) {
    return words.replace("\\", "\\e").replace("-", "\\-");
  }
}
