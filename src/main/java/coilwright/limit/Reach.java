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
    double[] cuts = cuts(limit, trail);
    List<CoilSet.Interval> held = new ArrayList<>(1);
    boolean before = holds(limit, trail, cuts[0]);
    double from = 0;
    for (int i = 1; i < cuts.length; i++) {
      boolean after = holds(limit, trail, cuts[i]);
      if (before && !after) {
        held.add(new CoilSet.Interval(from, root(limit, trail, cuts[i - 1], cuts[i])));
      } else if (!before && after) {
        from = root(limit, trail, cuts[i - 1], cuts[i]);
      }
      before = after;
    }
    if (before) {
      held.add(new CoilSet.Interval(from, Double.POSITIVE_INFINITY));
    }
    return new CoilSet(held);
  }

  /** The ends of the family and the turns between them, rising. */
  private static <S extends State> double[] cuts(Limit<S> limit, Trail<S> trail) {
    double low = trail.fewestCoils();
    double high = trail.mostCoils();
    double[] turns = limit.turns(trail);
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
    return new Bracket<>(limit, trail, trail.countAt(low), trail.countAt(high)).root();
  }
}
