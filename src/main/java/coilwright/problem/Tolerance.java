package coilwright.problem;

/**
 * What a buyer accepts around a force: recorded with the load, not judged.
 *
 * @param plus how far above the force [N]
 * @param minus how far below it [N]
 */
public record Tolerance(double plus, double minus) {}
