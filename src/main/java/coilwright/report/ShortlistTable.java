package coilwright.report;

import coilwright.limit.Finding;
import coilwright.material.Wire;
import coilwright.rank.Alike;
import coilwright.rank.Line;
import coilwright.rank.Ranked;
import coilwright.rank.Varied;
import coilwright.search.Candidate;
import coilwright.spring.State;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * The list of a shortlist's text: springs that are alike in one line, and no material in most of
 * the first lines. A list of every coil count keeps every spring in its place.
 *
 * @param <S> the state of the kind of spring
 */
final class ShortlistTable<S extends State> {

  private final Shortlist<S> shortlist;
  private final OutputUnits units;
  private final List<Sheet.Column<S>> columns;
  private final Varied<S> varied;
  private final List<Line<S>> shown;

  ShortlistTable(Shortlist<S> shortlist, OutputUnits units) {
    this.shortlist = shortlist;
    this.units = units;
    this.columns = shortlist.sheet().columns(shortlist.problem());
    List<Ranked<S>> ranked = Ranked.of(shortlist.ranked());
    this.varied =
        shortlist.everyCount()
            ? new Varied<>(alone(ranked), List.of())
            : Varied.of(Alike.lines(ranked, shortlist.catalogue()::equivalent));
    this.shown = varied.lines().subList(0, Math.min(shortlist.most(), varied.lines().size()));
  }

  private static <S extends State> List<Line<S>> alone(List<Ranked<S>> ranked) {
    List<Line<S>> lines = new ArrayList<>(ranked.size());
    for (Ranked<S> spring : ranked) {
      lines.add(new Line<>(spring, List.of()));
    }
    return lines;
  }

  /** Every spring in the lines shown, by rank. */
  List<Ranked<S>> shown() {
    List<Ranked<S>> springs = new ArrayList<>();
    for (Line<S> line : shown) {
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
    for (Line<S> line : shown) {
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
    lines.line("  " + shortlist.sheet().legend());
    lines.line(
        "  cost is a proxy in grams of hard-drawn wire, its indices from memory; margins are shares");
    lines.line("  of the bound." + shortlist.sheet().remark(shortlist.problem()) + each());
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
    for (Sheet.Column<S> column : columns) {
      names.add(column.head());
      symbols.add(units.symbol(column.quantity().dimension()));
    }
    names.addAll(List.of("stress", "limited by"));
    symbols.addAll(List.of("margin", ""));
    table.row(names.toArray(String[]::new)).row(symbols.toArray(String[]::new));
  }

  private void row(TextTable table, Ranked<S> spring) {
    Candidate<S> candidate = spring.candidate();
    Wire wire = candidate.state().wire();
    List<String> cells = new ArrayList<>();
    cells.add(Integer.toString(spring.rank()));
    cells.add(Wires.markedGrade(wire));
    cells.add(Wires.sizeWithDiameter(wire, units));
    cells.add(candidate.state().endForm());
    for (Sheet.Column<S> column : columns) {
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
  private void also(TextTable table, Line<S> line) {
    List<String> others = new ArrayList<>();
    for (Ranked<S> other : line.also()) {
      others.add(other(line.lead().candidate().state(), other));
    }
    if (!others.isEmpty()) {
      table.words("     also: " + String.join("; ", others));
    }
  }

  private String other(S lead, Ranked<S> other) {
    S state = other.candidate().state();
    List<String> words = new ArrayList<>();
    words.add("#" + other.rank() + " " + Wires.markedGrade(state.wire()));
    words.add(Wires.sizeWithDiameter(state.wire(), units));
    if (state.coils() != lead.coils()) {
      words.add(columns.get(0).head() + " " + columns.get(0).quantity().text(state, units));
    }
    Quantity<S> mass = SpringFields.mass();
    words.add("mass " + mass.text(state, units) + " " + units.symbol(mass.dimension()));
    words.add("cost " + SpringFields.<S>cost().text(state, units));
    return String.join(", ", words);
  }

  /** Says why ranks jump, where they do. */
  private void heldBack(Lines lines) {
    int last = 0;
    for (Line<S> line : shown) {
      last = Math.max(last, line.lead().rank());
    }
    List<String> ranks = new ArrayList<>();
    for (Line<S> line : varied.heldBack()) {
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
