package coilwright.spring;

import java.util.OptionalDouble;

/**
 * A load that one spring is asked for: a length, a force, or both.
 *
 * @param length L [mm], where asked
 * @param force F [N], where asked
 */
public record LoadPoint(OptionalDouble length, OptionalDouble force) {

  /**
   * A force asked at a length.
   *
   * @param length L [mm]
   * @param force F [N]
   * @return the point
   */
  public static LoadPoint at(double length, double force) {
    return new LoadPoint(OptionalDouble.of(length), OptionalDouble.of(force));
  }
}
