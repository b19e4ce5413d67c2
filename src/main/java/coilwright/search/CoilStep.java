package coilwright.search;

import coilwright.limit.CoilSet;
import coilwright.unit.Require;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.function.DoublePredicate;

/**
 * The practical coil counts: the positive multiples of a step, or those that lie an offset beyond
 * one, reckoned in decimal.
 */
public final class CoilStep {

  private static final double TOLERANCE = 1e-9;

  private final double size;
  private final BigDecimal decimal;
  private final double offset;
  private final BigDecimal decimalOffset;

  /**
   * A step.
   *
   * @param size the step [-]
   * @throws IllegalArgumentException if it is not positive and finite
   */
  public CoilStep(double size) {
    this(size, 0);
  }

  /**
   * A step whose counts lie beyond its multiples.
   *
   * @param size the step [-]
   * @param offset how far beyond each multiple, zero itself included [-]
   * @throws IllegalArgumentException if the step is not positive and finite, or the offset is not
   *     from zero to below the step
   */
  public CoilStep(double size, double offset) {
    this.size = Require.positive(size, "coil step", "-");
    if (!(offset >= 0 && offset < size)) {
      throw new IllegalArgumentException("coil offset: " + offset + " - must be below the step");
    }
    this.decimal = BigDecimal.valueOf(size);
    this.offset = offset;
    this.decimalOffset = BigDecimal.valueOf(offset);
  }

  /** The step [-]. */
  public double size() {
    return size;
  }

  /** How far the counts lie beyond its multiples [-]. */
  public double offset() {
    return offset;
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
      for (long k = first(interval); k <= last(interval); k++) {
        counts.add(times(k));
      }
    }
    return counts;
  }

  /**
   * Whether any practical count in a set will do; they are tried in rising order until one does.
   *
   * @param set the set, bounded above
   * @param will whether a count will do
   * @return true if one does
   */
  boolean any(CoilSet set, DoublePredicate will) {
    for (CoilSet.Interval interval : set.intervals()) {
      for (long k = first(interval); k <= last(interval); k++) {
        if (will.test(times(k))) {
          return true;
        }
      }
    }
    return false;
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
    long first = Math.max(least(), (long) Math.floor((from - offset) / size));
    long last = (long) Math.ceil((to - offset) / size);
    for (long k = first; k <= last; k++) {
      counts.add(new CoilSet.Interval(times(k), times(k)));
    }
    return new CoilSet(counts);
  }

  /** The multiple whose count is the first above zero. */
  private long least() {
    return offset > 0 ? 0 : 1;
  }

  private long first(CoilSet.Interval interval) {
    return Math.max(least(), (long) Math.ceil((interval.from() - offset) / size - TOLERANCE));
  }

  private long last(CoilSet.Interval interval) {
    return (long) Math.floor((interval.to() - offset) / size + TOLERANCE);
  }

  private double times(long k) {
    return decimal.multiply(BigDecimal.valueOf(k)).add(decimalOffset).doubleValue();
  }
}
