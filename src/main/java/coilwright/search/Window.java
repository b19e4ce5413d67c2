package coilwright.search;

import coilwright.limit.CoilSet;
import coilwright.problem.LimitName;

/**
 * The range of coil counts that still matters while limits are asked one after another: it ends on
 * either side at the second tightest bound of two different limits, since with the tightest one
 * dropped that one decides.
 */
final class Window {

  private LimitName highest;
  private LimitName lowest;
  private double tightestLower;
  private double tightestUpper;
  private double lower;
  private double upper;

  Window(double fewest, double most) {
    lower = fewest;
    upper = most;
    tightestLower = fewest;
    tightestUpper = most;
  }

  /** The second greatest lower bound [-]. */
  double lower() {
    return lower;
  }

  /** The second least upper bound [-]. */
  double upper() {
    return upper;
  }

  /** Takes a limit's set into account. */
  void narrow(LimitName name, CoilSet set) {
    if (set.isEmpty()) {
      return;
    }
    raise(name, set.least());
    drop(name, set.greatest());
  }

  private void raise(LimitName name, double bound) {
    if (name == highest) {
      tightestLower = Math.max(tightestLower, bound);
    } else if (bound > tightestLower) {
      lower = highest == null ? lower : tightestLower;
      tightestLower = bound;
      highest = name;
    } else {
      lower = Math.max(lower, bound);
    }
  }

  private void drop(LimitName name, double bound) {
    if (name == lowest) {
      tightestUpper = Math.min(tightestUpper, bound);
    } else if (bound < tightestUpper) {
      upper = lowest == null ? upper : tightestUpper;
      tightestUpper = bound;
      lowest = name;
    } else {
      upper = Math.min(upper, bound);
    }
  }
}
