package coilwright.report;

import coilwright.limit.Check;
import coilwright.limit.Limit;
import coilwright.search.Candidate;
import coilwright.spring.State;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** A shortlist as CSV: one row a candidate, best first. */
final class ShortlistCsv {

  /**
   * A row.
   *
   * @param title of the problem
   * @param rank in the list
   * @param spring the candidate
   */
  private record Row<S extends State>(String title, int rank, Candidate<S> spring) {}

  private ShortlistCsv() {}

  /**
   * Writes a shortlist.
   *
   * @param shortlist what it shows
   * @param units the units of the columns
   */
  static <S extends State> String of(Shortlist<S> shortlist, OutputUnits units) {
    Columns<Row<S>> columns = new Columns<>(units);
    columns.add(List.of(Word.users("problem_title", Row::title)));
    columns.add(List.of(Word.<Row<S>>ours("rank", row -> Integer.toString(row.rank()))));
    List<Check> checks =
        shortlist.sheet().synthesis().limits(shortlist.problem()).stream()
            .map(Limit::check)
            .toList();
    new CandidateCsv<Row<S>, S>(columns, row -> Optional.of(row.spring()))
        .addTo(shortlist.sheet(), shortlist.problem(), checks);
    List<Row<S>> rows = new ArrayList<>();
    for (Candidate<S> candidate : shortlist.shown()) {
      rows.add(new Row<>(shortlist.problem().title(), rows.size() + 1, candidate));
    }
    return columns.table(rows);
  }
}
