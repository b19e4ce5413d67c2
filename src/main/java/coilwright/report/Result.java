package coilwright.report;

import coilwright.problem.UnitSystem;
import java.util.List;

/** What a command found, in each of the formats it can be written in. */
public interface Result {

  /**
   * For people.
   *
   * @param units the units shown
   * @return lines, each ended by a line feed
   */
  String text(UnitSystem units);

  /** For programs: everything, in metric units whatever the problem's. */
  String json();

  /**
   * For spreadsheets: a line of column names, then one line a row.
   *
   * @param units the units of the columns
   * @return the lines, each ended by a line feed
   */
  String csv(UnitSystem units);

  /** What a reader of the rows alone would miss, one remark a line. */
  default List<String> remarks() {
    return List.of();
  }
}
