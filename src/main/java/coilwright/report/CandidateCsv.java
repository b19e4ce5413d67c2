package coilwright.report;

import coilwright.limit.Check;
import coilwright.problem.Problem;
import coilwright.search.Candidate;
import coilwright.spring.State;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/**
 * The columns of a spring: the keys of its JSON, each behind those that it is nested in. The
 * problem alone decides which columns there are, whatever springs are found.
 *
 * @param <T> a row
 * @param <S> the state of the kind of spring
 */
final class CandidateCsv<T, S extends State> {

  private final Columns<T> columns;
  private final Function<T, Optional<Candidate<S>>> spring;

  /**
   * Begins with the columns that a table has.
   *
   * @param columns where more are added
   * @param spring the spring of a row; empty in a row without one
   */
  CandidateCsv(Columns<T> columns, Function<T, Optional<Candidate<S>>> spring) {
    this.columns = columns;
    this.spring = spring;
  }

  /**
   * Adds them all.
   *
   * @param sheet what is particular to the kind of spring
   * @param problem the problem
   * @param checks what its limits ask, in the order of the findings
   */
  void addTo(Sheet<S> sheet, Problem problem, List<Check> checks) {
    Function<T, Optional<S>> state = row -> spring.apply(row).map(Candidate::state);
    columns.addPart("", SpringFields.IDENTITY, row -> spring.apply(row).map(one -> one));
    for (SpringPart<S> part : sheet.parts(problem)) {
      part.addTo(columns, state);
    }
    columns.addPart("", SpringFields.SUMMARY, row -> spring.apply(row).map(one -> one));
    checks(checks);
  }

  private void checks(List<Check> checks) {
    List<String> names = names(checks);
    for (int i = 0; i < checks.size(); i++) {
      int check = i;
      columns.addPart(
          names.get(i),
          CheckFields.FOUND,
          row -> spring.apply(row).map(found -> found.findings().get(check)));
    }
  }

  /** One prefix a check; a bound that comes again is numbered. */
  private static List<String> names(List<Check> checks) {
    List<String> names = new ArrayList<>();
    for (Check check : checks) {
      String name = name(check);
      String free = name;
      for (int again = 2; names.contains(free); again++) {
        free = name + again + "_";
      }
      names.add(free);
    }
    return names;
  }

  /** "check_stress_at_load_max_". */
  static String name(Check check) {
    return "check_" + check.limit().text().replace(' ', '_') + "_" + check.side().id() + "_";
  }
}
