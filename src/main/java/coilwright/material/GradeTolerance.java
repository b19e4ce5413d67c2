package coilwright.material;

import coilwright.source.Evidence;
import coilwright.unit.Dimension;
import java.util.List;

/**
 * The diameter tolerance of one grade as its file gives it.
 *
 * @param law the tolerance by diameter
 * @param source where it comes from
 */
record GradeTolerance(ToleranceLaw law, GradeSource source) {

  private static final String WHAT = "diameter tolerance";

  /**
   * Reads the tolerance of a grade: steps, the bound included. A diameter between two bands takes
   * the band of the thicker wire.
   *
   * @param table the file
   * @param basis {@link Evidence#SEEN} where the table is the grade's own, {@link Evidence#MEMORY}
   *     where it is taken for want of one
   * @return its tolerance
   * @throws IllegalStateException naming file, line and column if the file is bad
   */
  static GradeTolerance of(Table table, Evidence basis) {
    List<DiameterRow> rows = DiameterRows.of(table.rows(), "up_to", "tolerance", Dimension.LENGTH);
    double last = 0;
    for (int i = 0; i < rows.size(); i++) {
      TableRow row = table.rows().get(i);
      double from = row.quantity("from", Dimension.LENGTH);
      if (!(from >= last && from < rows.get(i).diameter())) {
        throw row.fault("from", "found " + row.text("from") + ", must not overlap the row before");
      }
      last = rows.get(i).diameter();
    }
    TableRow first = table.rows().get(0);
    ToleranceLaw law = new ToleranceTable(rows, first.quantity("from", Dimension.LENGTH), basis);
    Evidence evidence = law.evidenceAt(last);
    String taken = basis == Evidence.SEEN ? "" : ", taken for this wire too";
    return new GradeTolerance(law, new GradeSource(WHAT, first.place() + taken, evidence));
  }
}
