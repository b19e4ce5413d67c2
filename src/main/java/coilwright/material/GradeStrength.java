package coilwright.material;

import coilwright.source.Evidence;
import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.List;

/**
 * The strength of one grade as its file gives it.
 *
 * @param law Rm by diameter
 * @param diameters where it holds
 * @param sources one line for what was seen and one for what is remembered, as far as there is any
 */
record GradeStrength(StrengthLaw law, DiameterRange diameters, List<GradeSource> sources) {

  private static final String DIAMETER = "diameter";
  private static final String STRENGTH = "strength";

  /**
   * Reads the strength of a grade by the rule that the file's header names.
   *
   * @param table the file
   * @param gradeId the grade, which picks the row of a file of formulas
   * @return its strength
   * @throws IllegalStateException naming file, line and column if the file is bad
   */
  static GradeStrength of(Table table, String gradeId) {
    String rule = table.header().entry("rule");
    return switch (rule) {
      case "interpolate" -> interpolated(table);
      case "step-up-to-and-including" -> stepped(table);
      case "formula" -> formula(table, gradeId);
      default ->
          throw TableFault.at(
              table.file(),
              1,
              "found rule \""
                  + rule
                  + "\", accepted: interpolate | step-up-to-and-including | formula");
    };
  }

  private static GradeStrength interpolated(Table table) {
    List<DiameterRow> rows = DiameterRows.of(table.rows(), DIAMETER, STRENGTH, Dimension.STRESS);
    double last = rows.get(rows.size() - 1).diameter();
    if (last == Double.POSITIVE_INFINITY) {
      TableRow row = table.rows().get(rows.size() - 1);
      throw row.fault(DIAMETER, "found \"" + row.text(DIAMETER) + "\", accepted: a diameter");
    }
    DiameterRange range = new DiameterRange(rows.get(0).diameter(), last);
    return new GradeStrength(new InterpolatedTable(rows), range, sources(table));
  }

  private static GradeStrength stepped(Table table) {
    List<DiameterRow> rows = DiameterRows.of(table.rows(), DIAMETER, STRENGTH, Dimension.STRESS);
    DiameterRange range = new DiameterRange(0, rows.get(rows.size() - 1).diameter());
    return new GradeStrength(new StepTable(rows), range, sources(table));
  }

  private static GradeStrength formula(Table table, String gradeId) {
    TableRow row = table.rowsOf("grade", gradeId).get(0);
    StrengthLaw law =
        new LogarithmicLaw(
            row.quantity("intercept", Dimension.STRESS),
            row.quantity("slope", Dimension.STRESS),
            row.quantity("rounding", Dimension.STRESS),
            row.evidence());
    DiameterRange range =
        new DiameterRange(
            row.quantity("diameter_min", Dimension.LENGTH),
            row.quantity("diameter_max", Dimension.LENGTH));
    GradeSource source = new GradeSource(STRENGTH, row.place(), row.evidence());
    return new GradeStrength(law, range, List.of(source));
  }

  private static List<GradeSource> sources(Table table) {
    List<GradeSource> sources = new ArrayList<>();
    for (Evidence evidence : Evidence.values()) {
      List<TableRow> rows =
          table.rows().stream().filter(row -> row.evidence() == evidence).toList();
      if (!rows.isEmpty()) {
        String place = rows.get(0).place();
        String part = rows.size() == table.rows().size() ? "" : ", " + span(table, rows);
        sources.add(new GradeSource(STRENGTH, place + part, evidence));
      }
    }
    return sources;
  }

  private static String span(Table table, List<TableRow> rows) {
    String first = rows.get(0).text(DIAMETER);
    String last = rows.get(rows.size() - 1).text(DIAMETER);
    return "rows " + first + " to " + last + " " + table.header().unitOf(DIAMETER);
  }
}
