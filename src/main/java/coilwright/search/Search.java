package coilwright.search;

import coilwright.limit.Limit;
import coilwright.problem.LimitName;
import coilwright.spring.Family;
import coilwright.spring.State;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;

/** The search: every wire's family against every limit. */
public final class Search {

  private Search() {}

  /**
   * Finds every practical spring of every family.
   *
   * @param families one for each wire
   * @param limits the limits
   * @param step the practical coil counts
   * @param outsideRange how many wires were left out because their grade has no data for them
   * @param <S> the state of the kind of spring
   * @return candidates, and the reasons where there are none
   */
  public static <S extends State> Answer<S> run(
      List<? extends Family<S>> families, List<Limit<S>> limits, CoilStep step, int outsideRange) {
    List<List<Candidate<S>>> feasible = new ArrayList<>();
    List<Rejection<S>> rejections = new ArrayList<>();
    Map<LimitName, Integer> ruledOut = new EnumMap<>(LimitName.class);
    if (outsideRange > 0) {
      ruledOut.put(LimitName.WIRE_RANGE, outsideRange);
    }
    for (Family<S> family : families) {
      Outcome<S> outcome = new WireSearch<>(family, limits, step).outcome();
      if (outcome.candidates().isEmpty()) {
        outcome.ruledOutBy().forEach(name -> ruledOut.merge(name, 1, Integer::sum));
        outcome.rejection().ifPresent(rejections::add);
      } else {
        feasible.add(outcome.candidates());
      }
    }
    return new Answer<>(families.size(), feasible, ruledOut, new Conflicts(rejections));
  }
}
