package coilwright.search;

import coilwright.limit.Finding;
import coilwright.limit.Limit;
import coilwright.problem.LimitName;
import coilwright.spring.State;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;

/**
 * A spring and what every limit finds of it.
 *
 * @param state the spring at its loads
 * @param findings one for each bound, in the order of the limits
 * @param <S> the state of the kind of spring
 */
public record Candidate<S extends State>(S state, List<Finding> findings) {

  private static final Set<LimitName> STRESSES =
      EnumSet.of(
          LimitName.STRESS_AT_LOAD,
          LimitName.STRESS_AT_SOLID,
          LimitName.BODY_STRESS,
          LimitName.HOOK_BENDING_STRESS,
          LimitName.HOOK_TORSION_STRESS,
          LimitName.BENDING_STRESS);

  /** Copies the list. */
  public Candidate {
    findings = List.copyOf(findings);
  }

  /**
   * Holds a spring to every limit.
   *
   * @param state the spring at its loads
   * @param limits the limits
   * @param <S> the state of the kind of spring
   * @return the spring with its findings, whether it holds them or not
   */
  public static <S extends State> Candidate<S> judge(S state, List<Limit<S>> limits) {
    List<Finding> findings = new ArrayList<>(limits.size());
    for (Limit<S> limit : limits) {
      findings.add(limit.judge(state));
    }
    return new Candidate<>(state, findings);
  }

  /** Whether it holds every limit. */
  public boolean holds() {
    for (Finding finding : findings) {
      if (!finding.holds()) {
        return false;
      }
    }
    return true;
  }

  /** The limits it fails. */
  Set<LimitName> failed() {
    Set<LimitName> failed = EnumSet.noneOf(LimitName.class);
    for (Finding finding : findings) {
      if (!finding.holds()) {
        failed.add(finding.check().limit());
      }
    }
    return failed;
  }

  /** The smallest margin over the stress checks [-]; empty where no stress is judged. */
  public OptionalDouble leastMargin() {
    double least = Double.POSITIVE_INFINITY;
    for (Finding finding : findings) {
      if (STRESSES.contains(finding.check().limit()) && finding.hasMargin()) {
        least = Math.min(least, finding.margin());
      }
    }
    return least < Double.POSITIVE_INFINITY ? OptionalDouble.of(least) : OptionalDouble.empty();
  }

  /** The check with the smallest margin; empty where none has a margin. */
  public Optional<Finding> limiting() {
    Finding least = null;
    for (Finding finding : findings) {
      if (finding.hasMargin() && (least == null || finding.margin() < least.margin())) {
        least = finding;
      }
    }
    return Optional.ofNullable(least);
  }
}
