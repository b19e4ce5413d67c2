package coilwright.problem;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** Reads loads of torsion springs: a torque, or a force at an arm, at an angle. */
final class TorqueEntry {

  private TorqueEntry() {}

  /**
   * Reads a load.
   *
   * @param section its block of keys
   * @return the load; its torque is the product of force and arm where these are given
   */
  static LoadEntry read(Section section) {
    OptionalDouble angle = section.number(TorqueKeys.ANGLE);
    boolean atArm = section.has(TorqueKeys.FORCE) || section.has(TorqueKeys.ARM);
    OptionalDouble torque = atArm ? product(section) : section.number(TorqueKeys.TORQUE);
    Optional<ToleranceAsked> tolerance = section.read(TorqueKeys.TOLERANCE);
    boolean lacksTorque = section.lacks(TorqueKeys.TORQUE) && section.lacks(TorqueKeys.FORCE);
    if (section.lacks(TorqueKeys.ANGLE) && lacksTorque && !atArm) {
      section.spot().fault("neither angle nor torque", "must have one of them or both");
    }
    if (section.has(TorqueKeys.TOLERANCE) && lacksTorque && !atArm) {
      section
          .spot(TorqueKeys.TOLERANCE)
          .fault("no torque to go with it", "must stand with a torque");
    }
    return new LoadEntry(
        section,
        TorqueKeys.ANGLE,
        atArm ? TorqueKeys.FORCE : TorqueKeys.TORQUE,
        angle,
        torque,
        LoadEntry.resolved(tolerance, torque));
  }

  private static OptionalDouble product(Section section) {
    for (ProblemKey<Double> key : List.of(TorqueKeys.FORCE, TorqueKeys.ARM)) {
      if (section.has(TorqueKeys.TORQUE) && section.has(key)) {
        section
            .spot(key)
            .fault("given beside torque", "must be only one: torque, or force and arm");
      }
    }
    if (section.has(TorqueKeys.TORQUE)) {
      return section.number(TorqueKeys.TORQUE);
    }
    together(section, TorqueKeys.FORCE, TorqueKeys.ARM);
    together(section, TorqueKeys.ARM, TorqueKeys.FORCE);
    OptionalDouble force = section.number(TorqueKeys.FORCE);
    OptionalDouble arm = section.number(TorqueKeys.ARM);
    return force.isPresent() && arm.isPresent()
        ? OptionalDouble.of(force.getAsDouble() * arm.getAsDouble())
        : OptionalDouble.empty();
  }

  private static void together(
      Section section, ProblemKey<Double> given, ProblemKey<Double> needed) {
    if (section.lacks(needed)) {
      section
          .spot(needed)
          .fault("missing; needed with " + given.name(), "must be " + needed.reader().accepted());
    }
  }
}
