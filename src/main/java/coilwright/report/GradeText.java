package coilwright.report;

import coilwright.material.DiameterRange;
import coilwright.material.Wire;
import coilwright.material.WireGrade;
import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** A wire grade as text. */
final class GradeText {

  private static final int SIZES_OF_A_SPREAD = 7;

  private final WireGrade grade;
  private final OutputUnits units;

  private GradeText(WireGrade grade, OutputUnits units) {
    this.grade = grade;
    this.units = units;
  }

  /**
   * What it is, the sources, and its properties over its sizes.
   *
   * @param grade the grade
   * @param wires its wires in every size of its usual series
   * @param everySize whether all of them are shown; if not, a spread and a line that says so
   * @param units the units shown
   */
  static String of(WireGrade grade, List<Wire> wires, boolean everySize, OutputUnits units) {
    GradeText text = new GradeText(grade, units);
    List<Wire> shown = everySize ? wires : spread(wires);
    String left =
        shown.size() < wires.size()
            ? "  "
                + shown.size()
                + " of "
                + wires.size()
                + " sizes; name the grade to see them all\n"
            : "";
    return grade.id() + "  " + grade.name() + "\n" + text.facts() + text.properties(shown) + left;
  }

  private String facts() {
    TextTable facts = new TextTable("ll");
    facts.row("standard", grade.standard() + ", " + grade.condition());
    facts.row(
        "supply", grade.supply().word() + (grade.common() ? ", tried when no grade is named" : ""));
    facts.row("class", grade.allowableClass().words());
    facts.row("diameters", diameters() + "; series " + String.join(", ", Grades.series(grade)));
    facts.row("density", shown(Dimension.DENSITY, grade.density(), 0));
    facts.row("service", service(grade.maxServiceTemperature()));
    facts.row("cost index", Numbers.fixed(grade.costIndex(), 1) + " (hard-drawn is 1.0)");
    for (String source : Grades.sources(grade)) {
      facts.row("source", source);
    }
    return facts.text("  ");
  }

  private String diameters() {
    DiameterRange range = grade.diameters();
    return (range.min() > 0 ? units.fixed(Dimension.LENGTH, range.min(), 3) + " to " : "up to ")
        + shown(Dimension.LENGTH, range.max(), 3);
  }

  private String service(OptionalDouble celsius) {
    if (celsius.isEmpty()) {
      return "no temperature cited";
    }
    return units == OutputUnits.METRIC
        ? "up to " + Numbers.fixed(celsius.getAsDouble(), 0) + " degC"
        : "up to " + Numbers.fixed(celsius.getAsDouble() * 9 / 5 + 32, 0) + " degF";
  }

  private String shown(Dimension dimension, double value, int decimals) {
    return units.fixed(dimension, value, decimals) + " " + units.symbol(dimension);
  }

  private String properties(List<Wire> wires) {
    String stress = " " + units.symbol(Dimension.STRESS);
    TextTable table = new TextTable("lrrrrrl");
    table.row(
        "size",
        "d " + units.symbol(Dimension.LENGTH),
        "+- " + units.symbol(Dimension.LENGTH),
        "Rm" + stress,
        "G" + stress,
        "E" + stress,
        "data");
    for (Wire wire : wires) {
      table.row(
          Wires.size(wire),
          units.fixed(Dimension.LENGTH, wire.diameter(), 3),
          units.fixed(Dimension.LENGTH, wire.diameterTolerance(), 4),
          units.fixed(Dimension.STRESS, wire.tensileStrength(), 0),
          units.fixed(Dimension.STRESS, wire.shearModulus(), 0),
          units.fixed(Dimension.STRESS, wire.elasticModulus(), 0),
          wire.evidence().word());
    }
    return table.text("  ");
  }

  private static List<Wire> spread(List<Wire> wires) {
    if (wires.size() <= SIZES_OF_A_SPREAD) {
      return wires;
    }
    List<Wire> spread = new ArrayList<>();
    for (int i = 0; i < SIZES_OF_A_SPREAD; i++) {
      spread.add(wires.get(i * (wires.size() - 1) / (SIZES_OF_A_SPREAD - 1)));
    }
    return spread;
  }
}
