package coilwright.report;

import coilwright.problem.BucklingRule;
import coilwright.problem.Problem;
import coilwright.search.Candidate;
import coilwright.source.Evidence;
import coilwright.spring.CompressionState;
import java.util.ArrayList;
import java.util.List;

/** What a reader of a result should know before relying on it. */
final class Warnings {

  private Warnings() {}

  /** The warnings of a shortlist. */
  static List<String> of(Shortlist shortlist) {
    List<String> warnings = new ArrayList<>();
    shortlist
        .choice()
        .fromMemory()
        .forEach(
            (id, sizes) ->
                warnings.add(
                    id
                        + ": "
                        + sizes
                        + (sizes == 1 ? " size rests" : " sizes rest")
                        + " on data from memory and "
                        + (sizes == 1 ? "was" : "were")
                        + " left out; name the grade under make.materials to try them"));
    shared(warnings, shortlist.problem(), shortlist.shown());
    return warnings;
  }

  /** The warnings of one checked spring. */
  static List<String> of(Checked checked) {
    List<String> warnings = new ArrayList<>();
    shared(warnings, checked.problem(), checked.check().spring().stream().toList());
    return warnings;
  }

  private static void shared(
      List<String> warnings, Problem problem, List<Candidate<CompressionState>> springs) {
    name(
        warnings,
        springs.stream()
            .filter(spring -> spring.state().wire().evidence() == Evidence.MEMORY)
            .toList(),
        "strength, moduli or size from memory, to be confirmed against the standard");
    name(
        warnings,
        springs.stream().filter(spring -> buckles(problem, spring.state())).toList(),
        "would buckle without the bore or rod that guides it; rubbing there changes its loads");
  }

  /** One warning for all the springs it concerns. */
  private static void name(
      List<String> warnings, List<Candidate<CompressionState>> springs, String what) {
    if (!springs.isEmpty()) {
      List<String> ids = springs.stream().map(CompressionQuantities::id).toList();
      warnings.add(what + ": " + String.join(", ", ids));
    }
  }

  private static boolean buckles(Problem problem, CompressionState state) {
    return problem.limits().buckling() == BucklingRule.AT_LOAD_UNLESS_GUIDED
        && problem.envelope().guides()
        && !state.stableAt(state.mostCompressed());
  }
}
