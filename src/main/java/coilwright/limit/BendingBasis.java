package coilwright.limit;

import coilwright.material.AllowableClass;
import coilwright.problem.StressLimit;
import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.spring.Method;
import coilwright.spring.TorqueState;

/**
 * Whose static allowables apply to torsion springs: shares of tensile strength, each with the
 * bending stress it is meant for. They are no {@link StressBasis}: a wire bears more in bending
 * than in torsion, so that neither may stand in for the other, and a grade's own shares, meant for
 * torsion, are not looked at.
 */
public enum BendingBasis {
  /** Handbook shares for springs that are stress-relieved after coiling, on the inner stress. */
  HANDBOOK(
      "with the inner factor Ki",
      Citation.remembered(
          Source.NORTON, "torsion springs, static, stress-relieved, inner stress")) {
    @Override
    double share(AllowableClass allowableClass) {
      return switch (allowableClass) {
        case COLD_DRAWN_CARBON -> 0.80;
        case HARDENED_TEMPERED -> 0.85;
        case AUSTENITIC_STAINLESS, NON_FERROUS -> 0.60;
      };
    }

    @Override
    double stress(TorqueState load) {
      return load.correctedBendingStress();
    }
  },
  /**
   * The one share of EN 13906-3 for static loads, on the uncorrected stress. Sources disagree: 0.70
   * is remembered, pages on the standard print 0.75. The safer one applies; the other can be set in
   * the file.
   */
  EN_13906(
      "uncorrected",
      Citation.remembered(
          Source.EN_13906_3, "permissible static stress, 0.70 Rm; pages on it print 0.75 Rm")) {
    @Override
    double share(AllowableClass allowableClass) {
      return 0.70;
    }

    @Override
    double stress(TorqueState load) {
      return load.bendingStress();
    }
  };

  /** What is left of a share where the loads unwind the spring: coiling has left stress there. */
  static final double OPENING = 0.80;

  private static final Citation FILE = Citation.seen(Source.PROBLEM_FILE, "limits");

  private final String definition;
  private final Citation closing;
  private final Citation opening;

  BendingBasis(String definition, Citation citation) {
    this.definition = definition;
    this.closing = citation;
    this.opening =
        new Citation(
            citation.source(),
            citation.locator() + "; less 20 % when opening",
            citation.evidence());
  }

  /**
   * The basis that a problem's choice comes to.
   *
   * @param method whose rules apply
   * @return the basis
   */
  public static BendingBasis of(Method method) {
    return method == Method.EN_13906 ? EN_13906 : HANDBOOK;
  }

  abstract double share(AllowableClass allowableClass);

  /** The stress of a load that the shares are meant for [MPa]. */
  abstract double stress(TorqueState load);

  /** Which stress that is, in words. */
  public String definition() {
    return definition;
  }

  /**
   * The bound that applies: the file's as it stands, else the basis's, lowered where the spring
   * opens.
   *
   * @param limit what the file says of the bending stress
   * @param allowableClass the grade's class
   * @param winding whether the loads wind the spring up
   * @return the bound
   */
  public Allowable allowable(StressLimit limit, AllowableClass allowableClass, boolean winding) {
    if (limit.share().isPresent()) {
      return new Allowable(limit.share().getAsDouble(), FILE);
    }
    return winding
        ? new Allowable(share(allowableClass), closing)
        : new Allowable(OPENING * share(allowableClass), opening);
  }
}
