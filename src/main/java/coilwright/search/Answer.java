package coilwright.search;

import coilwright.problem.LimitName;
import coilwright.spring.State;
import java.util.List;
import java.util.Map;

/**
 * What a search found.
 *
 * @param wires how many wires were tried
 * @param feasible every wire with candidates: its candidates, fewest coils first
 * @param ruledOut how many wires each limit rules out
 * @param conflicts why each wire without a candidate has none
 * @param <S> the state of the kind of spring
 */
public record Answer<S extends State>(
    int wires,
    List<List<Candidate<S>>> feasible,
    Map<LimitName, Integer> ruledOut,
    List<Conflict> conflicts) {

  /** How many candidates there are, all coil counts of all wires. */
  public int candidates() {
    return feasible.stream().mapToInt(List::size).sum();
  }
}
