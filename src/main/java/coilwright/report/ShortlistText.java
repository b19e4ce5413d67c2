package coilwright.report;

import coilwright.limit.Finding;
import coilwright.material.Wire;
import coilwright.problem.LimitName;
import coilwright.search.Candidate;
import coilwright.source.Evidence;
import coilwright.spring.CompressionState;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;

/** A shortlist as text. */
final class ShortlistText {

  private static final int NEAREST = 5;

  private static final List<Column> COLUMNS =
      List.of(
          column("n", "active_coils"),
          column("nt", "total_coils"),
          column("D", "mean_diameter"),
          column("De", "outside_diameter"),
          column("L0", "free_length"),
          column("Ls", "solid_length"),
          column("index", "spring_index"),
          column("mass", "mass"),
          column("cost", "cost_index"));

  private final Shortlist shortlist;
  private final OutputUnits units;
  private final Lines lines = new Lines();

  /** A number of the spring under a short head. */
  private record Column(String head, Quantity<CompressionState> quantity) {}

  private static Column column(String head, String stem) {
    return new Column(head, CompressionQuantities.of(stem));
  }

  private ShortlistText(Shortlist shortlist, OutputUnits units) {
    this.shortlist = shortlist;
    this.units = units;
  }

  /**
   * Writes a shortlist.
   *
   * @param shortlist what it shows
   * @param units the units shown
   */
  static String of(Shortlist shortlist, OutputUnits units) {
    ShortlistText report = new ShortlistText(shortlist, units);
    report.head();
    if (shortlist.answer().feasible().isEmpty()) {
      report.nothing();
    } else {
      report.list();
    }
    report.ruledOut();
    report.lines.foot(Warnings.of(shortlist));
    return report.lines.text();
  }

  private void head() {
    lines.line(Understood.title(shortlist.problem()));
    lines.line("");
    lines.line("Understood");
    lines.block(Understood.of(shortlist.problem(), shortlist.grades(), units));
    lines.line("");
  }

  private void list() {
    int wires = shortlist.answer().wires();
    int fit = shortlist.answer().feasible().size();
    lines.line(
        fit + " of " + wires + " wires tried can do it, at " + counts() + " in all. " + listed());
    lines.line("");
    TextTable table = new TextTable("rlll" + "r".repeat(COLUMNS.size()) + "rl");
    heads(table);
    for (int i = 0; i < shortlist.shown().size(); i++) {
      row(table, i + 1, shortlist.shown().get(i));
    }
    lines.table(table);
    int hidden = listable() - shortlist.shown().size();
    if (hidden > 0) {
      lines.line("  " + hidden + " more: --top " + listable() + " shows them");
    }
    lines.line("");
    lines.line(
        "  n active and nt total coils, D mean and De outside diameter, L0 free and Ls solid length;");
    lines.line(
        "  cost is a proxy in grams of hard-drawn wire, its indices from memory; margins are shares");
    lines.line("  of the bound." + each());
    lines.line("");
  }

  private void heads(TextTable table) {
    List<String> names = new ArrayList<>(List.of("#", "material", "wire", "ends"));
    List<String> symbols = new ArrayList<>(List.of("", "", "", ""));
    for (Column column : COLUMNS) {
      names.add(column.head());
      symbols.add(units.symbol(column.quantity().dimension()));
    }
    names.addAll(List.of("stress", "limited by"));
    symbols.addAll(List.of("margin", ""));
    table.row(names.toArray(String[]::new)).row(symbols.toArray(String[]::new));
  }

  private String each() {
    int parallel = shortlist.problem().facts().springsInParallel();
    return parallel > 1 ? " Every figure is for one of the " + parallel + " springs." : "";
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
    return switch (shortlist.problem().rankBy()) {
      case MASS -> "lightest first";
      case MARGIN -> "greatest stress margin first";
      case COST -> "lowest cost proxy first";
      case ROBUST -> "greatest margin of the limiting check first";
    };
  }

  private void row(TextTable table, int rank, Candidate<CompressionState> candidate) {
    Wire wire = candidate.state().wire();
    String memory = wire.evidence() == Evidence.MEMORY ? " (memory)" : "";
    List<String> cells = new ArrayList<>();
    cells.add(Integer.toString(rank));
    cells.add(wire.grade().id() + memory);
    cells.add(Wires.sizeWithDiameter(wire, units));
    cells.add(candidate.state().endForm());
    for (Column column : COLUMNS) {
      cells.add(column.quantity().text(candidate.state(), units));
    }
    OptionalDouble margin = candidate.leastMargin();
    cells.add(margin.isPresent() ? Numbers.margin(margin.getAsDouble()) : "-");
    cells.add(candidate.limiting().map(ShortlistText::limiting).orElse("-"));
    table.row(cells.toArray(String[]::new));
  }

  private static String limiting(Finding finding) {
    return finding.check().limit().text() + " " + Numbers.margin(finding.margin());
  }

  private void nothing() {
    int wires = shortlist.answer().wires();
    lines.line(
        wires == 0
            ? "There is no wire to try: the grades have no data for the sizes offered."
            : "None of the " + wires + (wires == 1 ? " wire" : " wires") + " tried can do it.");
    lines.line("");
    List<WayOut> nearest = nearest();
    if (nearest.isEmpty()) {
      return;
    }
    lines.line("Nearest, and what would have to change");
    for (WayOut way : nearest) {
      lines.line("  " + Reasons.of(way.conflict()));
      lines.line("    " + way.text(units));
    }
    lines.line("");
  }

  /** The nearest wire of each material, nearest first. */
  private List<WayOut> nearest() {
    Map<String, WayOut> byMaterial = new LinkedHashMap<>();
    WayOut.nearestFirst(shortlist.problem(), shortlist.answer().conflicts())
        .forEach(way -> byMaterial.putIfAbsent(way.conflict().wire().grade().id(), way));
    return byMaterial.values().stream().limit(NEAREST).toList();
  }

  private void ruledOut() {
    Map<LimitName, Integer> counts = shortlist.answer().ruledOut();
    if (counts.isEmpty()) {
      return;
    }
    lines.line(
        "What rules wires out, by how many (each under every limit that alone keeps it out,");
    lines.line("or else under the limits that cannot hold together)");
    TextTable table = new TextTable("rl");
    counts.entrySet().stream()
        .sorted(Map.Entry.<LimitName, Integer>comparingByValue().reversed())
        .forEach(entry -> table.row(Integer.toString(entry.getValue()), entry.getKey().text()));
    lines.table(table);
    lines.line("");
  }
}
