package coilwright.problem;

import java.util.List;
import java.util.OptionalDouble;

/**
 * Whether facts that are not needed to fix the load line agree with it.
 *
 * @param root the file
 * @param fixed the line, and what fixed it
 */
record Agreement(Section root, FixedLine fixed) {

  /** How far a redundant fact may lie off the line, as a share of its own value [-]. */
  private static final double WITHIN = 1e-3;

  /**
   * Reports every fact that does not agree.
   *
   * @param loads the loads
   * @param facts the same loads with the other facts
   */
  void check(List<LoadEntry> loads, LoadFacts facts) {
    compare(LoadKeys.RATE, facts.rate(), fixed.rate(), "N/mm");
    stroke(new Stroke(loads), facts);
    if (fixed.freeLength().isEmpty()) {
      return;
    }
    compare(LoadKeys.FREE_LENGTH, facts.freeLength(), fixed.line().freeLength(), "mm");
    for (LoadEntry load : loads) {
      if (load.isFull() && !agrees(load.force(), fixed.line().forceAt(load.length()))) {
        disagrees(
            load.section().spot(LoadKeys.FORCE),
            load.section().shown(LoadKeys.FORCE),
            fixed.line().forceAt(load.length()),
            "N");
      }
    }
    belowFreeLength(loads.stream().filter(load -> !load.isFull()).toList(), fixed.freeLength());
    loads.stream()
        .filter(load -> load.asked().length().isEmpty())
        .filter(load -> !(fixed.line().lengthUnder(load.force()) > 0))
        .forEach(this::beyondAnyLength);
  }

  private void beyondAnyLength(LoadEntry load) {
    double most = fixed.rate() * fixed.line().freeLength();
    load.section()
        .spot(LoadKeys.FORCE)
        .fault(
            load.section().shown(LoadKeys.FORCE),
            "must be below "
                + Range.number(most)
                + " N, at which the load line comes to no length at all");
  }

  private void stroke(Stroke stroke, LoadFacts facts) {
    if (facts.stroke().isPresent() && stroke.byForces()) {
      compare(LoadKeys.STROKE, facts.stroke(), stroke.force() / fixed.rate(), "mm");
    } else if (facts.stroke().isPresent() && stroke.byLengths()) {
      compare(LoadKeys.STROKE, facts.stroke(), stroke.length(), "mm");
    }
  }

  /**
   * Reports a stroke that belongs to nothing: some loads give only a length, others only a force.
   *
   * @param root the file
   * @param loads the loads
   */
  static void strokeBetween(Section root, List<LoadEntry> loads) {
    Stroke stroke = new Stroke(loads);
    if (root.has(LoadKeys.STROKE) && !stroke.byForces() && !stroke.byLengths()) {
      root.spot(LoadKeys.STROKE)
          .fault(
              root.shown(LoadKeys.STROKE) + " between loads of which some lack their force",
              "must go with loads that all give a force, or that all give a length");
    }
  }

  /**
   * Reports loads at lengths at which the spring carries nothing.
   *
   * @param loads the loads
   * @param freeLength L0 [mm], where it is known
   */
  static void belowFreeLength(List<LoadEntry> loads, OptionalDouble freeLength) {
    for (LoadEntry load : loads) {
      boolean known = freeLength.isPresent() && load.asked().length().isPresent();
      if (known && !(load.length() < freeLength.getAsDouble())) {
        load.section()
            .spot(LoadKeys.LENGTH)
            .fault(
                load.section().shown(LoadKeys.LENGTH),
                "must be below the free length, "
                    + Range.number(freeLength.getAsDouble())
                    + " mm: there the spring carries no load");
      }
    }
  }

  private void compare(ProblemKey<Double> key, OptionalDouble given, double line, String unit) {
    if (given.isPresent() && !agrees(given.getAsDouble(), line)) {
      disagrees(root.spot(key), root.shown(key), line, unit);
    }
  }

  private void disagrees(Spot spot, String shown, double line, String unit) {
    spot.fault(
        shown,
        "must be "
            + Range.number(line)
            + " "
            + unit
            + " within 0.1 %, which follows from "
            + fixed.rule());
  }

  private static boolean agrees(double given, double line) {
    return Math.abs(given - line) <= WITHIN * Math.abs(given);
  }
}
