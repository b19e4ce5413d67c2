package coilwright.optimisers;

/**
 * What the judge says of one trial.
 *
 * @param objective what is to be least, in the task's unit; NaN where there is no such spring
 * @param violation by how much the limits are missed, as the sum of the missing margins; zero where
 *     all hold [-]
 */
record Verdict(double objective, double violation) {

  private static final double PENALTY = 100;
  private static final double NO_SPRING = 1e3;

  /** Whether every limit holds. */
  boolean holds() {
    return violation == 0;
  }

  /**
   * What the optimisers minimise: ln f, and {@link #PENALTY} times the violation more; where there
   * is no spring, more than any spring comes to.
   */
  double penalised() {
    return objective > 0
        ? StrictMath.log(objective) + PENALTY * violation
        : NO_SPRING * (1 + violation);
  }
}
