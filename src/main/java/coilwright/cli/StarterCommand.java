package coilwright.cli;

import coilwright.problem.KeyTable;
import coilwright.problem.Starter;
import coilwright.report.SchemaJson;
import coilwright.spring.Kind;
import java.io.IOException;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.MissingParameterException;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Prints a commented problem file to start from, or the schema of problem files. */
@Command(
    name = "starter",
    description = "Prints a commented problem file to start from.",
    mixinStandardHelpOptions = true,
    versionProvider = Version.class,
    footer = {
      "",
      "Example:",
      "  coilwright starter compression --out valve.yaml",
      "  coilwright starter --schema --out coilwright.schema.json"
    })
final class StarterCommand implements Callable<Integer> {

  @Parameters(
      paramLabel = "KIND",
      arity = "0..1",
      converter = KindConverter.class,
      description = "The kind of spring: compression, extension or torsion.")
  private Kind kind;

  @Option(
      names = "--schema",
      description = "Print the JSON Schema of problem files instead, for an editor.")
  private boolean schema;

  @Mixin private ResultOptions result;

  @Spec private CommandSpec spec;

  private final Terminal terminal;

  StarterCommand(Terminal terminal) {
    this.terminal = terminal;
  }

  @Override
  public Integer call() throws IOException {
    if (kind == null && !schema) {
      throw new MissingParameterException(
          spec.commandLine(), spec.positionalParameters().get(0), "KIND is missing");
    }
    result.refuseBadTarget();
    result.deliver(schema ? SchemaJson.of(KeyTable.forms()) : Starter.of(kind), terminal);
    return Status.FOUND;
  }
}
