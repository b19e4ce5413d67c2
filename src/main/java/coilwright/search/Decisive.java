package coilwright.search;

import coilwright.limit.CoilSet;
import coilwright.limit.Limit;
import coilwright.problem.LimitName;
import coilwright.spring.State;
import java.util.EnumSet;
import java.util.Set;

/** The limits that alone keep out a wire: without any one of them some spring of it would do. */
final class Decisive<S extends State> {

  private static final double[] TRIED_BETWEEN_STEPS = {0.5, 0, 1, 0.25, 0.75};

  /** Counts tried between steps are this ratio apart; see {@link #holdsBetweenSteps}. */
  private static final double CLOSE = 1.002;

  private final WireSearch<S> search;
  private final Limits left;

  Decisive(WireSearch<S> search) {
    this.search = search;
    this.left = search.left();
  }

  /** The limits; the coil step where some count that is no multiple of it would do. */
  Set<LimitName> limits() {
    Set<LimitName> decisive = EnumSet.noneOf(LimitName.class);
    for (LimitName name : suspects()) {
      if (name.removable() && holdsWithout(name)) {
        decisive.add(name);
      }
    }
    for (Limit<S> limit : search.limits()) {
      if (!decisive.contains(limit.name()) && search.holdsReshaped(limit)) {
        decisive.add(limit.name());
      }
    }
    if (holdsBetweenSteps()) {
      decisive.add(LimitName.COIL_STEP);
    }
    return decisive;
  }

  /**
   * The limits that may decide: of two that cross only these, for without another they still cross;
   * else those that leave less than all, and those that some rounded spring fails alone.
   */
  private Set<LimitName> suspects() {
    Set<LimitName> crossing = Limits.crossing(left.practical());
    if (search.practical().isEmpty() && !crossing.isEmpty()) {
      return crossing;
    }
    Set<LimitName> suspects = EnumSet.copyOf(search.failedAlone());
    suspects.addAll(left.exact().keySet());
    return suspects;
  }

  private boolean holdsWithout(LimitName name) {
    CoilSet others = search.bounded(left.dropping(name));
    return search.step().any(others, coils -> search.holdsBut(name, coils));
  }

  /**
   * Whether some count that is no multiple of the step would do. Tried are the ends and middles of
   * what the limits leave before rounding, and counts so close that between two of them no force
   * changes by more than a fraction of what rounding may cost.
   */
  private boolean holdsBetweenSteps() {
    if (search.practical().isEmpty()) {
      return false;
    }
    for (CoilSet.Interval range : search.bounded(Limits.together(left.exact())).intervals()) {
      for (double share : TRIED_BETWEEN_STEPS) {
        if (holdsAt(range.from() + share * (range.to() - range.from()))) {
          return true;
        }
      }
    }
    for (CoilSet.Interval range : search.practical().intervals()) {
      double coils = Math.max(range.from(), search.family().fewestCoils());
      for (; coils < range.to(); coils *= CLOSE) {
        if (holdsAt(coils)) {
          return true;
        }
      }
    }
    return false;
  }

  private boolean holdsAt(double coils) {
    return coils > 0 && search.holdsBut(LimitName.COIL_STEP, coils);
  }
}
