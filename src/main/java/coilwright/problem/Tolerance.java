package coilwright.problem;

/**
 * What a buyer accepts around a force or torque: recorded with the load, not judged.
 *
 * @param plus how far above it [N], of a torque [N mm]
 * @param minus how far below it, likewise
 */
public record Tolerance(double plus, double minus) {}
