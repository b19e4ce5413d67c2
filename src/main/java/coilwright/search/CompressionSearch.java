package coilwright.search;

import coilwright.limit.CompressionLimits;
import coilwright.limit.Limit;
import coilwright.material.Wire;
import coilwright.problem.DesignLimits;
import coilwright.problem.Problem;
import coilwright.problem.Requirement;
import coilwright.spring.CompressionFamily;
import coilwright.spring.CompressionState;
import coilwright.spring.Duty;
import coilwright.spring.EndType;
import coilwright.spring.Seating;
import coilwright.spring.Travel;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

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
        families.add(
            new CompressionFamily(
                wire,
                ends,
                required.rate(),
                required.freeLength(),
                duty(problem, required, seating),
                problem.make().rounding()));
      }
    }
    return families;
  }

  private static Duty duty(Problem problem, Requirement required, Seating seating) {
    DesignLimits limits = problem.limits();
    OptionalDouble deflection = required.greatestDeflection();
    return new Duty(
        required.completed(),
        limits.stressCorrection(),
        seating,
        limits.method(),
        problem.coating(),
        problem.overtravel(),
        deflection.isPresent()
            ? Optional.of(
                new Travel(deflection.getAsDouble(), limits.clashAllowance(), limits.gapSum()))
            : Optional.empty());
  }

  /**
   * The limits of a problem.
   *
   * @param problem a problem that fixes the load line
   * @return its limits
   */
  public static List<Limit<CompressionState>> limits(Problem problem) {
    return CompressionLimits.of(problem, problem.required().orElseThrow().completed());
  }
}
