package coilwright.cli;

import coilwright.material.Catalogue;
import coilwright.material.WireSeries;
import coilwright.problem.UnitSystem;
import coilwright.report.Sizes;
import java.io.IOException;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.TypeConversionException;

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
    List<WireSeries> series = wanted == null ? List.of(WireSeries.values()) : known();
    result.deliver(format.of(new Sizes(catalogue, series), UnitSystem.METRIC), terminal);
    return Status.FOUND;
  }

  private List<WireSeries> known() {
    try {
      return wanted.stream().map(new SeriesConverter()::convert).distinct().toList();
    } catch (TypeConversionException e) {
      throw Refusal.usage("coilwright wires: SERIES: " + PlainText.line(e.getMessage()));
    }
  }
}
