package coilwright.problem;

import coilwright.spring.TorquePoint;
import java.util.Optional;

/**
 * One load of a torsion spring as the problem file gives it, for the whole group of springs.
 *
 * @param point angle and torque; a force at an arm is their product
 * @param tolerance what the buyer accepts around the torque [N mm], where given
 */
public record TorqueAsked(TorquePoint point, Optional<Tolerance> tolerance) {}
