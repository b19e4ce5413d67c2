package coilwright.cli;

import coilwright.material.Catalogue;
import coilwright.material.WireSeries;
import coilwright.spring.Kind;
import java.io.File;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import picocli.AutoComplete;
import picocli.CommandLine;
import picocli.CommandLine.Model.ArgSpec;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.ITypeInfo;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.Model.PositionalParamSpec;

/** Writes what a shell needs to know of the commands: completion for bash, and manual pages. */
public final class ShellFiles {

  private static final ITypeInfo FILE =
      OptionSpec.builder("--file").type(File.class).build().typeInfo();

  private ShellFiles() {}

  /**
   * Writes the files.
   *
   * @param args the folder they go to
   * @throws IOException if one cannot be written
   */
  public static void main(String[] args) throws IOException {
    for (Map.Entry<String, String> file : all().entrySet()) {
      Path path = Path.of(args[0]).resolve(file.getKey());
      Files.createDirectories(path.getParent());
      Files.writeString(path, file.getValue());
    }
  }

  /** The text of each file by its name, folders with a slash. */
  public static Map<String, String> all() {
    Map<String, String> files = new LinkedHashMap<>();
    CommandLine root = commands();
    files.put("man/coilwright.1", new ManPage(root).text());
    root.getSubcommands()
        .forEach(
            (name, sub) -> files.put("man/coilwright-" + name + ".1", new ManPage(sub).text()));
    files.put("completion/coilwright", completion());
    return files;
  }

  /** The program's commands, none of which is run. */
  static CommandLine commands() {
    OutputStream nowhere = OutputStream.nullOutputStream();
    Terminal terminal = new Terminal(InputStream.nullInputStream(), nowhere, nowhere);
    CommandLine root = new CommandLine(new RootCommand());
    new Commands(terminal).addTo(root);
    return root;
  }

  private static String completion() {
    CommandLine root = commands();
    root.getSubcommands().values().forEach(command -> complete(command.getCommandSpec()));
    return AutoComplete.bash("coilwright", root);
  }

  /** Tells picocli what to offer: it knows the types of values, which are not the words typed. */
  private static void complete(CommandSpec command) {
    for (ArgSpec argument : new ArrayList<>(command.args())) {
      List<String> words = words(argument);
      ITypeInfo type = argument.paramLabel().equals("FILE") ? FILE : argument.typeInfo();
      List<String> offered = words.isEmpty() ? null : words;
      if (argument instanceof OptionSpec option && option.arity().max() > 0) {
        command.remove(option);
        command.addOption(
            OptionSpec.builder(option).typeInfo(type).completionCandidates(offered).build());
      } else if (argument instanceof PositionalParamSpec given) {
        command.remove(given);
        command.addPositional(
            PositionalParamSpec.builder(given)
                .typeInfo(type)
                .completionCandidates(offered)
                .build());
      }
    }
  }

  /** The words that may stand for a label; none where any text may, as for a number or a file. */
  private static List<String> words(ArgSpec argument) {
    String label = argument.paramLabel();
    return switch (label) {
      case "FILE", "N" -> List.of();
      case "ID" -> Catalogue.load().gradeIds();
      case "SERIES" -> Stream.of(WireSeries.values()).map(WireSeries::id).toList();
      case "KIND" -> kinds();
      default -> List.of(label.split("\\|"));
    };
  }

  private static List<String> kinds() {
    return Stream.of(Kind.values()).map(Kind::id).toList();
  }
}
