package coilwright.limit;

import coilwright.spring.State;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Finds the coil counts that a limit leaves of a family: the family is cut where the margin may
 * turn, and between two cuts of which only one holds the one root is isolated.
 */
public final class Reach {

  /**
   * Just below and just above where a root is expected: nearer to each other than a root is known.
   */
  private static final double[] BESIDE = {1 - 4e-11, 1 + 4e-11};

  private Reach() {}

  /**
   * The coil counts of unrounded springs that hold a limit.
   *
   * @param limit the limit
   * @param trail the family, with the states computed so far
   * @param <S> the state of the kind of spring
   * @return the set; an end that reaches the end of the family's range is open
   */
  public static <S extends State> CoilSet of(Limit<S> limit, Trail<S> trail) {
    return within(limit, trail, trail.fewestCoils(), trail.mostCoils());
  }

  /**
   * The coil counts of unrounded springs that hold a limit, without looking for a bound that does
   * not matter: where the limit has a single bound and holds at the near end of a range, or leaves
   * a single interval and holds at both ends, it holds throughout the range, and its bounds are
   * taken for open.
   *
   * @param limit the limit
   * @param trail the family, with the states computed so far
   * @param lower lower end of the range that matters [-]
   * @param upper upper end of the range that matters [-], below the lower end or above it
   * @param <S> the state of the kind of spring
   * @return the set; {@link CoilSet#ALL} where its bound does not matter
   */
  public static <S extends State> CoilSet within(
      Limit<S> limit, Trail<S> trail, double lower, double upper) {
    double[] cuts = cuts(limit, trail);
    boolean[] held = new boolean[cuts.length];
    int changes = 0;
    for (int i = 0; i < cuts.length; i++) {
      held[i] = holds(limit, trail, cuts[i]);
      changes += i > 0 && held[i] != held[i - 1] ? 1 : 0;
    }
    if (changes == 1 && holds(limit, trail, held[0] ? upper : lower)) {
      return CoilSet.ALL;
    }
    if (changes == 2 && !held[0] && holds(limit, trail, lower) && holds(limit, trail, upper)) {
      return CoilSet.ALL;
    }
    return changes == 0 ? held[0] ? CoilSet.ALL : CoilSet.EMPTY : union(limit, trail, cuts, held);
  }

  private static <S extends State> CoilSet union(
      Limit<S> limit, Trail<S> trail, double[] cuts, boolean[] held) {
    List<CoilSet.Interval> intervals = new ArrayList<>(1);
    double from = 0;
    for (int i = 1; i < cuts.length; i++) {
      if (held[i - 1] && !held[i]) {
        intervals.add(new CoilSet.Interval(from, root(limit, trail, cuts[i - 1], cuts[i])));
      } else if (!held[i - 1] && held[i]) {
        from = root(limit, trail, cuts[i - 1], cuts[i]);
      }
    }
    if (held[cuts.length - 1]) {
      intervals.add(new CoilSet.Interval(from, Double.POSITIVE_INFINITY));
    }
    return new CoilSet(intervals);
  }

  /** The ends of the family and the turns between them, rising. */
  private static <S extends State> double[] cuts(Limit<S> limit, Trail<S> trail) {
    double low = trail.fewestCoils();
    double high = trail.mostCoils();
    double[] turns = trail.turnsOf(limit);
    double[] cuts = new double[turns.length + 2];
    int count = 0;
    cuts[count++] = low;
    for (double turn : turns) {
      if (turn > low && turn < high) {
        cuts[count++] = turn;
      }
    }
    cuts[count++] = high;
    Arrays.sort(cuts, 0, count);
    return Arrays.copyOf(cuts, count);
  }

  private static <S extends State> boolean holds(Limit<S> limit, Trail<S> trail, double coils) {
    return limit.judge(trail.at(coils)).holds();
  }

  /**
   * The one root between two counts of which one holds; springs already computed close in on it.
   */
  private static <S extends State> double root(
      Limit<S> limit, Trail<S> trail, double from, double to) {
    int low = trail.indexOf(from);
    int high = trail.indexOf(to);
    boolean holdsAtFrom = limit.judge(trail.states().get(low)).holds();
    while (high - low > 1) {
      int middle = (low + high) >>> 1;
      if (limit.judge(trail.states().get(middle)).holds() == holdsAtFrom) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return around(limit, trail, trail.countAt(low), trail.countAt(high), holdsAtFrom);
  }

  /** Closes in on the root from both sides of where it is expected, where a closed form says so. */
  private static <S extends State> double around(
      Limit<S> limit, Trail<S> trail, double from, double to, boolean holdsAtFrom) {
    double low = from;
    double high = to;
    double expected = limit.expected(trail, from, to);
    for (double side : BESIDE) {
      double coils = expected * side;
      if (coils > low && coils < high) {
        boolean before = holds(limit, trail, coils) == holdsAtFrom;
        low = before ? coils : low;
        high = before ? high : coils;
      }
    }
    return new Bracket<>(limit, trail, low, high).root();
  }
}
