package coilwright.problem;

import java.util.List;
import java.util.Optional;

/**
 * What came of reading a problem file.
 *
 * @param problem the problem; empty if there is any fault
 * @param faults every fault, in file order; where there are more than 50, the first 50 and one line
 *     that says how many more
 */
public record Reading(Optional<Problem> problem, List<Fault> faults) {

  /** Copies the list. */
  public Reading {
    faults = List.copyOf(faults);
  }
}
