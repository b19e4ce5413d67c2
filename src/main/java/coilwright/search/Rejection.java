package coilwright.search;

import coilwright.limit.CoilSet;
import coilwright.limit.Finding;
import coilwright.problem.LimitName;
import coilwright.spring.State;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** Why a wire has no candidate. */
final class Rejection<S extends State> {

  private final WireSearch<S> search;
  private final Limits left;
  private Reason reason;
  private Conflict conflict;
  private Set<LimitName> ruledOutBy;

  Rejection(WireSearch<S> search) {
    this.search = search;
    this.left = search.left();
  }

  /**
   * The limits counted against the wire: those that alone keep it out, else all in conflict; worked
   * out once.
   */
  Set<LimitName> ruledOutBy() {
    if (ruledOutBy == null) {
      Set<LimitName> decisive = new Decisive<>(search).limits();
      ruledOutBy = decisive.isEmpty() ? Conflict.names(reason().parts()) : decisive;
    }
    return ruledOutBy;
  }

  /** The limits that cannot hold together, each with all that it leaves; worked out once. */
  Conflict conflict() {
    if (conflict == null) {
      List<Conflict.Part> parts = new ArrayList<>();
      for (Conflict.Part part : reason().parts()) {
        parts.add(reason().rounded() ? part : whole(part));
      }
      conflict = new Conflict(search.family().wire(), search.family().endForm(), parts);
    }
    return conflict;
  }

  /**
   * Why there is none.
   *
   * @param parts the limits, each with what was looked for of it
   * @param rounded whether only rounding keeps the wire out
   */
  private record Reason(List<Conflict.Part> parts, boolean rounded) {}

  private Reason reason() {
    if (reason == null) {
      List<Conflict.Part> parts = new Explanation(sets()).parts();
      reason =
          parts.isEmpty()
              ? new Reason(new Explanation(afterRounding()).parts(), true)
              : new Reason(parts, false);
    }
    return reason;
  }

  /** A part with all that its limit leaves by itself, bounds included that others outdo. */
  private Conflict.Part whole(Conflict.Part part) {
    return new Conflict.Part(part.limit(), search.alone(part.limit()));
  }

  /**
   * What each limit leaves. Where one leaves ranges apart, bounds that others outdo may cross with
   * it, so that every bound is looked for.
   */
  private Map<LimitName, CoilSet> sets() {
    boolean apart = left.exact().values().stream().anyMatch(set -> set.intervals().size() > 1);
    return apart ? everySet() : left.exact();
  }

  private Map<LimitName, CoilSet> everySet() {
    Map<LimitName, CoilSet> sets = new EnumMap<>(LimitName.class);
    search.limits().forEach(limit -> sets.computeIfAbsent(limit.name(), search::alone));
    return sets;
  }

  /**
   * What the limits leave where unrounded springs exist but no practical one: inside the range that
   * they leave together only practical counts are left, and of these, to each limit, those at which
   * the rounded spring holds it.
   */
  private Map<LimitName, CoilSet> afterRounding() {
    CoilSet range = search.bounded(Limits.together(left.exact()));
    Map<LimitName, CoilSet> sets = everySet();
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
}
