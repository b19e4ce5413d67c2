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

  /** Read so that others are refused; there is only one yet. */
  @Parameters(
      paramLabel = "KIND",
      converter = KindConverter.class,
      description = "The kind of spring: compression.")
  private String kind;

  @Mixin private ResultOptions result;

  private final Terminal terminal;

  StarterCommand(Terminal terminal) {
    this.terminal = terminal;
  }

  @Override
  public Integer call() throws IOException {
    result.refuseBadTarget();
    result.deliver(Starter.compression(), terminal);
    return Status.FOUND;
  }
}
