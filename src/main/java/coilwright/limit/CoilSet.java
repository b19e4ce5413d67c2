package coilwright.limit;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleUnaryOperator;

/**
 * A set of coil counts: a union of closed intervals, rising and apart. An end of 0 or of positive
 * infinity is open: nothing bounds the set there.
 *
 * @param intervals the intervals
 */
public record CoilSet(List<Interval> intervals) {

  /** No coil count. */
  public static final CoilSet EMPTY = new CoilSet(List.of());

  /** Every coil count. */
  public static final CoilSet ALL = of(0, Double.POSITIVE_INFINITY);

  /** Copies the list. */
  public CoilSet {
    intervals = List.copyOf(intervals);
  }

  /**
   * A closed interval of coil counts.
   *
   * @param from the least [-]
   * @param to the greatest [-], not below the least
   */
  public record Interval(double from, double to) {

    /** Refuses an interval that ends before it begins. */
    public Interval {
      if (!(from <= to)) {
        throw new IllegalArgumentException("interval from " + from + " to " + to + " coils");
      }
    }
  }

  /**
   * One interval.
   *
   * @param from the least coil count [-]
   * @param to the greatest [-]
   * @return the set
   */
  public static CoilSet of(double from, double to) {
    return new CoilSet(List.of(new Interval(from, to)));
  }

  /** Whether it holds no coil count. */
  public boolean isEmpty() {
    return intervals.isEmpty();
  }

  /** Whether it holds every coil count. */
  public boolean isAll() {
    return intervals.size() == 1
        && intervals.get(0).from() == 0
        && intervals.get(0).to() == Double.POSITIVE_INFINITY;
  }

  /** The least coil count [-]; positive infinity for the empty set. */
  public double least() {
    return isEmpty() ? Double.POSITIVE_INFINITY : intervals.get(0).from();
  }

  /** The greatest coil count [-]; negative infinity for the empty set. */
  public double greatest() {
    return isEmpty() ? Double.NEGATIVE_INFINITY : intervals.get(intervals.size() - 1).to();
  }

  /**
   * What two sets share.
   *
   * @param other the other set
   * @return their intersection
   */
  public CoilSet intersect(CoilSet other) {
    if (isAll() || isEmpty()) {
      return isAll() ? other : this;
    }
    if (other.isAll() || other.isEmpty()) {
      return other.isAll() ? this : other;
    }
    List<Interval> shared = new ArrayList<>(1);
    for (Interval mine : intervals) {
      for (Interval theirs : other.intervals) {
        double from = Math.max(mine.from(), theirs.from());
        double to = Math.min(mine.to(), theirs.to());
        if (from <= to) {
          shared.add(new Interval(from, to));
        }
      }
    }
    return new CoilSet(shared);
  }

  /**
   * Moves every bound outward; intervals that come to touch are joined.
   *
   * @param play by how much, given the bound [-]
   * @return the wider set
   */
  public CoilSet widen(DoubleUnaryOperator play) {
    List<Interval> wider = new ArrayList<>(1);
    for (Interval interval : intervals) {
      double from = lower(interval.from(), play);
      double to = upper(interval.to(), play);
      int last = wider.size() - 1;
      if (last >= 0 && wider.get(last).to() >= from) {
        wider.set(last, new Interval(wider.get(last).from(), Math.max(to, wider.get(last).to())));
      } else {
        wider.add(new Interval(from, to));
      }
    }
    return new CoilSet(wider);
  }

  private static double lower(double bound, DoubleUnaryOperator play) {
    return bound == 0 ? 0 : Math.max(0, bound - play.applyAsDouble(bound));
  }

  private static double upper(double bound, DoubleUnaryOperator play) {
    return bound == Double.POSITIVE_INFINITY ? bound : bound + play.applyAsDouble(bound);
  }

  /**
   * How far apart two sets are.
   *
   * @param other the other set
   * @return the least distance between a count of one and a count of the other [-]; 0 where they
   *     share one, positive infinity where either is empty
   */
  public double distanceTo(CoilSet other) {
    double apart = Math.max(least() - other.greatest(), other.least() - greatest());
    if (apart > 0 || intervals.size() == 1 && other.intervals.size() == 1) {
      return Math.max(0, apart);
    }
    double least = Double.POSITIVE_INFINITY;
    for (Interval mine : intervals) {
      for (Interval theirs : other.intervals) {
        double gap = Math.max(mine.from() - theirs.to(), theirs.from() - mine.to());
        least = Math.min(least, Math.max(0, gap));
      }
    }
    return least;
  }
}
