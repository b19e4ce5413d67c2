package coilwright.material;

import coilwright.source.Evidence;
import coilwright.unit.Dimension;
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
  private static final String SMALLEST = "smallest";

  /**
   * Reads the strength of a grade by the rule that the file's header names.
   *
   * @param table the file
   * @param gradeId the grade, which picks its rows of a file that holds several
   * @return its strength
   * @throws IllegalStateException naming file, line and column if the file is bad
   */
  static GradeStrength of(Table table, String gradeId) {
    String rule = table.header().entry("rule");
    boolean several = table.rows().get(0).has("grade");
    List<TableRow> rows = several ? table.rowsOf("grade", gradeId) : table.rows();
    return switch (rule) {
      case "interpolate" -> interpolated(rows);
      case "step-up-to-and-including" -> stepped(table.header(), rows);
      case "formula" -> formula(rows.get(0));
      case "flat" -> flat(rows.get(0));
      default ->
          throw TableFault.at(
              table.file(),
              1,
              "found rule \""
                  + rule
                  + "\", accepted: interpolate | step-up-to-and-including | formula | flat");
    };
  }

  private static GradeStrength interpolated(List<TableRow> rows) {
    List<DiameterRow> points = DiameterRows.of(rows, DIAMETER, STRENGTH, Dimension.STRESS);
    double last = points.get(points.size() - 1).diameter();
    if (last == Double.POSITIVE_INFINITY) {
      TableRow row = rows.get(rows.size() - 1);
      throw row.fault(DIAMETER, "found \"" + row.text(DIAMETER) + "\", accepted: a diameter");
    }
    DiameterRange range = new DiameterRange(points.get(0).diameter(), last);
    return new GradeStrength(new InterpolatedTable(points), range, StrengthSources.of(rows));
  }

  /** The header may say the smallest diameter; without it the first step holds for all thinner. */
  private static GradeStrength stepped(TableHeader header, List<TableRow> rows) {
    List<DiameterRow> steps = DiameterRows.of(rows, DIAMETER, STRENGTH, Dimension.STRESS);
    double smallest = header.entries().containsKey(SMALLEST) ? smallest(rows.get(0)) : 0;
    DiameterRange range = new DiameterRange(smallest, steps.get(steps.size() - 1).diameter());
    return new GradeStrength(new StepTable(steps), range, StrengthSources.of(rows));
  }

  private static double smallest(TableRow row) {
    double smallest = TableRow.decimal(row.header().entry(SMALLEST));
    String unit = row.header().unitOf(DIAMETER);
    double inner = row.unit(DIAMETER, unit, Dimension.LENGTH).toInner(smallest);
    if (inner <= row.quantity(DIAMETER, Dimension.LENGTH)) {
      return inner;
    }
    throw row.fault(DIAMETER, "the header's smallest diameter must be a number below the first");
  }

  private static GradeStrength formula(TableRow row) {
    boolean open = row.text("greatest").equals(DiameterRows.OPEN);
    StrengthLaw law =
        new LogarithmicLaw(
            row.quantity("intercept", Dimension.STRESS),
            row.quantity("slope", Dimension.STRESS),
            open ? Double.POSITIVE_INFINITY : row.quantity("greatest", Dimension.STRESS),
            row.quantity("rounding", Dimension.STRESS),
            row.evidence());
    return new GradeStrength(law, range(row), StrengthSources.of(row));
  }

  private static GradeStrength flat(TableRow row) {
    DiameterRange range = range(row);
    Evidence evidence = row.evidence().and(StrengthSources.ofDiameters(row));
    DiameterRow step =
        new DiameterRow(range.max(), row.quantity(STRENGTH, Dimension.STRESS), evidence);
    return new GradeStrength(new StepTable(List.of(step)), range, StrengthSources.ofFlat(row));
  }

  private static DiameterRange range(TableRow row) {
    return new DiameterRange(
        row.quantity("diameter_min", Dimension.LENGTH),
        row.quantity("diameter_max", Dimension.LENGTH));
  }
}
