package coilwright.cli;

import coilwright.material.Catalogue;
import coilwright.problem.UnitSystem;
import coilwright.report.Grades;
import coilwright.unit.Spelling;
import java.io.IOException;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;

/** Prints the wire grades with their properties and sources. */
@Command(
    name = "materials",
    description = "Prints the wire grades: standard, condition, strength, moduli, sources.",
    mixinStandardHelpOptions = true,
    versionProvider = Version.class,
    footer = {"", "Example:", "  coilwright materials music-wire"})
final class MaterialsCommand implements Callable<Integer> {

  @Parameters(
      paramLabel = "ID",
      arity = "0..*",
      description = "Grades to print in every size; all where none is named, text in some sizes.")
  private List<String> wanted;

  @Mixin private FormatOptions format;
  @Mixin private ResultOptions result;

  private final Terminal terminal;

  MaterialsCommand(Terminal terminal) {
    this.terminal = terminal;
  }

  @Override
  public Integer call() throws IOException {
    result.refuseBadTarget();
    Catalogue catalogue = Catalogue.load();
    List<String> ids = wanted == null ? catalogue.gradeIds() : known(catalogue.gradeIds());
    result.deliver(
        format.of(new Grades(catalogue, ids, wanted != null), UnitSystem.METRIC), terminal);
    return Status.FOUND;
  }

  private List<String> known(List<String> all) {
    for (String id : wanted) {
      if (!all.contains(id)) {
        throw Refusal.usage(
            "coilwright materials: ID: \""
                + PlainText.line(id)
                + "\"; accepted: "
                + String.join(", ", all)
                + WordConverter.didYouMean(Spelling.nearest(id, all)));
      }
    }
    return wanted.stream().distinct().toList();
  }
}
