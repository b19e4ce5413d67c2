package coilwright.problem;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * One load as read, with its place in the file.
 *
 * @param section its block of keys
 * @param asked the load, for the whole group of springs
 */
record LoadEntry(Section section, LoadAsked asked) {

  /**
   * Reads a load.
   *
   * @param section its block of keys
   * @return the load
   */
  static LoadEntry read(Section section) {
    OptionalDouble length = section.number(LoadKeys.LENGTH);
    OptionalDouble force = section.number(LoadKeys.FORCE);
    Optional<ToleranceAsked> tolerance = section.read(LoadKeys.TOLERANCE);
    boolean lacksForce = section.lacks(LoadKeys.FORCE);
    if (section.lacks(LoadKeys.LENGTH) && lacksForce) {
      section.spot().fault("neither length nor force", "must have one of them or both");
    }
    if (section.has(LoadKeys.TOLERANCE) && lacksForce) {
      section.spot(LoadKeys.TOLERANCE).fault("no force to go with it", "must stand with a force");
    }
    return new LoadEntry(section, new LoadAsked(length, force, resolved(tolerance, force)));
  }

  private static Optional<Tolerance> resolved(
      Optional<ToleranceAsked> tolerance, OptionalDouble force) {
    return force.isPresent()
        ? tolerance.map(asked -> asked.of(force.getAsDouble()))
        : Optional.empty();
  }

  /** Whether both length and force are given. */
  boolean isFull() {
    return asked.length().isPresent() && asked.force().isPresent();
  }

  /** Its length [mm], where given. */
  double length() {
    return asked.length().getAsDouble();
  }

  /** Its force for the whole group [N], where given. */
  double force() {
    return asked.force().getAsDouble();
  }
}
