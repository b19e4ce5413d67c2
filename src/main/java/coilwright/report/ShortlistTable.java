package coilwright.report;

import coilwright.limit.Finding;
import coilwright.material.Wire;
import coilwright.problem.Problem;
import coilwright.rank.Alike;
import coilwright.rank.Line;
import coilwright.rank.Ranked;
import coilwright.rank.Varied;
import coilwright.search.Candidate;
import coilwright.spring.CompressionState;
import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * The list of a shortlist's text: springs that are alike in one line, and no material in most of
 * the first lines. A list of every coil count keeps every spring in its place.
 */
final class ShortlistTable {

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

  private static final String FOUND =
      " L1 and on are the lengths found, in the order of the loads.";
  private static final int AFTER_FREE_LENGTH = 5;

  private final Shortlist shortlist;
  private final OutputUnits units;
  private final List<Column> columns;
  private final Varied<CompressionState> varied;
  private final List<Line<CompressionState>> shown;

  /** A number of the spring under a short head. */
  private record Column(String head, Quantity<CompressionState> quantity) {}

  private static Column column(String head, String stem) {
    return new Column(head, CompressionQuantities.of(stem));
  }

  ShortlistTable(Shortlist shortlist, OutputUnits units) {
    this.shortlist = shortlist;
    this.units = units;
    this.columns = new ArrayList<>(COLUMNS);
    this.columns.addAll(AFTER_FREE_LENGTH, lengthsFound(shortlist.problem()));
    List<Ranked<CompressionState>> ranked = Ranked.of(shortlist.ranked());
    this.varied =
        shortlist.everyCount()
            ? new Varied<>(alone(ranked), List.of())
            : Varied.of(Alike.lines(ranked, shortlist.catalogue()::equivalent));
    this.shown = varied.lines().subList(0, Math.min(shortlist.most(), varied.lines().size()));
  }

  /** The loaded lengths, where they are part of the answer. */
  private static List<Column> lengthsFound(Problem problem) {
    List<Column> lengths = new ArrayList<>();
    if (problem.required().orElseThrow().freeLength().isEmpty()) {
      for (int i = 0; i < problem.facts().loads().size(); i++) {
        lengths.add(lengthAt(i));
      }
    }
    return lengths;
  }

  private static Column lengthAt(int load) {
    String head = "L" + (load + 1);
    return new Column(
        head, new Quantity<>(head, head, Dimension.LENGTH, 2, s -> s.loads().get(load).length()));
  }

  private static List<Line<CompressionState>> alone(List<Ranked<CompressionState>> ranked) {
    List<Line<CompressionState>> lines = new ArrayList<>(ranked.size());
    for (Ranked<CompressionState> spring : ranked) {
      lines.add(new Line<>(spring, List.of()));
    }
    return lines;
  }

  /** Every spring in the lines shown, by rank. */
  List<Ranked<CompressionState>> shown() {
    List<Ranked<CompressionState>> springs = new ArrayList<>();
    for (Line<CompressionState> line : shown) {
      springs.add(line.lead());
      springs.addAll(line.also());
    }
    springs.sort((a, b) -> Integer.compare(a.rank(), b.rank()));
    return springs;
  }

  /** Adds the list and what explains it. */
  void addTo(Lines lines) {
    lines.line(count() + listed());
    lines.line("");
    TextTable table = new TextTable("rlll" + "r".repeat(columns.size()) + "rl");
    heads(table);
    for (Line<CompressionState> line : shown) {
      row(table, line.lead());
      also(table, line);
    }
    lines.table(table);
    heldBack(lines);
    int hidden = varied.lines().size() - shown.size();
    if (hidden > 0) {
      lines.line("  " + hidden + " more: --top " + varied.lines().size() + " shows them");
    }
    lines.line("");
    lines.line(
        "  n active and nt total coils, D mean and De outside diameter, L0 free and Ls solid length;");
    lines.line(
        "  cost is a proxy in grams of hard-drawn wire, its indices from memory; margins are shares");
    lines.line("  of the bound." + (columns.size() > COLUMNS.size() ? FOUND : "") + each());
    lines.line("");
  }

  private String count() {
    int counts = shortlist.answer().candidates();
    return shortlist.answer().feasible().size()
        + " of "
        + shortlist.answer().wires()
        + " wires tried can do it, at "
        + counts
        + (counts == 1 ? " coil count" : " coil counts")
        + " in all. ";
  }

  private String listed() {
    boolean grouped = varied.lines().size() < shortlist.ranked().size();
    return (shortlist.everyCount() ? "Every coil count" : "The best of each wire")
        + ", "
        + order()
        + (grouped ? ", those alike in one line:" : ":");
  }

  private String order() {
    return switch (shortlist.problem().rankBy()) {
      case MASS -> "lightest first";
      case MARGIN -> "greatest stress margin first";
      case COST -> "lowest cost proxy first";
      case ROBUST -> "greatest margin of the limiting check first";
    };
  }

  private void heads(TextTable table) {
    List<String> names = new ArrayList<>(List.of("#", "material", "wire", "ends"));
    List<String> symbols = new ArrayList<>(List.of("", "", "", ""));
    for (Column column : columns) {
      names.add(column.head());
      symbols.add(units.symbol(column.quantity().dimension()));
    }
    names.addAll(List.of("stress", "limited by"));
    symbols.addAll(List.of("margin", ""));
    table.row(names.toArray(String[]::new)).row(symbols.toArray(String[]::new));
  }

  private void row(TextTable table, Ranked<CompressionState> spring) {
    Candidate<CompressionState> candidate = spring.candidate();
    Wire wire = candidate.state().wire();
    List<String> cells = new ArrayList<>();
    cells.add(Integer.toString(spring.rank()));
    cells.add(Wires.markedGrade(wire));
    cells.add(Wires.sizeWithDiameter(wire, units));
    cells.add(candidate.state().endForm());
    for (Column column : columns) {
      cells.add(column.quantity().text(candidate.state(), units));
    }
    OptionalDouble margin = candidate.leastMargin();
    cells.add(margin.isPresent() ? Numbers.margin(margin.getAsDouble()) : "-");
    cells.add(candidate.limiting().map(ShortlistTable::limiting).orElse("-"));
    table.row(cells.toArray(String[]::new));
  }

  private static String limiting(Finding finding) {
    return finding.check().limit().text() + " " + Numbers.margin(finding.margin());
  }

  /** "also: #2 music-wire, 1.25 mm, n 9.50, mass 3.474 g, cost 12.56". */
  private void also(TextTable table, Line<CompressionState> line) {
    List<String> others = new ArrayList<>();
    for (Ranked<CompressionState> other : line.also()) {
      others.add(other(line.lead().candidate().state(), other));
    }
    if (!others.isEmpty()) {
      table.words("     also: " + String.join("; ", others));
    }
  }

  private String other(CompressionState lead, Ranked<CompressionState> other) {
    CompressionState state = other.candidate().state();
    List<String> words = new ArrayList<>();
    words.add("#" + other.rank() + " " + Wires.markedGrade(state.wire()));
    words.add(Wires.sizeWithDiameter(state.wire(), units));
    if (state.coils() != lead.coils()) {
      words.add("n " + CompressionQuantities.of("active_coils").text(state, units));
    }
    Quantity<CompressionState> mass = CompressionQuantities.of("mass");
    words.add("mass " + mass.text(state, units) + " " + units.symbol(mass.dimension()));
    words.add("cost " + CompressionQuantities.of("cost_index").text(state, units));
    return String.join(", ", words);
  }

  /** Says why ranks jump, where they do. */
  private void heldBack(Lines lines) {
    int last = 0;
    for (Line<CompressionState> line : shown) {
      last = Math.max(last, line.lead().rank());
    }
    List<String> ranks = new ArrayList<>();
    for (Line<CompressionState> line : varied.heldBack()) {
      if (line.lead().rank() < last) {
        ranks.add("#" + line.lead().rank());
      }
    }
    if (!ranks.isEmpty()) {
      lines.line(
          "  "
              + String.join(", ", ranks)
              + (ranks.size() == 1 ? " stands" : " stand")
              + " behind the first ten: no material has more than half of them while others fit");
    }
  }

  private String each() {
    int parallel = shortlist.problem().facts().springsInParallel();
    return parallel > 1 ? " Every figure is for one of the " + parallel + " springs." : "";
  }
}
