package coilwright.cli;

import coilwright.material.Catalogue;
import coilwright.problem.Problem;
import coilwright.problem.Purpose;
import coilwright.report.Checked;
import coilwright.report.Sheet;
import coilwright.report.Sheets;
import coilwright.search.SpringCheck;
import coilwright.spring.State;
import java.io.IOException;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;

/** Judges the one spring that a problem file describes. */
@Command(
    name = "check",
    description =
        "Judges the spring in the file's design block against its loads, space and limits.",
    mixinStandardHelpOptions = true,
    versionProvider = Version.class,
    footer = {
      "",
      "Exit status: 0 the spring holds, 2 wrong usage or file, 3 the spring fails a limit.",
      "",
      "Example:",
      "  coilwright check problems/check-valve-offer.yaml --format json"
    })
final class CheckCommand implements Callable<Integer> {

  @Parameters(paramLabel = "FILE", description = "The problem file, or - for standard input.")
  private String file;

  @Mixin private FormatOptions format;
  @Mixin private ResultOptions result;

  private final Terminal terminal;

  CheckCommand(Terminal terminal) {
    this.terminal = terminal;
  }

  @Override
  public Integer call() throws IOException {
    ProblemFile input = new ProblemFile(file, terminal);
    result.refuseBadTarget(input);
    Catalogue catalogue = Catalogue.load();
    Problem problem = input.read(Purpose.CHECK, catalogue);
    Checked<?> checked = check(Sheets.of(problem.kind()), problem, catalogue);
    result.deliver(format.of(checked, problem.units()), terminal);
    format.remark(checked, terminal);
    return checked.check().holds() ? Status.FOUND : Status.NOTHING;
  }

  private static <S extends State> Checked<S> check(
      Sheet<S> sheet, Problem problem, Catalogue catalogue) {
    return new Checked<>(sheet, problem, SpringCheck.of(problem, sheet.synthesis(), catalogue));
  }
}
