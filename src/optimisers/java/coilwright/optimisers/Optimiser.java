package coilwright.optimisers;

/** A general-purpose method. */
interface Optimiser {

  /** Its name in the table. */
  String name();

  /**
   * Spends a trial's budget.
   *
   * @param trial the run
   * @param seed the seed of its random numbers
   */
  void run(Trial trial, long seed);
}
