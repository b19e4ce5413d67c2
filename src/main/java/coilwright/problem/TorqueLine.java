package coilwright.problem;

import coilwright.spring.TorquePoint;
import java.util.List;
import java.util.OptionalDouble;

/**
 * What one torsion spring must do: M = R (angle - free angle) where it closes, M = R (free angle -
 * angle) where it opens.
 *
 * @param rate R of one spring [N mm/rad]
 * @param freeAngle where it comes to no torque, in the loads' reference [rad]; empty where no angle
 *     is given, so that there is no reference
 * @param rule which facts fixed them, in words: "two loads at angles"
 * @param loads the loads of one spring in file order, each with torque, and with angle where there
 *     is a reference
 */
public record TorqueLine(
    double rate, OptionalDouble freeAngle, String rule, List<TorquePoint> loads) {

  /** Copies the list. */
  public TorqueLine {
    loads = List.copyOf(loads);
  }
}
