package coilwright.problem;

import java.util.OptionalDouble;

/**
 * A lower and an upper bound, either of which may be switched off.
 *
 * @param min the lower bound, or empty
 * @param max the upper bound, or empty
 */
public record Band(OptionalDouble min, OptionalDouble max) {}
