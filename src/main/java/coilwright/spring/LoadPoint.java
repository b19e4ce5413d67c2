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

  /**
   * This load with what it leaves open taken from a load line.
   *
   * @param line the line
   * @return the load with both length and force
   */
  public LoadPoint on(LoadLine line) {
    double at = length.isPresent() ? length.getAsDouble() : line.lengthUnder(force.orElseThrow());
    return at(at, force.orElse(line.forceAt(at)));
  }
}
