package coilwright.search;

import coilwright.limit.CompressionLimits;
import coilwright.limit.Limit;
import coilwright.material.Wire;
import coilwright.problem.CompressionDesign;
import coilwright.problem.Design;
import coilwright.problem.DesignLimits;
import coilwright.problem.LoadAsked;
import coilwright.problem.Problem;
import coilwright.problem.Requirement;
import coilwright.spring.CompressionFamily;
import coilwright.spring.CompressionSpring;
import coilwright.spring.CompressionState;
import coilwright.spring.Duty;
import coilwright.spring.EndType;
import coilwright.spring.LoadPoint;
import coilwright.spring.Seating;
import coilwright.spring.Travel;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** The search for compression springs: a problem's wires and ends as families, and its limits. */
public final class CompressionSearch implements Synthesis<CompressionState> {

  @Override
  public List<CompressionFamily> families(Problem problem, List<Wire> wires) {
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

  @Override
  public int endForms(Problem problem) {
    return problem.make().ends().size();
  }

  @Override
  public CoilStep step(Problem problem) {
    return new CoilStep(problem.make().coilStep());
  }

  @Override
  public List<Limit<CompressionState>> limits(Problem problem) {
    return CompressionLimits.of(problem, problem.required().orElseThrow().completed());
  }

  @Override
  public CompressionState designed(Problem problem, Design design, Wire wire) {
    CompressionDesign asked = (CompressionDesign) design;
    Seating seating = problem.seats().orElse(Seating.usualFor(asked.ends()));
    return new CompressionState(
        new CompressionSpring(
            wire, asked.meanDiameter(), asked.coils(), asked.freeLength(), asked.ends()),
        new Duty(
            checkLoads(problem),
            problem.limits().stressCorrection(),
            seating,
            problem.limits().method(),
            problem.coating(),
            problem.overtravel(),
            Optional.empty()));
  }

  @Override
  public List<Limit<CompressionState>> checkLimits(Problem problem) {
    List<LoadPoint> loads = checkLoads(problem);
    return CompressionLimits.of(problem, loads, freeLength(problem, loads));
  }

  /** The loads of one spring; where the facts fix the load line, it completes them. */
  private static List<LoadPoint> checkLoads(Problem problem) {
    if (problem.required().isPresent()) {
      return problem.required().get().completed();
    }
    int parallel = problem.facts().springsInParallel();
    return problem.facts().loads().stream().map(load -> point(load, parallel)).toList();
  }

  /** Where one load and another fact fix the line, the free length that follows is asked too. */
  private static OptionalDouble freeLength(Problem problem, List<LoadPoint> loads) {
    return loads.size() == 1
        ? problem.required().map(Requirement::freeLength).orElse(OptionalDouble.empty())
        : OptionalDouble.empty();
  }

  private static LoadPoint point(LoadAsked load, int parallel) {
    OptionalDouble force = load.force();
    return new LoadPoint(
        load.length(),
        force.isPresent() ? OptionalDouble.of(force.getAsDouble() / parallel) : force);
  }
}
