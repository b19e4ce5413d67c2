package coilwright.report;

import coilwright.problem.BucklingRule;
import coilwright.problem.Problem;
import coilwright.rank.Ranked;
import coilwright.source.Evidence;
import coilwright.spring.CompressionState;
import coilwright.spring.Method;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Predicate;

/** What a reader of a result should know before relying on it. */
final class Warnings {

  private Warnings() {}

  /** The warnings of a shortlist. */
  static List<Warning> of(Shortlist shortlist) {
    return of(shortlist, Ranked.of(shortlist.shown()));
  }

  /** The warnings of a shortlist that shows some springs. */
  static List<Warning> of(Shortlist shortlist, List<Ranked<CompressionState>> shown) {
    List<Warning> warnings = new ArrayList<>();
    shortlist.choice().fromMemory().forEach((id, sizes) -> warnings.add(leftOut(id, sizes)));
    warnings.addAll(shared(shortlist.problem(), shown, true));
    return warnings;
  }

  /** The warnings of one checked spring. */
  static List<Warning> of(Checked checked) {
    return shared(checked.problem(), Ranked.of(checked.check().spring().stream().toList()), false);
  }

  /** Each in a line, with the ids it concerns. */
  static List<String> full(List<Warning> warnings) {
    return warnings.stream().map(Warning::full).toList();
  }

  private static Warning leftOut(String id, int sizes) {
    String many =
        sizes == 1
            ? " size rests on data from memory and was"
            : " sizes rest on data from memory and were";
    return new Warning(
        id + ": " + sizes + many + " left out; name the grade under make.materials to try them",
        List.of(),
        List.of());
  }

  private static List<Warning> shared(
      Problem problem, List<Ranked<CompressionState>> springs, boolean ranked) {
    List<Warning> warnings = new ArrayList<>();
    warn(
        warnings,
        "strength, moduli or size from memory, to be confirmed against the standard",
        springs,
        ranked,
        state -> state.wire().evidence() == Evidence.MEMORY);
    warn(
        warnings,
        "density from memory, on which mass, cost and surge frequency rest",
        springs,
        ranked,
        state -> state.wire().grade().densityEvidence() == Evidence.MEMORY);
    warn(
        warnings,
        "diameter tolerance not seen for the grade but taken for it, on which the solid length rests",
        springs,
        ranked,
        state -> takenTolerance(problem, state));
    warn(
        warnings,
        "would buckle without the bore or rod that guides it, and rubs there",
        springs,
        ranked,
        state -> buckles(problem, state));
    warn(
        warnings,
        "overtravel no farther than the loads, so that nothing more is asked",
        springs,
        ranked,
        Warnings::overtravelWithinLoads);
    return warnings;
  }

  /** One warning for all the springs it concerns. */
  private static void warn(
      List<Warning> warnings,
      String what,
      List<Ranked<CompressionState>> springs,
      boolean ranked,
      Predicate<CompressionState> concerns) {
    List<String> ids = new ArrayList<>();
    List<Integer> rows = new ArrayList<>();
    for (Ranked<CompressionState> spring : springs) {
      if (concerns.test(spring.candidate().state())) {
        ids.add(CompressionQuantities.id(spring.candidate()));
        rows.add(spring.rank());
      }
    }
    if (!ids.isEmpty()) {
      warnings.add(new Warning(what, ids, ranked ? rows : List.of()));
    }
  }

  /**
   * The solid length by EN 13906-1 is that of the greatest wire; the handbook takes the nominal.
   */
  private static boolean takenTolerance(Problem problem, CompressionState state) {
    return problem.limits().method() == Method.EN_13906
        && state.wire().diameterToleranceEvidence() == Evidence.MEMORY;
  }

  /** Where lengths are found, only the spring tells which of its lengths is the shortest. */
  private static boolean overtravelWithinLoads(CompressionState state) {
    return state.overtravel().isPresent()
        && !(state.overtravel().get().length() < state.mostCompressed().length());
  }

  private static boolean buckles(Problem problem, CompressionState state) {
    return problem.limits().buckling() == BucklingRule.AT_LOAD_UNLESS_GUIDED
        && problem.envelope().guides()
        && !state.stableAt(state.extreme());
  }
}
