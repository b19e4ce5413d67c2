package coilwright.cli;

import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** The program's root: names the commands. */
@Command(
    name = "coilwright",
    description = {
      "Helical springs from the loads they must carry: every standard wire and material that can do"
          + " the job, ranked, and why the rest cannot."
    },
    mixinStandardHelpOptions = true,
    versionProvider = Version.class,
    footer = {"", "Example:", "  coilwright shortlist problems/check-valve.yaml"})
final class RootCommand implements Runnable {

  @Spec private CommandSpec spec;

  @Override
  public void run() {
    throw new ParameterException(
        spec.commandLine(),
        "a command is missing; accepted: " + String.join(", ", spec.subcommands().keySet()));
  }
}
