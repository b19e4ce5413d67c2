package coilwright.problem;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * One load as the problem file gives it, for the whole group of springs.
 *
 * @param length L [mm], where given
 * @param force F [N], where given; at least one of the two is
 * @param tolerance what the buyer accepts, where given
 */
public record LoadAsked(
    OptionalDouble length, OptionalDouble force, Optional<Tolerance> tolerance) {}
