package coilwright.report;

import java.util.ArrayList;
import java.util.List;

/**
 * Something a reader should know before relying on a result.
 *
 * @param what what it is
 * @param ids the springs it concerns; empty where it concerns the whole result
 * @param rows their ranks in the list; empty where there is no list
 */
record Warning(String what, List<String> ids, List<Integer> rows) {

  /** Copies the lists. */
  Warning {
    ids = List.copyOf(ids);
    rows = List.copyOf(rows);
  }

  /** The warning with the ids it concerns. */
  String full() {
    return ids.isEmpty() ? what : what + ": " + String.join(", ", ids);
  }

  /** The warning with the rows it concerns, for a reader who has the list at hand. */
  String text() {
    if (rows.isEmpty()) {
      return what;
    }
    List<String> numbers = new ArrayList<>();
    rows.forEach(row -> numbers.add("#" + row));
    return what + ": " + String.join(", ", numbers);
  }
}
