package coilwright.cli;

import coilwright.unit.Spelling;
import coilwright.unit.Words;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import picocli.CommandLine.MissingParameterException;
import picocli.CommandLine.Model.ArgSpec;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.OverwrittenOptionException;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.TypeConversionException;
import picocli.CommandLine.UnmatchedArgumentException;

/** A wrong command line in words: place, finding, remedy. */
final class WrongUsage {

  private final CommandSpec command;

  private WrongUsage(CommandSpec command) {
    this.command = command;
  }

  /**
   * What is wrong with a command line.
   *
   * @param problem what the parser found
   * @param args the whole command line
   * @return one line without its end
   */
  static String words(ParameterException problem, String... args) {
    WrongUsage usage = new WrongUsage(problem.getCommandLine().getCommandSpec());
    Optional<String> stray = usage.optionBefore(problem, args);
    if (stray.isPresent()) {
      return usage.noOption(stray.get());
    }
    if (problem instanceof UnmatchedArgumentException unmatched) {
      return usage.tooMuch(unmatched.getUnmatched());
    }
    if (problem instanceof MissingParameterException missing) {
      return missing(missing.getMissing().get(0));
    }
    if (problem instanceof OverwrittenOptionException twice) {
      return place(twice.getOverwritten()) + ": given twice; give it once";
    }
    if (problem.getCause() instanceof TypeConversionException unreadable) {
      return unreadable(problem, unreadable);
    }
    return problem.getMessage();
  }

  /**
   * The unknown option right before a word that could not be read: the word was meant as its value,
   * not as an argument.
   */
  private Optional<String> optionBefore(ParameterException problem, String... args) {
    ArgSpec argument = problem.getArgSpec();
    boolean word = argument != null && argument.isPositional() && problem.getValue() != null;
    int before = word ? List.of(args).indexOf(problem.getValue()) - 1 : -1;
    return Optional.of(before)
        .filter(at -> at >= 0)
        .map(at -> args[at])
        .filter(option -> isOption(option) && !option.equals("--"))
        .filter(option -> command.findOption(option) == null);
  }

  private String tooMuch(List<String> left) {
    String option = left.stream().filter(WrongUsage::isOption).findFirst().orElse("");
    if (!option.isEmpty()) {
      return noOption(option);
    }
    String word = left.get(0);
    Set<String> commands = command.subcommands().keySet();
    if (commands.isEmpty()) {
      return "\"" + word + "\" is one argument too many; give one " + label() + " a run";
    }
    return "no command \""
        + word
        + "\"; accepted: "
        + String.join(", ", commands)
        + WordConverter.didYouMean(Spelling.nearest(word, commands));
  }

  private static boolean isOption(String word) {
    return word.length() > 1 && word.startsWith("-");
  }

  private String noOption(String word) {
    String option = word.replaceFirst("=.*", "");
    if (!command.subcommands().isEmpty() && isOfSomeCommand(option)) {
      return option + ": no option here; put it behind the command and its file";
    }
    List<String> known = command.options().stream().map(OptionSpec::longestName).sorted().toList();
    return option
        + ": no such option; "
        + Spelling.nearest(option, known)
            .map(nearest -> "did you mean " + nearest + "?")
            .orElse("accepted: " + String.join(", ", known));
  }

  private boolean isOfSomeCommand(String option) {
    return command.subcommands().values().stream()
        .anyMatch(line -> line.getCommandSpec().findOption(option) != null);
  }

  private String label() {
    return command.positionalParameters().get(0).paramLabel();
  }

  private static String missing(ArgSpec argument) {
    return argument.isOption()
        ? place(argument) + ": its value is missing; give " + choice(argument.paramLabel())
        : argument.paramLabel() + " is missing; give " + description(argument);
  }

  private static String choice(String label) {
    return Words.either(List.of(label.split("\\|")));
  }

  private static String description(ArgSpec argument) {
    String sentence = argument.description()[0];
    return sentence.substring(0, 1).toLowerCase(Locale.ROOT)
        + sentence.substring(1, sentence.length() - 1);
  }

  private static String unreadable(ParameterException problem, TypeConversionException unreadable) {
    ArgSpec argument = problem.getArgSpec();
    boolean flag = argument.isOption() && argument.arity().max() == 0;
    String finding = flag ? "takes no value; give it alone" : unreadable.getMessage();
    return place(argument) + ": " + finding;
  }

  private static String place(ArgSpec argument) {
    return argument instanceof OptionSpec option ? option.longestName() : argument.paramLabel();
  }
}
