package coilwright.optimisers;

/**
 * What one run of a method came to.
 *
 * @param objective the least objective of a spring that holds; positive infinity where none did
 * @param calls springs judged, or states computed by the search
 * @param seconds processor time taken
 * @param callsToNearBest springs judged before one within the tolerance of the best; -1 if none was
 */
record Found(double objective, long calls, double seconds, long callsToNearBest) {

  /** What counts as near the best: one thousandth of it [-]. */
  static final double NEAR = 1e-3;

  /** Whether an objective is near a best one. */
  static boolean near(double objective, double best) {
    return objective <= best * (1 + NEAR);
  }
}
