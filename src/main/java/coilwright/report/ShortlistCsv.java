package coilwright.report;

import coilwright.limit.Limit;
import coilwright.search.Candidate;
import coilwright.search.CompressionSearch;
import coilwright.spring.CompressionState;
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
  private record Row(String title, int rank, Candidate<CompressionState> spring) {}

  private ShortlistCsv() {}

  /**
   * Writes a shortlist.
   *
   * @param shortlist what it shows
   * @param units the units of the columns
   */
  static String of(Shortlist shortlist, OutputUnits units) {
    Columns<Row> columns = new Columns<>(units);
    columns.add(List.of(Word.users("problem_title", Row::title)));
    columns.add(List.of(Word.<Row>ours("rank", row -> Integer.toString(row.rank()))));
    new CandidateCsv<Row>(columns, row -> Optional.of(row.spring()))
        .addTo(
            shortlist.problem(),
            shortlist.problem().facts().loads().size(),
            new CompressionSearch()
                .limits(shortlist.problem()).stream().map(Limit::check).toList());
    List<Row> rows = new ArrayList<>();
    for (Candidate<CompressionState> candidate : shortlist.shown()) {
      rows.add(new Row(shortlist.problem().title(), rows.size() + 1, candidate));
    }
    return columns.table(rows);
  }
}
