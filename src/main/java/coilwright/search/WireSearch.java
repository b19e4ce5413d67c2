package coilwright.search;

import coilwright.limit.CoilSet;
import coilwright.limit.Finding;
import coilwright.limit.Limit;
import coilwright.limit.Trail;
import coilwright.problem.LimitName;
import coilwright.spring.Family;
import coilwright.spring.State;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/**
 * Searches one wire: what every limit leaves of its family, the practical counts in what they leave
 * together, and each of those judged afresh after rounding.
 */
final class WireSearch<S extends State> {

  private final Trail<S> family;
  private final List<Limit<S>> limits;
  private final CoilStep step;
  private final Limits left;

  WireSearch(Family<S> family, List<Limit<S>> limits, CoilStep step) {
    this.family = new Trail<>(family);
    this.limits = limits;
    this.step = step;
    this.left = Limits.of(limits, this.family, step);
  }

  Outcome<S> outcome() {
    List<Candidate<S>> candidates = candidates();
    if (!candidates.isEmpty()) {
      return new Outcome<>(candidates, Optional.empty(), EnumSet.noneOf(LimitName.class));
    }
    Conflict conflict = conflict();
    return new Outcome<>(List.of(), Optional.of(conflict), ruledOutBy(conflict));
  }

  private List<Candidate<S>> candidates() {
    List<Candidate<S>> held = new ArrayList<>();
    for (double coils : step.in(bounded(Limits.together(left.practical())))) {
      judged(coils).filter(Candidate::holds).ifPresent(held::add);
    }
    return held;
  }

  private CoilSet bounded(CoilSet set) {
    return set.intersect(CoilSet.of(0, family.mostCoils()));
  }

  private Optional<Candidate<S>> judged(double coils) {
    return family.rounded(coils).map(state -> Candidate.judge(state, limits));
  }

  private Conflict conflict() {
    List<Conflict.Part> parts = new Explanation(left.exact()).parts();
    if (parts.isEmpty()) {
      parts = new Explanation(afterRounding()).parts();
    }
    return new Conflict(family.wire(), family.endForm(), parts);
  }

  /**
   * What the limits leave where unrounded springs exist but no practical one: inside the range that
   * they leave together only practical counts are left, and of these, to each limit, those at which
   * the rounded spring holds it.
   */
  private Map<LimitName, CoilSet> afterRounding() {
    CoilSet range = bounded(Limits.together(left.exact()));
    CoilSet practical = step.around(range.least(), range.greatest());
    Map<LimitName, CoilSet> sets = new EnumMap<>(left.exact());
    sets.put(LimitName.COIL_STEP, practical);
    for (double coils : step.in(range)) {
      judged(coils)
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
    for (LimitName name : left.exact().keySet()) {
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

  private boolean holdsWithout(LimitName name) {
    CoilSet others = bounded(Limits.without(left.practical(), name));
    return step.in(others).stream().anyMatch(coils -> holdsAt(coils, name));
  }

  private boolean holdsAt(double coils, LimitName ignored) {
    return judged(coils)
        .filter(
            candidate ->
                candidate.findings().stream()
                    .allMatch(finding -> finding.holds() || finding.check().limit() == ignored))
        .isPresent();
  }

  /**
   * Whether some count that is no multiple of the step would do: the ends and middles are tried.
   */
  private boolean holdsBetweenSteps() {
    for (CoilSet.Interval range : bounded(Limits.together(left.exact())).intervals()) {
      for (double share : new double[] {0.5, 0, 1, 0.25, 0.75}) {
        double coils = range.from() + share * (range.to() - range.from());
        if (coils > 0 && judged(coils).filter(Candidate::holds).isPresent()) {
          return true;
        }
      }
    }
    return false;
  }
}
