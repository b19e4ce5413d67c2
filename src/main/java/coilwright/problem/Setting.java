package coilwright.problem;

import java.util.Optional;

/**
 * A value that the word {@code none} may take the place of.
 *
 * @param <T> the kind of value
 * @param value the value; empty where the file says {@code none}
 */
record Setting<T>(Optional<T> value) {}
