package coilwright.problem;

import coilwright.spring.EndType;
import coilwright.spring.Method;

/** Whether the method has rules for the ends asked: EN 13906-1 has them for closed ends only. */
final class ClosedEnds {

  private ClosedEnds() {}

  /**
   * Reports ends that the method has no rules for.
   *
   * @param ends the ends
   * @param method the method
   * @param spot where the ends stand
   */
  static void check(EndType ends, Method method, Spot spot) {
    if (method == Method.EN_13906 && !ends.closed()) {
      spot.fault(
          ends.id() + " under stress_basis " + method.id(),
          "must be squared or squared-ground: the standard covers closed ends only");
    }
  }
}
