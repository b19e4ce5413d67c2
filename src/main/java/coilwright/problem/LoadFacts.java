package coilwright.problem;

import java.util.List;
import java.util.OptionalDouble;

/**
 * Everything the problem file says about the load line, for the whole group of springs.
 *
 * @param loads the loads in file order
 * @param rate R of the group [N/mm], where given
 * @param freeLength L0 [mm], where given
 * @param stroke between the least and the greatest load [mm], where given; from the free length to
 *     the load where there is only one
 * @param springsInParallel how many equal springs share the loads, 1 or more
 */
public record LoadFacts(
    List<LoadAsked> loads,
    OptionalDouble rate,
    OptionalDouble freeLength,
    OptionalDouble stroke,
    int springsInParallel) {

  /** Copies the list. */
  public LoadFacts {
    loads = List.copyOf(loads);
  }
}
