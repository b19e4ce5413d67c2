package coilwright.spring;

import java.util.OptionalDouble;

/**
 * One load asked of a torsion spring.
 *
 * @param angle in the winding direction from the file's reference [rad], where asked
 * @param torque M [N mm], where asked; at least one of the two is
 */
public record TorquePoint(OptionalDouble angle, OptionalDouble torque) {}
