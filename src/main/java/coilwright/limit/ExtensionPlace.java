package coilwright.limit;

import coilwright.material.AllowableClass;
import coilwright.problem.LimitName;
import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.spring.ExtensionState;
import coilwright.spring.HookStress;
import coilwright.spring.Hooks;
import coilwright.spring.Method;
import coilwright.spring.StressCorrection;

/**
 * Where an extension spring is stressed, and what static share of tensile strength it may bear
 * there.
 */
public enum ExtensionPlace {
  /** Torsion of the body. */
  BODY(LimitName.BODY_STRESS, 0.45, 0.50, 0.35) {
    @Override
    double stress(ExtensionState state, double force, boolean corrected) {
      return corrected ? state.correctedShearStress(force) : state.shearStress(force);
    }

    @Override
    double leastIndex(Hooks hooks, StressCorrection correction) {
      return correction.leastStressIndex();
    }
  },
  /** Bending of the loop. */
  HOOK_BENDING(LimitName.HOOK_BENDING_STRESS, 0.75, 0.75, 0.55) {
    @Override
    double stress(ExtensionState state, double force, boolean corrected) {
      return state.hookBendingStress(force);
    }

    @Override
    double leastIndex(Hooks hooks, StressCorrection correction) {
      return HookStress.LEAST_BENDING_INDEX / hooks.bendIndex(1);
    }
  },
  /** Torsion of the bend between body and loop. */
  HOOK_TORSION(LimitName.HOOK_TORSION_STRESS, 0.40, 0.40, 0.30) {
    @Override
    double stress(ExtensionState state, double force, boolean corrected) {
      return state.hookTorsionStress(force);
    }

    @Override
    double leastIndex(Hooks hooks, StressCorrection correction) {
      return HookStress.LEAST_TORSION_INDEX / hooks.sideIndex(1);
    }
  };

  /** The handbooks' shares: not set, heat treated at a low temperature, corrected stress. */
  static final Citation HANDBOOK =
      Citation.seen(
          Source.STANDARD_HANDBOOK, "extension springs, static, as a reference page has it");

  /** The body's share of EN 13906-2, on the uncorrected stress, initial tension included. */
  static final Citation EN =
      Citation.seen(Source.EN_13906_2, "permissible stress, as two technical pages have it");

  private static final double EN_BODY = 0.45;

  private final LimitName limit;
  private final double coldDrawn;
  private final double hardened;
  private final double other;

  ExtensionPlace(LimitName limit, double coldDrawn, double hardened, double other) {
    this.limit = limit;
    this.coldDrawn = coldDrawn;
    this.hardened = hardened;
    this.other = other;
  }

  /**
   * The stress there.
   *
   * @param state the spring, its load on the axis
   * @param force F [N]
   * @param corrected whether the body's is corrected for curvature; a hook's always is
   * @return the stress [MPa]
   */
  abstract double stress(ExtensionState state, double force, boolean corrected);

  /** The spring index at which the stress of a given force is least along a family [-]. */
  abstract double leastIndex(Hooks hooks, StressCorrection correction);

  /** The limit's name. */
  LimitName limit() {
    return limit;
  }

  /** Whether a method judges the corrected stress here. */
  boolean corrected(Method method) {
    return this != BODY || method == Method.HANDBOOK;
  }

  /**
   * The static share where neither file nor grade says one. The handbooks give the body 45 to 50 %
   * of carbon and low alloy steel: the least to cold-drawn wire, the greatest to hardened and
   * tempered wire, as for compression springs. A body of high initial tension, above the preferred
   * range, has the shares of its ends. EN 13906-2 has one share for the body; its hooks are held to
   * the handbooks'.
   *
   * @param method whose allowables apply
   * @param allowableClass the grade's class
   * @param highTension whether the initial tension lies above its preferred range
   * @return share of tensile strength [-]
   */
  public double share(Method method, AllowableClass allowableClass, boolean highTension) {
    if (this == BODY && method == Method.EN_13906) {
      return EN_BODY;
    }
    return this == BODY && highTension
        ? HOOK_TORSION.handbook(allowableClass)
        : handbook(allowableClass);
  }

  private double handbook(AllowableClass allowableClass) {
    return switch (allowableClass) {
      case COLD_DRAWN_CARBON -> coldDrawn;
      case HARDENED_TEMPERED -> hardened;
      case AUSTENITIC_STAINLESS, NON_FERROUS -> other;
    };
  }

  /** Where the share is published. */
  Citation citation(Method method) {
    return this == BODY && method == Method.EN_13906 ? EN : HANDBOOK;
  }
}
