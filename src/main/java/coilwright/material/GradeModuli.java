package coilwright.material;

import coilwright.source.Evidence;
import coilwright.unit.Dimension;
import java.util.List;

/**
 * The moduli of one grade as its file gives them.
 *
 * @param shear G by diameter
 * @param elastic E by diameter
 * @param source where they come from
 */
record GradeModuli(ModulusLaw shear, ModulusLaw elastic, GradeSource source) {

  /**
   * Reads the moduli of a grade: steps, the bound included, the last one open.
   *
   * @param table the file
   * @param gradeId the grade
   * @return its moduli
   * @throws IllegalStateException naming file, line and column if the file is bad
   */
  static GradeModuli of(Table table, String gradeId) {
    List<TableRow> rows = table.rowsOf("grade", gradeId);
    Evidence weakest = rows.stream().map(TableRow::evidence).reduce(Evidence.SEEN, Evidence::and);
    return new GradeModuli(
        new StepTable(DiameterRows.of(rows, "up_to", "shear_modulus", Dimension.STRESS)),
        new StepTable(DiameterRows.of(rows, "up_to", "elastic_modulus", Dimension.STRESS)),
        new GradeSource("moduli", rows.get(0).place(), weakest));
  }
}
