package coilwright.limit;

import coilwright.material.AllowableClass;
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

  /** Static compression, before set removal, on the corrected stress. */
  static final Citation HANDBOOK =
      Citation.remembered(Source.SHIGLEY, "table 10-6, before set removal, corrected stress");

  private static final Citation FILE = Citation.seen(Source.PROBLEM_FILE, "limits");
  private static final Citation OWN = Citation.seen(Source.PROBLEM_FILE, "own_materials");

  /**
   * The bound on the stress at the most compressed load.
   *
   * @param limit what the file says
   * @param grade the grade
   * @return the bound
   */
  public static Allowable atLoad(StressLimit limit, WireGrade grade) {
    return of(limit, grade, grade.stressAtLoad());
  }

  /**
   * The bound on the stress at solid.
   *
   * @param limit what the file says
   * @param grade the grade
   * @return the bound
   */
  public static Allowable atSolid(StressLimit limit, WireGrade grade) {
    return of(limit, grade, grade.stressAtSolid());
  }

  /**
   * The bound that applies: the file's, else the grade's own, else the handbook's.
   *
   * @param limit what the file says
   * @param grade the grade
   * @param own the grade's own share for this check, where it has one
   * @return the bound
   */
  private static Allowable of(StressLimit limit, WireGrade grade, OptionalDouble own) {
    if (limit.share().isPresent()) {
      return new Allowable(limit.share().getAsDouble(), FILE);
    }
    return own.isPresent()
        ? new Allowable(own.getAsDouble(), OWN)
        : new Allowable(handbookShare(grade.allowableClass()), HANDBOOK);
  }

  private static double handbookShare(AllowableClass allowableClass) {
    return switch (allowableClass) {
      case COLD_DRAWN_CARBON -> 0.45;
      case HARDENED_TEMPERED -> 0.50;
      case AUSTENITIC_STAINLESS, NON_FERROUS -> 0.35;
    };
  }
}
