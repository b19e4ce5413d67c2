package coilwright.report;

import coilwright.limit.Finding;
import coilwright.limit.Side;
import coilwright.rank.Cost;
import coilwright.search.Candidate;
import coilwright.spring.CompressionState;
import coilwright.spring.LoadState;
import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.List;

/** A checked spring as text: every quantity and every check. */
final class CheckedText {

  private final Checked checked;
  private final OutputUnits units;
  private final Lines lines = new Lines();

  private CheckedText(Checked checked, OutputUnits units) {
    this.checked = checked;
    this.units = units;
  }

  /**
   * Writes a check.
   *
   * @param checked what it shows
   * @param units the units shown
   */
  static String of(Checked checked, OutputUnits units) {
    CheckedText report = new CheckedText(checked, units);
    report.head();
    if (checked.check().spring().isPresent()) {
      report.spring(checked.check().spring().get());
    }
    report.checks(report.findings());
    checked.check().spring().ifPresent(spring -> report.cost(Cost.of(spring.state())));
    report.lines.foot(Warnings.of(checked));
    return report.lines.text();
  }

  private List<Finding> findings() {
    return checked
        .check()
        .spring()
        .map(Candidate::findings)
        .orElseGet(() -> List.of(checked.check().outOfRange().orElseThrow()));
  }

  private void head() {
    lines.line(Understood.title(checked.problem()));
    lines.line(verdict());
    lines.line("");
    lines.line("Understood");
    lines.block(Understood.of(checked.problem(), List.of(checked.check().grade()), units));
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

  private void spring(Candidate<CompressionState> candidate) {
    CompressionState state = candidate.state();
    lines.line(
        "The spring: "
            + Wires.text(state.wire())
            + ", "
            + state.endForm()
            + " ends, data "
            + state.wire().evidence().word());
    TextTable table = new TextTable("lrl");
    for (Quantity<CompressionState> quantity : CompressionQuantities.SPRING) {
      row(table, quantity, state);
    }
    row(table, CompressionQuantities.OUTSIDE_DIAMETER_AT_SOLID, state);
    if (Double.isInfinite(state.criticalDeflection())) {
      table.row(CompressionQuantities.CRITICAL_DEFLECTION.label(), "none", "cannot buckle");
    } else {
      row(table, CompressionQuantities.CRITICAL_DEFLECTION, state);
    }
    lines.table(table);
    lines.line("");
    loads(state);
  }

  private void row(TextTable table, Quantity<CompressionState> quantity, CompressionState state) {
    table.row(quantity.label(), quantity.text(state, units), units.symbol(quantity.dimension()));
  }

  private void loads(CompressionState state) {
    lines.line("Its loads");
    TextTable table = new TextTable("lrrrrr");
    List<String> head = new ArrayList<>(List.of(""));
    for (Quantity<LoadState> quantity : CompressionQuantities.LOAD) {
      head.add(quantity.label() + " " + units.symbol(quantity.dimension()));
    }
    table.row(head.toArray(String[]::new));
    for (int i = 0; i < state.loads().size(); i++) {
      table.row(cells("load " + (i + 1), state.loads().get(i)));
    }
    state.overtravel().ifPresent(load -> table.row(cells("overtravel", load)));
    table.row(cells("solid", state.solid()));
    lines.table(table);
    lines.line("");
  }

  private String[] cells(String name, LoadState load) {
    List<String> cells = new ArrayList<>(List.of(name));
    for (Quantity<LoadState> quantity : CompressionQuantities.LOAD) {
      cells.add(quantity.text(load, units));
    }
    return cells.toArray(String[]::new);
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
