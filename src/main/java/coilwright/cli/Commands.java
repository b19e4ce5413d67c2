package coilwright.cli;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.Supplier;
import picocli.CommandLine;

/**
 * The commands by name. Building the model of a command takes time that a short run would notice,
 * so a run builds only the one it names; help and mistakes need them all.
 */
final class Commands {

  private final Map<String, Supplier<Object>> byName = new LinkedHashMap<>();

  Commands(Terminal terminal) {
    byName.put("shortlist", () -> new ShortlistCommand(terminal));
    byName.put("check", () -> new CheckCommand(terminal));
    byName.put("materials", () -> new MaterialsCommand(terminal));
    byName.put("wires", () -> new WiresCommand(terminal));
    byName.put("starter", () -> new StarterCommand(terminal));
  }

  /** Adds the command that the arguments begin with, or all of them. */
  void addTo(CommandLine root, String... args) {
    if (args.length > 0 && byName.containsKey(args[0])) {
      root.addSubcommand(args[0], byName.get(args[0]).get());
    } else {
      byName.forEach((name, command) -> root.addSubcommand(name, command.get()));
    }
  }
}
