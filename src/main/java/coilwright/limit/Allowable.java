package coilwright.limit;

import coilwright.material.WireGrade;
import coilwright.problem.StressLimit;
import coilwright.source.Citation;
import coilwright.source.Source;
import java.util.OptionalDouble;

/**
 * A static stress bound as a share of tensile strength.
 *
 * @param share of Rm [-]
 * @param source where the share comes from
 */
public record Allowable(double share, Citation source) {

  private static final Citation FILE = Citation.seen(Source.PROBLEM_FILE, "limits");
  private static final Citation OWN = Citation.seen(Source.PROBLEM_FILE, "own_materials");

  /**
   * The bound on the stress at the most compressed load.
   *
   * @param limit what the file says
   * @param grade the grade
   * @param basis whose allowables apply where neither says
   * @return the bound
   */
  public static Allowable atLoad(StressLimit limit, WireGrade grade, StressBasis basis) {
    return of(limit, grade, grade.stressAtLoad(), basis);
  }

  /**
   * The bound on the stress at solid.
   *
   * @param limit what the file says
   * @param grade the grade
   * @param basis whose allowables apply where neither says
   * @return the bound
   */
  public static Allowable atSolid(StressLimit limit, WireGrade grade, StressBasis basis) {
    return of(limit, grade, grade.stressAtSolid(), basis);
  }

  /** The bound that applies: the file's, else the grade's own, else the basis's. */
  private static Allowable of(
      StressLimit limit, WireGrade grade, OptionalDouble own, StressBasis basis) {
    if (limit.share().isPresent()) {
      return new Allowable(limit.share().getAsDouble(), FILE);
    }
    return own.isPresent()
        ? new Allowable(own.getAsDouble(), OWN)
        : new Allowable(basis.share(grade.allowableClass()), basis.citation());
  }
}
