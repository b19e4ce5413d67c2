package coilwright.search;

import coilwright.limit.Check;
import coilwright.limit.Finding;
import coilwright.limit.Side;
import coilwright.material.Catalogue;
import coilwright.material.DiameterRange;
import coilwright.material.WireGrade;
import coilwright.problem.Design;
import coilwright.problem.LimitName;
import coilwright.problem.Problem;
import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.spring.State;
import coilwright.unit.Dimension;
import java.util.Optional;

/**
 * The judging of one given spring.
 *
 * @param grade the grade it is made of
 * @param outOfRange the finding against a wire for which the grade has no data
 * @param spring the spring with its findings; empty only where the grade has no data for its wire
 * @param <S> the state of the kind of spring
 */
public record SpringCheck<S extends State>(
    WireGrade grade, Optional<Finding> outOfRange, Optional<Candidate<S>> spring) {

  private static final Citation DATA =
      Citation.seen(Source.FIRST_PRINCIPLES, "no data, no strength");

  /**
   * Judges a problem's design.
   *
   * @param problem a problem with a design
   * @param kind what is particular to its kind of spring
   * @param catalogue the grades known
   * @param <S> the state of the kind of spring
   * @return what was found
   */
  public static <S extends State> SpringCheck<S> of(
      Problem problem, Synthesis<S> kind, Catalogue catalogue) {
    Design design = problem.design().orElseThrow();
    WireGrade grade = grade(problem, design.material(), catalogue);
    Optional<Finding> outside = outOfRange(grade.diameters(), design.wireSize().diameter());
    if (outside.isPresent()) {
      return new SpringCheck<>(grade, outside, Optional.empty());
    }
    S state = kind.designed(problem, design, grade.drawnTo(design.wireSize()));
    return new SpringCheck<>(
        grade, Optional.empty(), Optional.of(Candidate.judge(state, kind.checkLimits(problem))));
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
}
