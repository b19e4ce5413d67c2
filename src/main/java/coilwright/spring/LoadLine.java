package coilwright.spring;

import coilwright.unit.Require;

/**
 * The straight line of force against length that a compression spring must follow.
 *
 * @param rate R [N/mm]
 * @param freeLength L0 [mm]
 */
public record LoadLine(double rate, double freeLength) {

  /** Refuses a rate or a free length that is not positive and finite. */
  public LoadLine {
    Require.positive(rate, "rate", "N/mm");
    Require.positive(freeLength, "free length", "mm");
  }

  /**
   * The line through two loads.
   *
   * @param length1 L1 [mm], the longer
   * @param force1 F1 [N], the smaller
   * @param length2 L2 [mm], below L1
   * @param force2 F2 [N], above F1
   * @return the line
   * @throws IllegalArgumentException if the force does not rise as the length falls
   */
  public static LoadLine through(double length1, double force1, double length2, double force2) {
    double rate = (force2 - force1) / (length1 - length2);
    Require.positive(rate, "rate", "N/mm");
    return new LoadLine(rate, length1 + force1 / rate);
  }

  /**
   * Force at a length.
   *
   * @param length L [mm]
   * @return F [N]
   * @throws IllegalArgumentException if the length is not finite
   */
  public double forceAt(double length) {
    return rate * (freeLength - Require.finite(length, "length", "mm"));
  }

  /**
   * Length under a force.
   *
   * @param force F [N]
   * @return L [mm]
   * @throws IllegalArgumentException if the force is not finite
   */
  public double lengthUnder(double force) {
    return freeLength - Require.finite(force, "force", "N") / rate;
  }
}
