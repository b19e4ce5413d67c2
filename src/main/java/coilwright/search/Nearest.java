package coilwright.search;

import coilwright.limit.CoilSet;

/**
 * The two coil counts at which two sets come closest to each other.
 *
 * @param inFirst a count of the first set [-]; NaN where either set is empty
 * @param inSecond a count of the second set [-]; NaN where either set is empty
 */
public record Nearest(double inFirst, double inSecond) {

  /**
   * Finds them.
   *
   * @param first a set
   * @param second a set that shares no count with it
   * @return the counts
   */
  public static Nearest of(CoilSet first, CoilSet second) {
    Nearest nearest = new Nearest(Double.NaN, Double.NaN);
    double least = Double.POSITIVE_INFINITY;
    for (CoilSet.Interval mine : first.intervals()) {
      for (CoilSet.Interval theirs : second.intervals()) {
        double gap = Math.max(mine.from() - theirs.to(), theirs.from() - mine.to());
        if (gap < least) {
          least = gap;
          nearest =
              mine.from() > theirs.to()
                  ? new Nearest(mine.from(), theirs.to())
                  : new Nearest(mine.to(), theirs.from());
        }
      }
    }
    return nearest;
  }

  /**
   * How far apart they are: the larger over the smaller, less one [-]; NaN where a set is empty.
   */
  public double apart() {
    return Math.max(inFirst, inSecond) / Math.min(inFirst, inSecond) - 1;
  }
}
