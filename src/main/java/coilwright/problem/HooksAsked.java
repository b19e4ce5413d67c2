package coilwright.problem;

import coilwright.spring.HookType;
import java.util.List;
import java.util.OptionalDouble;

/**
 * The hooks of an extension spring, both ends alike.
 *
 * @param types the types tried, or the one of the spring to check
 * @param length how far each reaches beyond the body
 * @param bendRadius mean radius of the loop, as a multiple of the mean diameter D [-]
 * @param sideRadius mean radius of the bend from the body into the loop, likewise [-]
 * @param planes how the two lie to each other
 * @param activeCoils active coils that each hook adds [-]; empty where the usual share applies
 */
public record HooksAsked(
    List<HookType> types,
    HookLength length,
    double bendRadius,
    double sideRadius,
    LoopPlanes planes,
    OptionalDouble activeCoils) {

  /** Copies the list. */
  public HooksAsked {
    types = List.copyOf(types);
  }
}
