package coilwright.search;

import coilwright.limit.CoilSet;
import coilwright.limit.Finding;
import coilwright.problem.LimitName;
import coilwright.spring.State;
import java.util.EnumMap;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** Why a wire has no candidate, and which limits alone keep it out. */
final class Rejection<S extends State> {

  private static final double[] TRIED_BETWEEN_STEPS = {0.5, 0, 1, 0.25, 0.75};

  private final WireSearch<S> search;
  private final Limits left;

  Rejection(WireSearch<S> search) {
    this.search = search;
    this.left = search.left();
  }

  Outcome<S> outcome() {
    Conflict conflict = conflict();
    return new Outcome<>(List.of(), Optional.of(conflict), ruledOutBy(conflict));
  }

  private Conflict conflict() {
    List<Conflict.Part> parts = new Explanation(left.exact()).parts();
    if (parts.isEmpty()) {
      parts = new Explanation(afterRounding()).parts();
    }
    return new Conflict(search.family().wire(), search.family().endForm(), parts);
  }

  /**
   * What the limits leave where unrounded springs exist but no practical one: inside the range that
   * they leave together only practical counts are left, and of these, to each limit, those at which
   * the rounded spring holds it.
   */
  private Map<LimitName, CoilSet> afterRounding() {
    CoilSet range = search.bounded(Limits.together(left.exact()));
    Map<LimitName, CoilSet> sets = new EnumMap<>(left.exact());
    sets.put(LimitName.COIL_STEP, search.step().around(range.least(), range.greatest()));
    for (double coils : search.step().in(range)) {
      search
          .judged(coils)
          .ifPresentOrElse(
              candidate -> candidate.findings().forEach(finding -> takeOut(sets, finding, coils)),
              () -> sets.merge(LimitName.COIL_STEP, without(coils), CoilSet::intersect));
    }
    return sets;
  }

  private static void takeOut(Map<LimitName, CoilSet> sets, Finding finding, double coils) {
    if (!finding.holds()) {
      LimitName name = finding.check().limit();
      CoilSet before = sets.getOrDefault(name, CoilSet.ALL);
      sets.put(name, before.intersect(without(coils)));
    }
  }

  /** Every count but one. */
  private static CoilSet without(double coils) {
    return new CoilSet(
        List.of(
            new CoilSet.Interval(0, Math.nextDown(coils)),
            new CoilSet.Interval(Math.nextUp(coils), Double.POSITIVE_INFINITY)));
  }

  /**
   * The limits whose removal alone lets the wire through; where there is none, those in conflict.
   */
  private Set<LimitName> ruledOutBy(Conflict conflict) {
    Set<LimitName> decisive = EnumSet.noneOf(LimitName.class);
    for (LimitName name : suspects()) {
      if (name.removable() && holdsWithout(name)) {
        decisive.add(name);
      }
    }
    if (holdsBetweenSteps()) {
      decisive.add(LimitName.COIL_STEP);
    }
    if (decisive.isEmpty()) {
      conflict.parts().forEach(part -> decisive.add(part.limit()));
    }
    return decisive;
  }

  /** The limits that may decide: those that leave less than all, or any that rounding may break. */
  private Set<LimitName> suspects() {
    if (Limits.together(left.practical()).isEmpty()) {
      return left.exact().keySet();
    }
    Set<LimitName> every = EnumSet.noneOf(LimitName.class);
    search.limits().forEach(limit -> every.add(limit.name()));
    return every;
  }

  private boolean holdsWithout(LimitName name) {
    CoilSet others = search.bounded(Limits.without(left.practical(), name));
    for (double coils : search.step().in(others)) {
      if (search.holdsBut(name, coils)) {
        return true;
      }
    }
    return false;
  }

  /** Whether some count that is no multiple of the step would do: ends and middles are tried. */
  private boolean holdsBetweenSteps() {
    CoilSet ranges = search.bounded(Limits.together(left.exact()));
    for (CoilSet.Interval range : ranges.intervals()) {
      for (double share : TRIED_BETWEEN_STEPS) {
        double coils = range.from() + share * (range.to() - range.from());
        if (coils > 0 && search.holdsBut(LimitName.COIL_STEP, coils)) {
          return true;
        }
      }
    }
    return false;
  }
}
