package coilwright.search;

import coilwright.limit.CoilSet;
import coilwright.unit.Require;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;

/**
 * The practical coil counts: the positive multiples of a step, reckoned in decimal.
 *
 * @param size the step [-]
 */
public record CoilStep(double size) {

  private static final double TOLERANCE = 1e-9;

  /** Refuses a step that is not positive and finite. */
  public CoilStep {
    Require.positive(size, "coil step", "-");
  }

  /**
   * The practical counts in a set, its bounds included.
   *
   * @param set the set, bounded above
   * @return the counts, rising
   */
  public List<Double> in(CoilSet set) {
    List<Double> counts = new ArrayList<>();
    for (CoilSet.Interval interval : set.intervals()) {
      long last = (long) Math.floor(interval.to() / size + TOLERANCE);
      for (long k = first(interval.from()); k <= last; k++) {
        counts.add(times(k));
      }
    }
    return counts;
  }

  /**
   * The practical counts on and around a range: those inside and the nearest on either side.
   *
   * @param from the least of the range [-]
   * @param to the greatest of the range [-]
   * @return a set of single counts
   */
  public CoilSet around(double from, double to) {
    List<CoilSet.Interval> counts = new ArrayList<>();
    long first = Math.max(1, (long) Math.floor(from / size));
    long last = (long) Math.ceil(to / size);
    for (long k = first; k <= last; k++) {
      counts.add(new CoilSet.Interval(times(k), times(k)));
    }
    return new CoilSet(counts);
  }

  private long first(double from) {
    return Math.max(1, (long) Math.ceil(from / size - TOLERANCE));
  }

  private double times(long k) {
    return BigDecimal.valueOf(size).multiply(BigDecimal.valueOf(k)).doubleValue();
  }
}
