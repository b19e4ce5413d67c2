package coilwright.search;

import coilwright.limit.CoilSet;
import coilwright.limit.Limit;
import coilwright.limit.Loosened;
import coilwright.limit.Reach;
import coilwright.limit.Trail;
import coilwright.problem.LimitName;
import coilwright.spring.State;
import java.util.EnumMap;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.DoubleUnaryOperator;

/**
 * What each limit leaves of one family, by name: a name stands for all its bounds, and a name that
 * leaves everything is left out. A bound that two other limits outdo on the same side is not looked
 * for: it can neither decide with the others nor once one of them is dropped.
 *
 * @param exact the coil counts of unrounded springs that hold the limit
 * @param practical the counts at which a rounded spring may hold it: never fewer
 * @param kept the same for those bounds alone that stay where a limit is dropped
 */
record Limits(
    Map<LimitName, CoilSet> exact,
    Map<LimitName, CoilSet> practical,
    Map<LimitName, CoilSet> kept) {

  /** How many times the family's rounding share a margin may miss and still be judged rounded. */
  private static final double NEARLY = 10;

  /** How far to either side of a bound rounding is asked for, as a ratio of coil counts. */
  private static final double AROUND = 1.3;

  /** What a margin may differ at a turn that was found by sampling [-]. */
  private static final double SAMPLED = 0.02;

  /**
   * Asks every limit.
   *
   * @param limits the limits
   * @param trail the family
   * @param step the practical counts
   */
  static <S extends State> Limits of(List<Limit<S>> limits, Trail<S> trail, CoilStep step) {
    Map<LimitName, CoilSet> exact = new EnumMap<>(LimitName.class);
    Map<LimitName, CoilSet> practical = new EnumMap<>(LimitName.class);
    Map<LimitName, CoilSet> kept = new EnumMap<>(LimitName.class);
    Window window = new Window(trail.fewestCoils(), trail.mostCoils());
    for (Limit<S> limit : limits) {
      CoilSet set =
          limit.onlyAfterRounding()
              ? CoilSet.ALL
              : Reach.within(limit, trail, window.lower(), window.upper());
      if (!set.isAll()) {
        window.narrow(limit.name(), set);
        exact.merge(limit.name(), set, CoilSet::intersect);
        CoilSet wider = widened(limit, set, trail, step);
        practical.merge(limit.name(), wider, CoilSet::intersect);
        if (!limit.removable()) {
          kept.merge(limit.name(), wider, CoilSet::intersect);
        }
      }
    }
    return new Limits(exact, practical, kept);
  }

  /** Where a rounded spring may hold all limits but one, and of that one the bounds that stay. */
  CoilSet dropping(LimitName name) {
    return without(practical, name).intersect(kept.getOrDefault(name, CoilSet.ALL));
  }

  /**
   * Whether the limits may leave a rounded spring: asked one after another until they leave none.
   *
   * @param limits the limits
   * @param trail the family
   * @param step the practical counts
   */
  static <S extends State> boolean mayMeet(List<Limit<S>> limits, Trail<S> trail, CoilStep step) {
    CoilSet left = CoilSet.of(0, trail.mostCoils());
    for (Limit<S> limit : limits) {
      if (!limit.onlyAfterRounding()) {
        CoilSet set = Reach.within(limit, trail, inRange(left.least(), trail), left.greatest());
        left = set.isAll() ? left : left.intersect(widened(limit, set, trail, step));
      }
      if (left.isEmpty()) {
        return false;
      }
    }
    return true;
  }

  /** What all names leave together. */
  static CoilSet together(Map<LimitName, CoilSet> sets) {
    return without(sets, null);
  }

  /** What all names but one leave together. */
  static CoilSet without(Map<LimitName, CoilSet> sets, LimitName left) {
    CoilSet shared = CoilSet.ALL;
    for (Map.Entry<LimitName, CoilSet> entry : sets.entrySet()) {
      if (entry.getKey() != left) {
        shared = shared.intersect(entry.getValue());
        if (shared.isEmpty()) {
          return shared;
        }
      }
    }
    return shared;
  }

  /**
   * The name that begins last and the one that ends first, where nothing lies between: one and the
   * same where it leaves nothing. Empty where they meet.
   */
  static Set<LimitName> crossing(Map<LimitName, CoilSet> sets) {
    LimitName last = null;
    LimitName first = null;
    double least = 0;
    double greatest = Double.POSITIVE_INFINITY;
    for (Map.Entry<LimitName, CoilSet> entry : sets.entrySet()) {
      if (entry.getValue().least() > least) {
        least = entry.getValue().least();
        last = entry.getKey();
      }
      if (entry.getValue().greatest() < greatest) {
        greatest = entry.getValue().greatest();
        first = entry.getKey();
      }
    }
    return least > greatest ? EnumSet.of(last, first) : EnumSet.noneOf(LimitName.class);
  }

  /**
   * Widens a set by what rounding can move, at least one coil step. Where the margin turns nearer
   * to zero than rounding can move it, or every unrounded spring fails by less than that, the bound
   * is moved by as much before.
   */
  private static <S extends State> CoilSet widened(
      Limit<S> limit, CoilSet set, Trail<S> trail, CoilStep step) {
    double missing = Math.max(grazing(limit, trail), set.isEmpty() ? nearly(limit, trail) : 0);
    CoilSet near = missing > 0 ? Reach.of(new Loosened<>(limit, missing), trail) : set;
    return near.widen(coils -> step.size() + play(coils, trail));
  }

  /**
   * How far the margin may miss at a turn and still be judged rounded, where it turns that near to
   * zero. Turns may be sampled, so that the margin is not quite what it comes to there.
   */
  private static <S extends State> double grazing(Limit<S> limit, Trail<S> trail) {
    double greatest = 0;
    for (double coils : trail.turnsOf(limit)) {
      if (inRange(coils, trail) == coils) {
        S state = trail.at(coils);
        double near = SAMPLED + limit.sensitivity(state) * blur(coils, trail);
        if (Math.abs(limit.judge(state).margin()) <= near) {
          greatest = Math.max(greatest, near);
        }
      }
    }
    return greatest;
  }

  /** The same where springs computed so far fail by no more than rounding can move. */
  private static <S extends State> double nearly(Limit<S> limit, Trail<S> trail) {
    double greatest = 0;
    for (S known : trail.states()) {
      double near = limit.sensitivity(known) * blur(known.coils(), trail);
      if (limit.judge(known).margin() >= -near) {
        greatest = Math.max(greatest, near);
      }
    }
    return greatest;
  }

  private static double blur(double coils, Trail<?> trail) {
    return NEARLY * around(coils, trail, trail::roundingShare);
  }

  /** Twice what the family says, for a straight-line estimate falls short where margins bend. */
  private static double play(double coils, Trail<?> trail) {
    return 2 * around(coils, trail, trail::play);
  }

  /**
   * The greater of an estimate on either side of a count: the steps of rounding may change there.
   */
  private static double around(double coils, Trail<?> trail, DoubleUnaryOperator estimate) {
    return Math.max(
        estimate.applyAsDouble(inRange(coils / AROUND, trail)),
        estimate.applyAsDouble(inRange(coils * AROUND, trail)));
  }

  private static double inRange(double coils, Trail<?> trail) {
    return Math.min(trail.mostCoils(), Math.max(trail.fewestCoils(), coils));
  }
}
