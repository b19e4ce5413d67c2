package coilwright.spring;

import java.util.OptionalDouble;

/**
 * A load that one spring is asked for: a length, a force, or both; or a force at a deflection,
 * where the lengths are left open.
 *
 * @param length L [mm], where asked
 * @param force F [N], where asked
 * @param deflection s [mm], where that is asked in place of a length
 */
public record LoadPoint(OptionalDouble length, OptionalDouble force, OptionalDouble deflection) {

  /**
   * A length, a force, or both.
   *
   * @param length L [mm], where asked
   * @param force F [N], where asked
   */
  public LoadPoint(OptionalDouble length, OptionalDouble force) {
    this(length, force, OptionalDouble.empty());
  }

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
   * A force asked at a deflection, at whatever length that is.
   *
   * @param deflection s [mm]
   * @param force F [N]
   * @return the point
   */
  public static LoadPoint deflected(double deflection, double force) {
    return new LoadPoint(
        OptionalDouble.empty(), OptionalDouble.of(force), OptionalDouble.of(deflection));
  }

  /** Whether a force is asked at a place: a length or a deflection. */
  public boolean fixesForce() {
    return force.isPresent() && (length.isPresent() || deflection.isPresent());
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
