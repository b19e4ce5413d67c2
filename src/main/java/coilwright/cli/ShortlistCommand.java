package coilwright.cli;

import coilwright.material.Catalogue;
import coilwright.problem.Problem;
import coilwright.problem.Purpose;
import coilwright.problem.RankBy;
import coilwright.rank.Order;
import coilwright.report.Sheet;
import coilwright.report.Sheets;
import coilwright.report.Shortlist;
import coilwright.search.Answer;
import coilwright.search.Candidate;
import coilwright.search.WireChoice;
import coilwright.spring.State;
import java.io.IOException;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** The main job: every wire that can meet the loads in the space, ranked. */
@Command(
    name = "shortlist",
    description = "Lists every wire and material that can meet the loads in the space, best first.",
    mixinStandardHelpOptions = true,
    versionProvider = Version.class,
    footer = {
      "",
      "Exit status: 0 something was found, 2 wrong usage or file, 3 no spring meets the problem.",
      "",
      "Example:",
      "  coilwright shortlist problems/check-valve.yaml --rank robust --top 5"
    })
final class ShortlistCommand implements Callable<Integer> {

  @Parameters(paramLabel = "FILE", description = "The problem file, or - for standard input.")
  private String file;

  @Mixin private FormatOptions format;
  @Mixin private ResultOptions result;

  @Option(
      names = "--rank",
      paramLabel = "mass|margin|cost|robust",
      converter = RankConverter.class,
      description = "Order of the list, over the file's rank.by.")
  private RankBy rank;

  @Option(
      names = "--top",
      paramLabel = "N",
      converter = CountConverter.class,
      description = "How many springs at most, or lines of text, over the file's rank.top.")
  private Integer top;

  @Option(
      names = "--all",
      description =
          "Every feasible coil count instead of the best of each wire; only --top cuts it.")
  private boolean all;

  private final Terminal terminal;

  ShortlistCommand(Terminal terminal) {
    this.terminal = terminal;
  }

  @Override
  public Integer call() throws IOException {
    ProblemFile input = new ProblemFile(file, terminal);
    result.refuseBadTarget(input);
    Catalogue catalogue = Catalogue.load();
    Problem asked = input.read(Purpose.SHORTLIST, catalogue);
    RankBy by = rank == null ? asked.rankBy() : rank;
    Problem problem = asked.ranked(by, top == null ? asked.top() : top);
    Shortlist<?> shortlist = shortlist(Sheets.of(problem.kind()), problem, catalogue);
    result.deliver(format.of(shortlist, asked.units()), terminal);
    format.remark(shortlist, terminal);
    return shortlist.answer().feasible().isEmpty() ? Status.NOTHING : Status.FOUND;
  }

  private <S extends State> Shortlist<S> shortlist(
      Sheet<S> sheet, Problem problem, Catalogue catalogue) {
    WireChoice choice = WireChoice.of(problem, catalogue);
    Answer<S> answer = sheet.synthesis().search(problem, choice);
    List<Candidate<S>> ranked = Order.ranked(answer, problem.rankBy(), all);
    int most = all && top == null ? ranked.size() : problem.top();
    return new Shortlist<>(sheet, problem, choice, answer, all, ranked, most, catalogue);
  }
}
