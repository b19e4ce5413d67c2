package coilwright.cli;

import coilwright.material.Catalogue;
import coilwright.material.WireSeries;
import coilwright.report.Sizes;
import java.io.IOException;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;

/** Prints the wire sizes by series. */
@Command(
    name = "wires",
    description = "Prints the wire sizes, by series.",
    mixinStandardHelpOptions = true,
    versionProvider = Version.class,
    footer = {"", "Example:", "  coilwright wires metric"})
final class WiresCommand implements Callable<Integer> {

  @Parameters(
      paramLabel = "SERIES",
      arity = "0..*",
      description = "Series to print; all where none is named.")
  private List<String> wanted;

  @Mixin private FormatOptions format;
  @Mixin private ResultOptions result;

  private final Terminal terminal;

  WiresCommand(Terminal terminal) {
    this.terminal = terminal;
  }

  @Override
  public Integer call() throws IOException {
    result.refuseBadTarget();
    Catalogue catalogue = Catalogue.load();
    List<WireSeries> series =
        wanted == null
            ? List.of(WireSeries.values())
            : wanted.stream().map(WiresCommand::known).toList();
    result.deliver(
        format.isJson() ? Sizes.json(catalogue, series) : Sizes.text(catalogue, series), terminal);
    return Status.FOUND;
  }

  private static WireSeries known(String id) {
    return WireSeries.of(id)
        .orElseThrow(
            () ->
                Refusal.usage(
                    "coilwright: no wire series \""
                        + id
                        + "\"; accepted: "
                        + Stream.of(WireSeries.values())
                            .map(WireSeries::id)
                            .collect(Collectors.joining(", "))));
  }
}
