package coilwright.problem;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * One load as read, for the whole group of springs, with its place in the file.
 *
 * @param section its block of keys
 * @param placeKey the key of its length or angle
 * @param loadKey the key of its force or torque
 * @param at length [mm] or angle [rad], where given
 * @param carries force [N] or torque [N mm], where given
 * @param tolerance what the buyer accepts, where given
 */
record LoadEntry(
    Section section,
    ProblemKey<Double> placeKey,
    ProblemKey<Double> loadKey,
    OptionalDouble at,
    OptionalDouble carries,
    Optional<Tolerance> tolerance) {

  /**
   * Reads a load of a compression or extension spring.
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
    return new LoadEntry(
        section, LoadKeys.LENGTH, LoadKeys.FORCE, length, force, resolved(tolerance, force));
  }

  /**
   * A tolerance around a load.
   *
   * @param tolerance as read
   * @param load the load
   * @return the tolerance; empty where one of the two is
   */
  static Optional<Tolerance> resolved(Optional<ToleranceAsked> tolerance, OptionalDouble load) {
    return load.isPresent()
        ? tolerance.map(asked -> asked.of(load.getAsDouble()))
        : Optional.empty();
  }

  /** Whether both place and load are given. */
  boolean isFull() {
    return at.isPresent() && carries.isPresent();
  }

  /** Its length [mm] or angle [rad], where given. */
  double place() {
    return at.getAsDouble();
  }

  /** Its force [N] or torque [N mm], where given. */
  double load() {
    return carries.getAsDouble();
  }

  /** The load as a compression or extension spring is asked it. */
  LoadAsked asked() {
    return new LoadAsked(at, carries, tolerance);
  }

  /** The place as typed. */
  String shownPlace() {
    return section.shown(placeKey);
  }

  /** The load as typed. */
  String shownLoad() {
    String arm =
        section.has(TorqueKeys.ARM) ? " at an arm of " + section.shown(TorqueKeys.ARM) : "";
    return section.shown(loadKey) + arm;
  }

  /**
   * Reports a fault about its place.
   *
   * @param remedy what is accepted
   */
  void placeFault(String remedy) {
    section.spot(placeKey).fault(shownPlace(), remedy);
  }

  /**
   * Reports a fault about its load.
   *
   * @param remedy what is accepted
   */
  void loadFault(String remedy) {
    section.spot(loadKey).fault(shownLoad(), remedy);
  }
}
