package coilwright.report;

import coilwright.problem.LimitName;
import coilwright.spring.State;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * A shortlist as text.
 *
 * @param <S> the state of the kind of spring
 */
final class ShortlistText<S extends State> {

  private static final int NEAREST = 5;

  private final Shortlist<S> shortlist;
  private final OutputUnits units;
  private final Lines lines = new Lines();

  /**
   * Prepares a shortlist.
   *
   * @param shortlist what it shows
   * @param units the units shown
   */
  ShortlistText(Shortlist<S> shortlist, OutputUnits units) {
    this.shortlist = shortlist;
    this.units = units;
  }

  /** The text. */
  String text() {
    head();
    ShortlistTable<S> table = new ShortlistTable<>(shortlist, units);
    if (shortlist.answer().feasible().isEmpty()) {
      nothing();
    } else {
      table.addTo(lines);
    }
    ruledOut();
    lines.foot(Warnings.of(shortlist, table.shown()));
    return lines.text();
  }

  private void head() {
    lines.line(Understood.title(shortlist.sheet(), shortlist.problem()));
    lines.line("");
    lines.line("Understood");
    lines.block(Understood.of(shortlist.sheet(), shortlist.problem(), shortlist.grades(), units));
    lines.line("");
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
      lines.line("  " + Reasons.of(way.conflict(), shortlist.sheet()::ends));
      lines.line("    " + way.text(units));
    }
    lines.line("");
  }

  /** The nearest wire of each material, nearest first. */
  private List<WayOut> nearest() {
    Map<String, WayOut> byMaterial = new LinkedHashMap<>();
    WayOut.nearestFirst(
            shortlist.sheet().synthesis(), shortlist.problem(), shortlist.answer().conflicts())
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
