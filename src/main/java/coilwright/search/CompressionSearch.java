package coilwright.search;

import coilwright.limit.CompressionLimits;
import coilwright.limit.Limit;
import coilwright.material.Wire;
import coilwright.problem.Problem;
import coilwright.problem.Requirement;
import coilwright.spring.CompressionFamily;
import coilwright.spring.CompressionState;
import coilwright.spring.Duty;
import coilwright.spring.EndType;
import coilwright.spring.Seating;
import java.util.ArrayList;
import java.util.List;

/** The search for compression springs: a problem's wires and ends as families, and its limits. */
public final class CompressionSearch {

  private CompressionSearch() {}

  /**
   * Searches.
   *
   * @param problem a problem that fixes the load line
   * @param choice the wires it offers
   * @return the answer
   */
  public static Answer<CompressionState> run(Problem problem, WireChoice choice) {
    return Search.run(
        families(problem, choice.wires()),
        limits(problem),
        new CoilStep(problem.make().coilStep()),
        choice.outsideRange() * problem.make().ends().size());
  }

  /**
   * One family for each wire and end type.
   *
   * @param problem a problem that fixes the load line
   * @param wires the wires
   * @return the families, in the order of wires, then ends
   */
  public static List<CompressionFamily> families(Problem problem, List<Wire> wires) {
    Requirement required = problem.required().orElseThrow();
    List<CompressionFamily> families = new ArrayList<>();
    for (Wire wire : wires) {
      for (EndType ends : problem.make().ends()) {
        Seating seating = problem.seats().orElse(Seating.usualFor(ends));
        Duty duty = new Duty(required.loads(), problem.limits().stressCorrection(), seating);
        families.add(
            new CompressionFamily(wire, ends, required.line(), duty, problem.make().rounding()));
      }
    }
    return families;
  }

  /**
   * The limits of a problem.
   *
   * @param problem a problem that fixes the load line
   * @return its limits
   */
  public static List<Limit<CompressionState>> limits(Problem problem) {
    return CompressionLimits.of(problem, problem.required().orElseThrow().loads());
  }
}
