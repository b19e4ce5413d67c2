package coilwright.search;

import coilwright.limit.Check;
import coilwright.limit.CompressionLimits;
import coilwright.limit.Finding;
import coilwright.limit.Side;
import coilwright.material.Catalogue;
import coilwright.material.DiameterRange;
import coilwright.material.WireGrade;
import coilwright.problem.CompressionDesign;
import coilwright.problem.LimitName;
import coilwright.problem.LoadAsked;
import coilwright.problem.Problem;
import coilwright.problem.Requirement;
import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.spring.CompressionSpring;
import coilwright.spring.CompressionState;
import coilwright.spring.Duty;
import coilwright.spring.LoadPoint;
import coilwright.spring.Seating;
import coilwright.unit.Dimension;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The judging of one given spring.
 *
 * @param grade the grade it is made of
 * @param outOfRange the finding against a wire for which the grade has no data
 * @param spring the spring with its findings; empty only where the grade has no data for its wire
 */
public record CompressionCheck(
    WireGrade grade, Optional<Finding> outOfRange, Optional<Candidate<CompressionState>> spring) {

  private static final Citation DATA =
      Citation.seen(Source.FIRST_PRINCIPLES, "no data, no strength");

  /**
   * Judges a problem's design.
   *
   * @param problem a problem with a design
   * @param catalogue the grades known
   * @return what was found
   */
  public static CompressionCheck of(Problem problem, Catalogue catalogue) {
    CompressionDesign design = (CompressionDesign) problem.design().orElseThrow();
    WireGrade grade = grade(problem, design.material(), catalogue);
    Optional<Finding> outside = outOfRange(grade.diameters(), design.wireSize().diameter());
    if (outside.isPresent()) {
      return new CompressionCheck(grade, outside, Optional.empty());
    }
    List<LoadPoint> loads = loads(problem);
    CompressionState state = state(problem, design, grade, loads);
    return new CompressionCheck(
        grade,
        Optional.empty(),
        Optional.of(
            Candidate.judge(
                state, CompressionLimits.of(problem, loads, freeLength(problem, loads)))));
  }

  /** Whether the spring holds everything. */
  public boolean holds() {
    return spring.filter(Candidate::holds).isPresent();
  }

  private static WireGrade grade(Problem problem, String id, Catalogue catalogue) {
    return problem.ownMaterials().stream()
        .filter(own -> own.id().equals(id))
        .findFirst()
        .orElseGet(() -> catalogue.grade(id));
  }

  private static Optional<Finding> outOfRange(DiameterRange range, double diameter) {
    if (range.contains(diameter)) {
      return Optional.empty();
    }
    boolean thin = diameter < range.min();
    Check check =
        new Check(
            LimitName.WIRE_RANGE,
            thin ? Side.MIN : Side.MAX,
            Dimension.LENGTH,
            "wire diameter, against the diameters the grade has data for");
    return Optional.of(Finding.of(check, diameter, thin ? range.min() : range.max(), DATA));
  }

  /** The loads of one spring; where the facts fix the load line, it completes them. */
  private static List<LoadPoint> loads(Problem problem) {
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

  private static CompressionState state(
      Problem problem, CompressionDesign design, WireGrade grade, List<LoadPoint> loads) {
    Seating seating = problem.seats().orElse(Seating.usualFor(design.ends()));
    return new CompressionState(
        new CompressionSpring(
            grade.drawnTo(design.wireSize()),
            design.meanDiameter(),
            design.coils(),
            design.freeLength(),
            design.ends()),
        new Duty(
            loads,
            problem.limits().stressCorrection(),
            seating,
            problem.limits().method(),
            problem.coating(),
            problem.overtravel(),
            Optional.empty()));
  }
}
