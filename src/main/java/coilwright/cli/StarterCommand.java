package coilwright.cli;

import coilwright.problem.Starter;
import java.io.IOException;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;

/** Prints a commented problem file to start from. */
@Command(
    name = "starter",
    description = "Prints a commented problem file to start from.",
    mixinStandardHelpOptions = true,
    versionProvider = Version.class,
    footer = {"", "Example:", "  coilwright starter compression --out valve.yaml"})
final class StarterCommand implements Callable<Integer> {

  @Parameters(paramLabel = "KIND", description = "Kind of spring: compression.")
  private String kind;

  @Mixin private ResultOptions result;

  private final Terminal terminal;

  StarterCommand(Terminal terminal) {
    this.terminal = terminal;
  }

  @Override
  public Integer call() throws IOException {
    result.refuseBadTarget();
    result.deliver(text(), terminal);
    return Status.FOUND;
  }

  private String text() {
    return switch (kind) {
      case "compression" -> Starter.compression();
      case "extension", "torsion" ->
          throw Refusal.usage(
              "coilwright: " + kind + " is not available yet; accepted: compression");
      default -> throw Refusal.usage("coilwright: no kind \"" + kind + "\"; accepted: compression");
    };
  }
}
