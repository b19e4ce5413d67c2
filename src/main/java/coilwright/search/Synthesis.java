package coilwright.search;

import coilwright.limit.Limit;
import coilwright.material.Wire;
import coilwright.problem.Design;
import coilwright.problem.Problem;
import coilwright.spring.Family;
import coilwright.spring.State;
import java.util.List;

/**
 * What is particular to one kind of spring in search and check: how wires become families, and what
 * its springs are held to.
 *
 * @param <S> the state of the kind of spring
 */
public interface Synthesis<S extends State> {

  /**
   * One family for each wire and end form that has springs at all.
   *
   * @param problem a problem that fixes the load line
   * @param wires the wires
   * @return the families, in the order of wires, then ends
   */
  List<? extends Family<S>> families(Problem problem, List<Wire> wires);

  /**
   * Why the other wires and end forms have no spring at any coil count.
   *
   * @param problem a problem that fixes the load line
   * @param wires the wires
   * @return one conflict for each, with the one limit that no coil count meets
   */
  default List<Conflict> impossible(Problem problem, List<Wire> wires) {
    return List.of();
  }

  /**
   * How many end forms a problem offers of each wire.
   *
   * @param problem the problem
   * @return 1 or more
   */
  int endForms(Problem problem);

  /**
   * The practical coil counts.
   *
   * @param problem the problem
   * @return the counts that may be made
   */
  CoilStep step(Problem problem);

  /**
   * The limits of a search.
   *
   * @param problem a problem that fixes the load line
   * @return its limits, each bound once, always in the same order
   */
  List<Limit<S>> limits(Problem problem);

  /**
   * The spring to check, at its loads.
   *
   * @param problem the problem
   * @param design its design, of this kind
   * @param wire the design's wire
   * @return its state
   */
  S designed(Problem problem, Design design, Wire wire);

  /**
   * The limits that the spring to check is held to.
   *
   * @param problem a problem with a design
   * @return its limits
   */
  List<Limit<S>> checkLimits(Problem problem);

  /**
   * Searches.
   *
   * @param problem a problem that fixes the load line
   * @param choice the wires it offers
   * @return the answer
   */
  default Answer<S> search(Problem problem, WireChoice choice) {
    return Search.run(
        families(problem, choice.wires()),
        impossible(problem, choice.wires()),
        limits(problem),
        step(problem),
        choice.outsideRange() * endForms(problem));
  }
}
