package coilwright.report;

import coilwright.limit.Check;
import coilwright.limit.Finding;
import coilwright.problem.CompressionDesign;
import coilwright.rank.Cost;
import coilwright.search.Candidate;
import coilwright.spring.CompressionState;
import java.util.List;
import java.util.Optional;

/** A checked spring as CSV: one row. */
final class CheckedCsv {

  private static final List<Field<Checked>> HEAD =
      List.of(
          Word.users("problem_title", checked -> checked.problem().title()),
          new Flag<>("holds", checked -> checked.check().holds()));

  private CheckedCsv() {}

  /**
   * Writes a check.
   *
   * @param checked what it shows
   * @param units the units of the columns
   */
  static String of(Checked checked, OutputUnits units) {
    Columns<Checked> columns = new Columns<Checked>(units).add(HEAD);
    if (checked.check().spring().isPresent()) {
      spring(columns, checked, checked.check().spring().get());
    } else {
      outOfRange(columns, checked.check().outOfRange().orElseThrow());
    }
    return columns.table(List.of(checked));
  }

  private static void spring(
      Columns<Checked> columns, Checked checked, Candidate<CompressionState> spring) {
    List<Check> checks = spring.findings().stream().map(Finding::check).toList();
    new CandidateCsv<Checked>(columns, row -> row.check().spring())
        .addTo(checked.problem(), spring.state().loads().size(), checks);
    for (Cost.Term term : Cost.of(spring.state()).terms()) {
      columns.addPart(
          "cost_term_" + term.name().replace(' ', '_') + "_",
          List.of(CompressionQuantities.<Cost.Term>number("value", "", 2, Cost.Term::value)),
          row -> Optional.of(term));
    }
  }

  private static void outOfRange(Columns<Checked> columns, Finding finding) {
    columns.addPart(
        "",
        DesignFields.ALL,
        checked -> checked.problem().design().map(CompressionDesign.class::cast));
    columns.add(
        List.of(Word.<Checked>ours("limiting_check", row -> finding.check().limit().text())));
    columns.addPart(
        CandidateCsv.name(finding.check()), CheckFields.FOUND, row -> Optional.of(finding));
  }
}
