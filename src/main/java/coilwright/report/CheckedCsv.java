package coilwright.report;

import coilwright.limit.Check;
import coilwright.limit.Finding;
import coilwright.rank.Cost;
import coilwright.search.Candidate;
import coilwright.spring.State;
import java.util.List;
import java.util.Optional;

/** A checked spring as CSV: one row. */
final class CheckedCsv {

  private CheckedCsv() {}

  /**
   * Writes a check.
   *
   * @param checked what it shows
   * @param units the units of the columns
   */
  static <S extends State> String of(Checked<S> checked, OutputUnits units) {
    Columns<Checked<S>> columns = new Columns<>(units);
    columns.add(
        List.of(
            Word.users("problem_title", one -> one.problem().title()),
            new Flag<>("holds", one -> one.check().holds())));
    if (checked.check().spring().isPresent()) {
      spring(columns, checked, checked.check().spring().get());
    } else {
      outOfRange(columns, checked, checked.check().outOfRange().orElseThrow());
    }
    return columns.table(List.of(checked));
  }

  private static <S extends State> void spring(
      Columns<Checked<S>> columns, Checked<S> checked, Candidate<S> spring) {
    List<Check> checks = spring.findings().stream().map(Finding::check).toList();
    new CandidateCsv<Checked<S>, S>(columns, row -> row.check().spring())
        .addTo(checked.sheet(), checked.problem(), checks);
    for (Cost.Term term : Cost.of(spring.state()).terms()) {
      columns.addPart(
          "cost_term_" + term.name().replace(' ', '_') + "_",
          List.of(Quantities.<Cost.Term>number("value", "", 2, Cost.Term::value)),
          row -> Optional.of(term));
    }
  }

  private static <S extends State> void outOfRange(
      Columns<Checked<S>> columns, Checked<S> checked, Finding finding) {
    columns.addPart("", checked.sheet().design(), row -> row.problem().design());
    columns.add(
        List.of(Word.<Checked<S>>ours("limiting_check", row -> finding.check().limit().text())));
    columns.addPart(
        CandidateCsv.name(finding.check()), CheckFields.FOUND, row -> Optional.of(finding));
  }
}
