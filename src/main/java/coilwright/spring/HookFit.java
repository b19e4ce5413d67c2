package coilwright.spring;

import coilwright.unit.Require;

/**
 * What the length of an extension spring's hooks follows from.
 *
 * @param rule how it is chosen
 * @param length the length that the rule names [mm]; NaN where it names none
 */
public record HookFit(Rule rule, double length) {

  /** How the length is chosen. */
  public enum Rule {
    /** As the type of hook comes out of the coil. */
    NATURAL,
    /** The hook's own length is given. */
    HOOK_LENGTH,
    /** The free length is given. */
    FREE_LENGTH,
    /** Whatever brings the initial tension to the middle of its preferred range. */
    PREFERRED_TENSION
  }

  /** As the type of hook comes out of the coil. */
  public static HookFit natural() {
    return new HookFit(Rule.NATURAL, Double.NaN);
  }

  /**
   * Of a given length.
   *
   * @param hookLength how far each reaches beyond the body to its inside [mm]
   * @return the fit
   */
  public static HookFit ofHookLength(double hookLength) {
    return new HookFit(Rule.HOOK_LENGTH, Require.positive(hookLength, "hook length", "mm"));
  }

  /**
   * Whatever gives the spring a free length.
   *
   * @param freeLength L0 inside the hooks [mm]
   * @return the fit
   */
  public static HookFit ofFreeLength(double freeLength) {
    return new HookFit(Rule.FREE_LENGTH, Require.positive(freeLength, "free length", "mm"));
  }

  /** Whatever brings the initial tension to the middle of its preferred range. */
  public static HookFit ofPreferredTension() {
    return new HookFit(Rule.PREFERRED_TENSION, Double.NaN);
  }
}
