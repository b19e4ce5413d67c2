package coilwright.search;

import coilwright.limit.CoilSet;
import coilwright.limit.Limit;
import coilwright.limit.Reach;
import coilwright.limit.Trail;
import coilwright.problem.LimitName;
import coilwright.spring.Family;
import coilwright.spring.State;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * Searches one wire: what every limit leaves of its family, the practical counts in what they leave
 * together, and each of those judged afresh after rounding.
 */
final class WireSearch<S extends State> {

  private final Family<S> source;
  private final Trail<S> family;
  private final List<Limit<S>> limits;
  private final CoilStep step;
  private final Limits left;
  private final CoilSet practical;
  private final Set<LimitName> failedAlone = EnumSet.noneOf(LimitName.class);

  WireSearch(Family<S> family, List<Limit<S>> limits, CoilStep step) {
    this.source = family;
    this.family = new Trail<>(family);
    this.limits = limits;
    this.step = step;
    this.left = Limits.of(limits, this.family, step);
    this.practical = bounded(Limits.together(left.practical()));
  }

  Outcome<S> outcome() {
    List<Candidate<S>> candidates = candidates();
    return candidates.isEmpty() ? Outcome.of(new Rejection<>(this)) : Outcome.of(candidates);
  }

  private List<Candidate<S>> candidates() {
    List<Candidate<S>> held = new ArrayList<>();
    for (double coils : step.in(practical)) {
      judged(coils).ifPresent(spring -> take(spring, held));
    }
    return held;
  }

  private void take(Candidate<S> spring, List<Candidate<S>> held) {
    Set<LimitName> failed = spring.failed();
    if (failed.isEmpty()) {
      held.add(spring);
    } else if (failed.size() == 1) {
      failedAlone.addAll(failed);
    }
  }

  /** The limits that some practical spring judged so far fails as the only one. */
  Set<LimitName> failedAlone() {
    return failedAlone;
  }

  /** The part of a set in which the family has springs. */
  CoilSet bounded(CoilSet set) {
    return set.intersect(CoilSet.of(0, family.mostCoils()));
  }

  /** The rounded spring of a coil count, held to every limit; empty where rounding leaves none. */
  Optional<Candidate<S>> judged(double coils) {
    return family.rounded(coils).map(state -> Candidate.judge(state, limits));
  }

  /**
   * Whether the rounded spring of a coil count holds every limit but what may be dropped of one.
   */
  boolean holdsBut(LimitName dropped, double coils) {
    Optional<S> state = family.rounded(coils);
    if (state.isEmpty()) {
      return false;
    }
    for (Limit<S> limit : limits) {
      boolean asked = limit.name() != dropped || !limit.removable();
      if (asked && !limit.judge(state.get()).holds()) {
        return false;
      }
    }
    return true;
  }

  /** Whether dropping a limit makes other springs, of which some practical one would do. */
  boolean holdsReshaped(Limit<S> dropped) {
    Family<S> other = dropped.dropped(source);
    if (other == source) {
      return false;
    }
    List<Limit<S>> others = new ArrayList<>(limits);
    others.removeIf(limit -> limit.name() == dropped.name() && limit.removable());
    return Limits.mayMeet(others, new Trail<>(other), step)
        && !new WireSearch<>(other, others, step).candidates().isEmpty();
  }

  /** What a limit leaves by itself of the unrounded springs: all its bounds together. */
  CoilSet alone(LimitName name) {
    CoilSet set = CoilSet.ALL;
    for (Limit<S> limit : limits) {
      if (limit.name() == name && !limit.onlyAfterRounding()) {
        set = set.intersect(Reach.of(limit, family));
      }
    }
    return set;
  }

  /** What each limit leaves. */
  Limits left() {
    return left;
  }

  /** Where a rounded spring may hold every limit. */
  CoilSet practical() {
    return practical;
  }

  /** The practical counts. */
  CoilStep step() {
    return step;
  }

  /** The limits. */
  List<Limit<S>> limits() {
    return limits;
  }

  /** The family searched. */
  Family<S> family() {
    return family;
  }
}
