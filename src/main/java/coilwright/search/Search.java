package coilwright.search;

import coilwright.limit.Limit;
import coilwright.problem.LimitName;
import coilwright.spring.Family;
import coilwright.spring.State;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;

/** The search: every wire's family against every limit. */
public final class Search {

  /** From how many wires on the processors share them: with fewer, sharing takes longer. */
  private static final int MANY = 500;

  private Search() {}

  /**
   * Finds every practical spring of every family.
   *
   * @param families one for each wire
   * @param impossible why further wires have no spring at any coil count
   * @param limits the limits
   * @param step the practical coil counts
   * @param outsideRange how many wires were left out because their grade has no data for them
   * @param <S> the state of the kind of spring
   * @return candidates, and the reasons where there are none
   */
  public static <S extends State> Answer<S> run(
      List<? extends Family<S>> families,
      List<Conflict> impossible,
      List<Limit<S>> limits,
      CoilStep step,
      int outsideRange) {
    List<List<Candidate<S>>> feasible = new ArrayList<>();
    List<Conflict> conflicts = new ArrayList<>();
    Map<LimitName, Integer> ruledOut = new EnumMap<>(LimitName.class);
    if (outsideRange > 0) {
      ruledOut.put(LimitName.WIRE_RANGE, outsideRange);
    }
    for (Outcome<S> outcome : outcomes(families, limits, step)) {
      outcome.ruledOutBy().forEach(name -> ruledOut.merge(name, 1, Integer::sum));
      outcome.conflict().ifPresent(conflicts::add);
      if (outcome.conflict().isEmpty()) {
        feasible.add(outcome.candidates());
      }
    }
    for (Conflict conflict : impossible) {
      conflict.limits().forEach(name -> ruledOut.merge(name, 1, Integer::sum));
      conflicts.add(conflict);
    }
    return new Answer<>(families.size() + impossible.size(), feasible, ruledOut, conflicts);
  }

  /** One for each family, in their order, whatever the number of processors. */
  private static <S extends State> List<Outcome<S>> outcomes(
      List<? extends Family<S>> families, List<Limit<S>> limits, CoilStep step) {
    IntStream places = IntStream.range(0, families.size());
    return (families.size() < MANY ? places : places.parallel())
        .mapToObj(place -> new WireSearch<S>(families.get(place), limits, step).outcome())
        .toList();
  }
}
