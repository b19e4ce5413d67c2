package coilwright.report;

import coilwright.problem.LoadAsked;
import coilwright.problem.LoadFacts;
import coilwright.problem.Tolerance;
import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.List;

/**
 * Loads of force against length in words.
 *
 * @param words how lengths and forces are written
 */
record LoadWords(Understood words) {

  /** The note on springs whose loads reach as far as their overtravel. */
  static final String OVERTRAVEL_WITHIN =
      "overtravel no farther than the loads, so that nothing more is asked";

  /** All loads and the stroke. */
  String text() {
    LoadFacts facts = words.problem().facts();
    String stroke =
        facts.stroke().isPresent() ? "; stroke " + words.length(facts.stroke().getAsDouble()) : "";
    List<String> loads = facts.loads().stream().map(this::load).toList();
    return String.join("; ", loads) + stroke + words.shared();
  }

  /** Adds the length beyond the loads where one is asked. */
  void overtravel() {
    words
        .problem()
        .overtravel()
        .ifPresent(
            length -> words.row("overtravel", "to " + words.length(length) + ", no force asked"));
  }

  private String load(LoadAsked load) {
    List<String> parts = new ArrayList<>();
    load.force().ifPresent(force -> parts.add(words.units().brief(Dimension.FORCE, force, 3)));
    load.tolerance().map(this::tolerance).ifPresent(parts::add);
    load.length().ifPresent(length -> parts.add("at " + words.length(length)));
    if (load.force().isEmpty()) {
      parts.add("(force found)");
    }
    if (load.length().isEmpty()) {
      parts.add("(length found)");
    }
    return String.join(" ", parts);
  }

  private String tolerance(Tolerance tolerance) {
    return "(+"
        + words.units().number(Dimension.FORCE, tolerance.plus(), 3)
        + " -"
        + words.units().brief(Dimension.FORCE, tolerance.minus(), 3)
        + " accepted, not judged)";
  }
}
