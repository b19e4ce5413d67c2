package coilwright.problem;

import java.util.OptionalDouble;

/**
 * A bound on a stress as a share of tensile strength.
 *
 * @param judged false where the file says {@code none}
 * @param share the share the file gives [-]; empty where the value of the grade or of the stress
 *     basis applies
 */
public record StressLimit(boolean judged, OptionalDouble share) {}
