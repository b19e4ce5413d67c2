package coilwright.report;

import coilwright.limit.CoilSet;
import coilwright.material.Wire;
import coilwright.search.Conflict;
import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;

/** Conflicts in plain words. */
final class Reasons {

  private Reasons() {}

  /**
   * "1.40 mm music-wire, squared ends: stress at load needs at least 9.2 coils, solid length allows
   * at most 7.5 coils".
   *
   * @param conflict the conflict
   * @param ends the words for an end form
   */
  static String of(Conflict conflict, UnaryOperator<String> ends) {
    List<String> parts = new ArrayList<>();
    for (Conflict.Part part : conflict.parts()) {
      parts.add(part(part));
    }
    return wire(conflict, ends) + ": " + String.join(", ", parts);
  }

  private static String wire(Conflict conflict, UnaryOperator<String> ends) {
    Wire wire = conflict.wire();
    return Wires.size(wire) + " " + Wires.markedGrade(wire) + ", " + ends.apply(conflict.endForm());
  }

  private static String part(Conflict.Part part) {
    return switch (part.limit()) {
      case LEGS -> "the legs alone are softer than the rate";
      case HOOKS -> "the hooks alone are softer than the rate";
      default -> part.limit().text() + " " + coils(part.coils());
    };
  }

  private static String coils(CoilSet set) {
    if (set.isEmpty()) {
      return "holds at no coil count";
    }
    if (set.intervals().size() == 1) {
      return single(set.intervals().get(0));
    }
    return "holds only at "
        + String.join(" or ", set.intervals().stream().map(Reasons::range).toList())
        + " coils";
  }

  private static String single(CoilSet.Interval interval) {
    if (interval.from() == 0 && interval.to() == Double.POSITIVE_INFINITY) {
      return "allows any count";
    }
    if (interval.to() == Double.POSITIVE_INFINITY) {
      return "needs at least " + count(interval.from()) + " coils";
    }
    if (interval.from() == 0) {
      return "allows at most " + count(interval.to()) + " coils";
    }
    return "holds only at " + range(interval) + " coils";
  }

  private static String range(CoilSet.Interval interval) {
    if (interval.from() == interval.to()) {
      return count(interval.from());
    }
    if (interval.to() == Double.POSITIVE_INFINITY) {
      return count(interval.from()) + " and more";
    }
    return count(interval.from()) + " to " + count(interval.to());
  }

  private static String count(double coils) {
    return Numbers.brief(coils, coils < 100 ? 2 : 0);
  }
}
