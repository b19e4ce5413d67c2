package coilwright.report;

import coilwright.limit.Finding;
import coilwright.limit.Side;
import coilwright.rank.Cost;
import coilwright.search.Candidate;
import coilwright.spring.State;
import coilwright.unit.Dimension;
import java.util.List;

/**
 * A checked spring as text: every quantity and every check.
 *
 * @param <S> the state of the kind of spring
 */
final class CheckedText<S extends State> {

  private final Checked<S> checked;
  private final OutputUnits units;
  private final Lines lines = new Lines();

  /**
   * Prepares a check.
   *
   * @param checked what it shows
   * @param units the units shown
   */
  CheckedText(Checked<S> checked, OutputUnits units) {
    this.checked = checked;
    this.units = units;
  }

  /** The text. */
  String text() {
    head();
    if (checked.check().spring().isPresent()) {
      spring(checked.check().spring().get().state());
    }
    checks(findings());
    checked.check().spring().ifPresent(spring -> cost(Cost.of(spring.state())));
    lines.foot(Warnings.of(checked));
    return lines.text();
  }

  private List<Finding> findings() {
    return checked
        .check()
        .spring()
        .map(Candidate::findings)
        .orElseGet(() -> List.of(checked.check().outOfRange().orElseThrow()));
  }

  private void head() {
    lines.line(Understood.title(checked.sheet(), checked.problem()));
    lines.line(verdict());
    lines.line("");
    lines.line("Understood");
    lines.block(
        Understood.of(checked.sheet(), checked.problem(), List.of(checked.check().grade()), units));
    lines.line("");
  }

  private String verdict() {
    List<String> failing =
        findings().stream()
            .filter(finding -> !finding.holds())
            .map(finding -> finding.check().limit().text())
            .distinct()
            .toList();
    return failing.isEmpty()
        ? "The spring holds every limit."
        : "The spring fails: " + String.join(", ", failing) + ".";
  }

  private void spring(S state) {
    lines.line(
        "The spring: "
            + Wires.text(state.wire())
            + ", "
            + checked.sheet().ends(state.endForm())
            + ", data "
            + state.wire().evidence().word());
    TextTable table = new TextTable("lrl");
    checked.sheet().addSpring(table, state, units);
    lines.table(table);
    lines.line("");
    lines.line("Its loads");
    lines.table(checked.sheet().loads(state, units));
    lines.line("");
  }

  private void checks(List<Finding> findings) {
    lines.line("Every check");
    List<String> sources =
        findings.stream().map(finding -> finding.source().text()).distinct().toList();
    TextTable table = new TextTable("llrlrlrrl");
    table.row("", "limit", "value", "", "bound", "unit", "margin", "source", "what is judged");
    for (Finding finding : findings) {
      table.row(
          finding.holds() ? "ok" : "FAILS",
          finding.check().limit().text(),
          number(finding, finding.value()),
          !finding.canFail() ? "" : finding.check().side() == Side.MAX ? "<=" : ">=",
          number(finding, finding.bound()),
          finding.canFail() ? units.symbol(finding.check().dimension()) : "",
          finding.hasMargin() ? Numbers.margin(finding.margin()) : "-",
          "[" + (sources.indexOf(finding.source().text()) + 1) + "]",
          finding.check().definition());
    }
    lines.table(table);
    for (int i = 0; i < sources.size(); i++) {
      lines.line("  [" + (i + 1) + "] " + sources.get(i));
    }
    lines.line("");
  }

  private String number(Finding finding, double value) {
    Dimension dimension = finding.check().dimension();
    return units.fixed(dimension, value, dimension == Dimension.STRESS ? 1 : 2);
  }

  private void cost(Cost cost) {
    int parallel = checked.problem().facts().springsInParallel();
    if (parallel > 1) {
      lines.line("Every figure is for one of the " + parallel + " springs.");
      lines.line("");
    }
    lines.line("Cost proxy, in grams of hard-drawn wire (common practice, no source; not a price)");
    TextTable table = new TextTable("lr");
    for (Cost.Term term : cost.terms()) {
      table.row(term.name(), Numbers.fixed(term.value(), 2));
    }
    table.row("total", Numbers.fixed(cost.total(), 2));
    lines.table(table);
    lines.line("");
  }
}
