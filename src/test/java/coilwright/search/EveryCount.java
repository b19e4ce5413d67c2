package coilwright.search;

import coilwright.limit.Finding;
import coilwright.limit.Limit;
import coilwright.problem.LimitName;
import coilwright.spring.CompressionFamily;
import coilwright.spring.CompressionState;
import coilwright.spring.Family;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * What a scan of every practical coil count finds of one wire, without any reasoning about where
 * its springs may lie. It ends where the most compressed load is below the solid length, which no
 * dropped limit lets through.
 *
 * @param held the counts whose rounded springs hold every limit
 * @param decisive the removable limits without which some count would hold
 */
record EveryCount(List<Double> held, Set<LimitName> decisive) {

  private static final double BEYOND = 1 + 1e-6;

  static EveryCount of(Searched wire) {
    EveryCount found = new EveryCount(new ArrayList<>(), EnumSet.noneOf(LimitName.class));
    double last = last(wire.family());
    BigDecimal step = BigDecimal.valueOf(wire.coilStep());
    for (BigDecimal n = step; n.doubleValue() <= last; n = n.add(step)) {
      found.take(wire, n.doubleValue());
    }
    found.reshaped(wire, last);
    return found;
  }

  /** Where the lengths are open, springs that keep nothing before solid are other springs. */
  private void reshaped(Searched wire, double last) {
    Family<CompressionState> other = wire.family().keepingNothing();
    if (other == wire.family() || !held.isEmpty()) {
      return;
    }
    List<Limit<CompressionState>> others = new ArrayList<>(wire.limits());
    if (!others.removeIf(limit -> limit.name() == LimitName.CLASH_ALLOWANCE)) {
      return;
    }
    BigDecimal step = BigDecimal.valueOf(wire.coilStep());
    for (BigDecimal n = step; n.doubleValue() <= last; n = n.add(step)) {
      if (other
          .rounded(n.doubleValue())
          .filter(spring -> failed(others, spring).isEmpty())
          .isPresent()) {
        decisive.add(LimitName.CLASH_ALLOWANCE);
        return;
      }
    }
  }

  /** The last count that need be looked at. */
  static double last(CompressionFamily family) {
    double most = family.mostCoils();
    if (family.freeLength().isEmpty()) {
      return most;
    }
    double fitting = family.at(most).mostCompressed().length() / family.wire().diameter();
    return Math.min(most, fitting * BEYOND);
  }

  private void take(Searched wire, double coils) {
    Optional<Set<LimitName>> failed = failed(wire, coils);
    if (failed.isEmpty()) {
      return;
    }
    if (failed.get().isEmpty()) {
      held.add(coils);
    } else if (failed.get().size() == 1) {
      failed.get().stream().filter(LimitName::removable).forEach(decisive::add);
    }
  }

  /** The limits that the rounded spring of a count fails; empty where there is no such spring. */
  static Optional<Set<LimitName>> failed(Searched wire, double coils) {
    return wire.family().rounded(coils).map(spring -> failed(wire.limits(), spring));
  }

  private static Set<LimitName> failed(
      List<Limit<CompressionState>> limits, CompressionState spring) {
    Set<LimitName> failed = EnumSet.noneOf(LimitName.class);
    for (Finding finding : Candidate.judge(spring, limits).findings()) {
      if (!finding.holds()) {
        failed.add(finding.check().limit());
      }
    }
    return failed;
  }
}
