package coilwright.report;

import coilwright.limit.Check;
import coilwright.problem.Problem;
import coilwright.search.Candidate;
import coilwright.spring.CompressionState;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/**
 * The columns of a compression spring: the keys of its JSON, each behind those that it is nested
 * in. The problem alone decides which columns there are, whatever springs are found.
 *
 * @param <T> a row
 */
final class CandidateCsv<T> {

  private final Columns<T> columns;
  private final Function<T, Optional<Candidate<CompressionState>>> spring;

  /**
   * Begins with the columns that a table has.
   *
   * @param columns where more are added
   * @param spring the spring of a row; empty in a row without one
   */
  CandidateCsv(Columns<T> columns, Function<T, Optional<Candidate<CompressionState>>> spring) {
    this.columns = columns;
    this.spring = spring;
  }

  /**
   * Adds them all.
   *
   * @param problem the problem
   * @param loads how many loads its springs report
   * @param checks what its limits ask, in the order of the findings
   */
  void addTo(Problem problem, int loads, List<Check> checks) {
    Function<T, Optional<CompressionState>> state = row -> spring.apply(row).map(Candidate::state);
    columns.addPart("", CompressionFields.IDENTITY, spring);
    columns.addPart("", CompressionQuantities.SPRING, state);
    columns.addPart("", CompressionFields.group(problem), state);
    columns.addPart("", CompressionFields.BASIS, state);
    for (int i = 0; i < loads; i++) {
      int load = i;
      columns.addPart(
          "load_" + (i + 1) + "_",
          CompressionQuantities.LOAD,
          row -> state.apply(row).map(at -> at.loads().get(load)));
    }
    if (problem.overtravel().isPresent()) {
      columns.addPart(
          "overtravel_",
          CompressionQuantities.LOAD,
          row -> state.apply(row).flatMap(CompressionState::overtravel));
    }
    columns.addPart(
        "solid_", CompressionFields.SOLID, row -> state.apply(row).map(CompressionState::solid));
    columns.addPart("", CompressionFields.GROWTH, state);
    columns.addPart("buckling_", List.of(CompressionQuantities.CRITICAL_DEFLECTION), state);
    columns.addPart("buckling_", List.of(CompressionFields.stable(problem)), state);
    columns.addPart("", CompressionFields.SUMMARY, spring);
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
