package coilwright.limit;

import coilwright.material.AllowableClass;
import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.spring.Method;

/**
 * Whose static allowables apply to compression springs: shares of tensile strength, each with the
 * stress it is meant for.
 */
public enum StressBasis {
  /** Handbook shares before set removal, on the corrected stress. */
  HANDBOOK(
      Citation.remembered(Source.SHIGLEY, "table 10-6, before set removal, corrected stress"),
      StressMeaning.CORRECTED) {
    @Override
    public double share(AllowableClass allowableClass) {
      return switch (allowableClass) {
        case COLD_DRAWN_CARBON -> 0.45;
        case HARDENED_TEMPERED -> 0.50;
        case AUSTENITIC_STAINLESS, NON_FERROUS -> 0.35;
      };
    }
  },
  /** Handbook shares after set removal, the least of each range, on direct shear alone. */
  HANDBOOK_SET_REMOVED(
      Citation.remembered(Source.SHIGLEY, "table 10-6, after set removal, stress times 1 + 0.5/C"),
      StressMeaning.DIRECT_SHEAR) {
    @Override
    public double share(AllowableClass allowableClass) {
      return switch (allowableClass) {
        case COLD_DRAWN_CARBON -> 0.60;
        case HARDENED_TEMPERED -> 0.65;
        case AUSTENITIC_STAINLESS, NON_FERROUS -> 0.55;
      };
    }
  },
  /** The one share of EN 13906-1, set removed or not, on the uncorrected stress. */
  EN_13906(
      Citation.remembered(
          Source.EN_13906_1, "clause 10, permissible stress at solid, taken at load too"),
      StressMeaning.UNCORRECTED) {
    @Override
    public double share(AllowableClass allowableClass) {
      return 0.56;
    }
  };

  private final Citation citation;
  private final StressMeaning meaning;

  StressBasis(Citation citation, StressMeaning meaning) {
    this.citation = citation;
    this.meaning = meaning;
  }

  /**
   * The basis that a problem's choices come to.
   *
   * @param method whose rules apply
   * @param setRemoved whether the spring is pressed solid once before use
   * @return the basis
   */
  public static StressBasis of(Method method, boolean setRemoved) {
    if (method == Method.EN_13906) {
      return EN_13906;
    }
    return setRemoved ? HANDBOOK_SET_REMOVED : HANDBOOK;
  }

  /**
   * The static allowable, at load and at solid alike.
   *
   * @param allowableClass the grade's class
   * @return share of tensile strength [-]
   */
  public abstract double share(AllowableClass allowableClass);

  /** Where the shares are published. */
  public Citation citation() {
    return citation;
  }

  /** The stress they are meant for. */
  StressMeaning meaning() {
    return meaning;
  }
}
