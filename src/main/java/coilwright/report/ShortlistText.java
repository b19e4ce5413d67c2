package coilwright.report;

import coilwright.limit.Finding;
import coilwright.problem.LimitName;
import coilwright.search.Candidate;
import coilwright.search.Conflict;
import coilwright.source.Evidence;
import coilwright.spring.CompressionSpring;
import coilwright.spring.CompressionState;
import java.util.Comparator;
import java.util.List;
import java.util.Map;

/** A shortlist as text. */
public final class ShortlistText {

  private static final int NEAREST = 5;

  private final Shortlist shortlist;
  private final StringBuilder text = new StringBuilder();

  private ShortlistText(Shortlist shortlist) {
    this.shortlist = shortlist;
  }

  /**
   * Writes a shortlist.
   *
   * @param shortlist what it shows
   * @return the text
   */
  public static String of(Shortlist shortlist) {
    ShortlistText report = new ShortlistText(shortlist);
    report.head();
    if (shortlist.answer().feasible().isEmpty()) {
      report.nothing();
    } else {
      report.list();
    }
    report.ruledOut();
    report.foot();
    return report.text.toString();
  }

  private void head() {
    line(Understood.title(shortlist.problem()));
    line("");
    line("Understood");
    text.append(Understood.of(shortlist.problem(), shortlist.materials()));
    line("");
  }

  private void list() {
    int wires = shortlist.answer().wires();
    int fit = shortlist.answer().feasible().size();
    line(fit + " of " + wires + " wires tried can do it, at " + counts() + " in all. " + listed());
    line("");
    TextTable table = new TextTable("rlllrrrrrrrrrl");
    table.row(
        "#",
        "material",
        "wire",
        "ends",
        "n",
        "D",
        "De",
        "L0",
        "Ls",
        "index",
        "mass",
        "cost",
        "stress",
        "limited by");
    table.row("", "", "", "", "", "mm", "mm", "mm", "mm", "", "g", "", "margin", "");
    for (int i = 0; i < shortlist.shown().size(); i++) {
      row(table, i + 1, shortlist.shown().get(i));
    }
    text.append(table.text("  "));
    int hidden = listable() - shortlist.shown().size();
    if (hidden > 0) {
      line("  " + hidden + " more: --top " + listable() + " shows them");
    }
    line("");
    line(
        "  n active coils, D mean and De outside diameter, L0 free and Ls solid length; cost is a");
    line("  proxy in grams of hard-drawn wire; margins are shares of the bound.");
    line("");
  }

  private String counts() {
    int counts = shortlist.answer().candidates();
    return counts + (counts == 1 ? " coil count" : " coil counts");
  }

  private String listed() {
    return (shortlist.everyCount() ? "Every coil count" : "The best of each wire")
        + ", "
        + order()
        + ":";
  }

  private int listable() {
    return shortlist.everyCount()
        ? shortlist.answer().candidates()
        : shortlist.answer().feasible().size();
  }

  private String order() {
    return switch (shortlist.rankedBy()) {
      case MASS -> "lightest first";
      case MARGIN -> "greatest stress margin first";
      case COST -> "lowest cost proxy first";
      case ROBUST -> "greatest margin of the limiting check first";
    };
  }

  private void row(TextTable table, int rank, Candidate<CompressionState> candidate) {
    CompressionSpring spring = candidate.state().spring();
    boolean memory = spring.wire().evidence() == Evidence.MEMORY;
    table.row(
        Integer.toString(rank),
        spring.wire().grade().id() + (memory ? " (memory)" : ""),
        Wires.sizeWithDiameter(spring.wire()),
        spring.ends().id(),
        Numbers.brief(spring.activeCoils(), 3),
        Numbers.fixed(spring.meanDiameter(), 2),
        Numbers.fixed(spring.outsideDiameter(), 2),
        Numbers.fixed(spring.freeLength(), 1),
        Numbers.fixed(spring.solidLength(), 2),
        Numbers.fixed(spring.springIndex(), 2),
        CompressionQuantities.text("mass", candidate.state()),
        CompressionQuantities.text("cost_index", candidate.state()),
        candidate.leastMargin().isPresent()
            ? Numbers.percent(candidate.leastMargin().getAsDouble(), 1)
            : "-",
        candidate.limiting().map(ShortlistText::limiting).orElse("-"));
  }

  private static String limiting(Finding finding) {
    return finding.check().limit().text() + " " + Numbers.percent(finding.margin(), 1);
  }

  private void nothing() {
    int wires = shortlist.answer().wires();
    line("None of the " + wires + (wires == 1 ? " wire" : " wires") + " tried can do it.");
    line("");
    List<Conflict> nearest =
        shortlist.answer().conflicts().stream()
            .sorted(Comparator.comparingDouble(Nearness::of))
            .limit(NEAREST)
            .toList();
    if (nearest.isEmpty()) {
      return;
    }
    line("Nearest, and what would have to change");
    for (Conflict conflict : nearest) {
      line("  " + Reasons.of(conflict));
      for (String remedy : Remedies.of(shortlist.problem(), conflict)) {
        line("    " + remedy);
      }
    }
    line("");
  }

  private void ruledOut() {
    Map<LimitName, Integer> counts = shortlist.answer().ruledOut();
    if (counts.isEmpty()) {
      return;
    }
    line("What rules wires out, by how many (each under every limit that alone keeps it out,");
    line("or else under the limits that cannot hold together)");
    TextTable table = new TextTable("rl");
    counts.entrySet().stream()
        .sorted(Map.Entry.<LimitName, Integer>comparingByValue().reversed())
        .forEach(entry -> table.row(Integer.toString(entry.getValue()), entry.getKey().text()));
    text.append(table.text("  "));
    line("");
  }

  private void foot() {
    List<String> warnings = Warnings.of(shortlist);
    if (!warnings.isEmpty()) {
      line("Take note");
      warnings.forEach(warning -> line("  " + warning));
      line("");
    }
    Cautions.LINES.forEach(this::line);
  }

  private void line(String words) {
    text.append(words).append('\n');
  }
}
