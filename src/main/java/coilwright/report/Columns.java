package coilwright.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/**
 * The columns of a CSV table: fields of a row, or of its parts, one behind the other.
 *
 * @param <T> a row
 */
final class Columns<T> {

  private final OutputUnits units;
  private final List<String> names = new ArrayList<>();
  private final List<Function<T, String>> cells = new ArrayList<>();

  Columns(OutputUnits units) {
    this.units = units;
  }

  /** Adds fields of the rows themselves. */
  Columns<T> add(List<? extends Field<? super T>> fields) {
    return addPart("", fields, Optional::of);
  }

  /**
   * Adds fields of a part of each row.
   *
   * @param prefix what their names begin with
   * @param fields the fields
   * @param part the part; its cells stay empty in a row without it
   * @param <U> the part
   */
  <U> Columns<T> addPart(
      String prefix, List<? extends Field<? super U>> fields, Function<T, Optional<U>> part) {
    for (Field<? super U> field : fields) {
      names.add(prefix + field.key(units));
      cells.add(row -> part.apply(row).map(of -> field.cell(of, units)).orElse(""));
    }
    return this;
  }

  /** A line of the names, and a line for each row. */
  String table(List<T> rows) {
    Csv csv = new Csv();
    csv.line(names);
    for (T row : rows) {
      csv.line(cells.stream().map(cell -> cell.apply(row)).toList());
    }
    return csv.text();
  }
}
