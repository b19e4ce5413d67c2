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
    for (Candidate<CompressionState> spring : springs) {
      if (spring.state().wire().evidence() == Evidence.MEMORY) {
        warnings.add(
            CompressionQuantities.id(spring)
                + ": strength, moduli or size are from memory; confirm them against the standard");
      }
      if (buckles(problem, spring.state())) {
        warnings.add(
            CompressionQuantities.id(spring)
                + ": would buckle without the bore or rod that guides it; friction changes its loads");
      }
    }
  }

  private static boolean buckles(Problem problem, CompressionState state) {
    return problem.limits().buckling() == BucklingRule.AT_LOAD_UNLESS_GUIDED
        && problem.envelope().guides()
        && !state.stableAt(state.mostCompressed());
  }
}
