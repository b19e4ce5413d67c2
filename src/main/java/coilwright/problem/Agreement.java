package coilwright.problem;

import java.util.List;
import java.util.OptionalDouble;

/**
 * Whether facts that are not needed to fix the load line agree with it.
 *
 * @param root the file
 * @param keys the keys of the facts
 * @param fixed the line, and what fixed it
 */
record Agreement(Section root, LineKeys keys, FixedLine fixed) {

  /** How far a redundant fact may lie off the line, as a share of its own value [-]. */
  private static final double WITHIN = 1e-3;

  /**
   * Reports every fact that does not agree.
   *
   * @param loads the loads
   * @param facts the other facts
   */
  void check(List<LoadEntry> loads, LineFacts facts) {
    LineForm form = fixed.form();
    if (facts.rate().isPresent() && !agrees(facts.rate().getAsDouble(), fixed.rate())) {
      disagrees(keys.rate(), form.shownRate(fixed.rate()));
    }
    stroke(new Stroke(form, loads), facts.stroke());
    if (fixed.zero().isEmpty()) {
      return;
    }
    zero(facts.zero(), loads);
    loads.stream().filter(LoadEntry::isFull).forEach(this::onTheLine);
    List<LoadEntry> open = loads.stream().filter(load -> !load.isFull()).toList();
    Unloaded.check(form, open, fixed.zero());
    if (!form.turning()) {
      open.stream().filter(load -> load.at().isEmpty()).forEach(this::atSomeLength);
    }
  }

  private void onTheLine(LoadEntry load) {
    double line = fixed.loadAt(load.place());
    if (!agrees(load.load(), line)) {
      load.loadFault(remedy(fixed.form().shownLoad(line), ""));
    }
  }

  private void atSomeLength(LoadEntry load) {
    if (!(fixed.placeUnder(load.load()) > 0)) {
      load.loadFault(
          "must be "
              + (fixed.form().falling() ? "below " : "above ")
              + fixed.form().shownLoad(fixed.loadAt(0))
              + ", at which the load line comes to no length at all");
    }
  }

  private void stroke(Stroke stroke, OptionalDouble given) {
    boolean known = given.isPresent() && (stroke.byLoads() || stroke.byPlaces());
    if (known) {
      double way = stroke.byLoads() ? stroke.load() / fixed.rate() : stroke.way();
      if (!agrees(given.getAsDouble(), way)) {
        disagrees(keys.stroke(), fixed.form().shownPlace(way));
      }
    }
  }

  /** Angles count from any reference: they agree within a share of the greatest turn. */
  private void zero(OptionalDouble given, List<LoadEntry> loads) {
    if (given.isEmpty()) {
      return;
    }
    double line = fixed.zero().getAsDouble();
    double whole = given.getAsDouble();
    if (fixed.form().turning()) {
      whole = 0;
      for (LoadEntry load : loads) {
        double way = load.carries().isPresent() ? load.load() / fixed.rate() : load.place() - line;
        whole = Math.max(whole, Math.abs(way));
      }
    }
    if (!(Math.abs(given.getAsDouble() - line) <= WITHIN * whole)) {
      ProblemKey<Double> key = keys.zero().get(0);
      String of = fixed.form().turning() ? " of the greatest deflection" : "";
      root.spot(key).fault(root.shown(key), remedy(fixed.form().shownPlace(line), of));
    }
  }

  private void disagrees(ProblemKey<Double> key, String line) {
    root.spot(key).fault(root.shown(key), remedy(line, ""));
  }

  private String remedy(String line, String of) {
    return "must be " + line + " within 0.1 %" + of + ", which follows from " + fixed.rule();
  }

  private static boolean agrees(double given, double line) {
    return Math.abs(given - line) <= WITHIN * Math.abs(given);
  }
}
