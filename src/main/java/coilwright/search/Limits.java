package coilwright.search;

import coilwright.limit.CoilSet;
import coilwright.limit.Limit;
import coilwright.limit.Reach;
import coilwright.limit.Trail;
import coilwright.problem.LimitName;
import coilwright.spring.State;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;

/**
 * What each limit leaves of one family, by name: a name stands for all its bounds, and a name that
 * leaves everything is left out. A bound that two other limits outdo on the same side is not looked
 * for: it can neither decide with the others nor once one of them is dropped.
 *
 * @param exact the coil counts of unrounded springs that hold the limit
 * @param practical the counts at which a rounded spring may hold it: never fewer
 */
record Limits(Map<LimitName, CoilSet> exact, Map<LimitName, CoilSet> practical) {

  private static final double NEARLY = 10;

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
    Window window = new Window(trail.fewestCoils(), trail.mostCoils());
    for (Limit<S> limit : limits) {
      CoilSet set =
          limit.onlyAfterRounding()
              ? CoilSet.ALL
              : Reach.within(limit, trail, window.lower(), window.upper());
      if (!set.isAll()) {
        window.narrow(limit.name(), set);
        exact.merge(limit.name(), set, CoilSet::intersect);
        practical.merge(limit.name(), widened(limit, set, trail, step), CoilSet::intersect);
      }
    }
    return new Limits(exact, practical);
  }

  /** What all names leave together. */
  static CoilSet together(Map<LimitName, CoilSet> sets) {
    CoilSet shared = CoilSet.ALL;
    for (CoilSet set : sets.values()) {
      shared = shared.intersect(set);
    }
    return shared;
  }

  /** What all names but one leave together. */
  static CoilSet without(Map<LimitName, CoilSet> sets, LimitName left) {
    CoilSet shared = CoilSet.ALL;
    for (Map.Entry<LimitName, CoilSet> entry : sets.entrySet()) {
      if (entry.getKey() != left) {
        shared = shared.intersect(entry.getValue());
      }
    }
    return shared;
  }

  /**
   * Widens a set by what rounding can move, at least one coil step. A limit that every unrounded
   * spring fails, but some by less than rounding can move, is left to the judging of the rounded
   * springs.
   */
  private static <S extends State> CoilSet widened(
      Limit<S> limit, CoilSet set, Trail<S> trail, CoilStep step) {
    if (!set.isEmpty()) {
      return set.widen(coils -> step.size() + trail.play(inRange(coils, trail)));
    }
    for (S known : trail.states()) {
      double blur = NEARLY * trail.roundingShare(known.coils());
      if (limit.judge(known).margin() >= -blur) {
        return CoilSet.ALL;
      }
    }
    return CoilSet.EMPTY;
  }

  private static double inRange(double coils, Trail<?> trail) {
    return Math.min(trail.mostCoils(), Math.max(trail.fewestCoils(), coils));
  }
}
