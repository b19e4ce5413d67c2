package coilwright.problem;

import java.util.OptionalDouble;

/**
 * How far each hook reaches beyond the body, to its inside.
 *
 * @param rule how it is chosen
 * @param given the length [mm], where the file gives one
 */
public record HookLength(Rule rule, OptionalDouble given) {

  /** How a hook's length is chosen. */
  public enum Rule {
    /** As the type of hook comes out of the coil. */
    NATURAL,
    /** As the file says. */
    GIVEN,
    /** Whatever lets the body meet the loads at the middle of the preferred initial tension. */
    FREE
  }

  /** As the type of hook comes out of the coil. */
  public static HookLength natural() {
    return new HookLength(Rule.NATURAL, OptionalDouble.empty());
  }

  /** Whatever lets the body meet the loads at the middle of the preferred initial tension. */
  public static HookLength free() {
    return new HookLength(Rule.FREE, OptionalDouble.empty());
  }

  /**
   * As the file says.
   *
   * @param length the length [mm]
   * @return that length
   */
  public static HookLength of(double length) {
    return new HookLength(Rule.GIVEN, OptionalDouble.of(length));
  }
}
