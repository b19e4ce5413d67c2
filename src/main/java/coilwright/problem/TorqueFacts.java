package coilwright.problem;

import java.util.OptionalDouble;

/**
 * What a problem file says, beside the loads, about the line of torque against angle, for the whole
 * group of springs.
 *
 * @param rate R of the group [N mm/rad], where given
 * @param freeAngle the angle without torque, in the loads' reference [rad], where given
 * @param stroke between the least and the greatest load [rad], where given; from the free position
 *     to the load where there is only one
 */
public record TorqueFacts(OptionalDouble rate, OptionalDouble freeAngle, OptionalDouble stroke) {}
