package coilwright.problem;

/**
 * A property of an own grade by wire diameter.
 *
 * @param <L> the kind of law
 * @param law the law
 * @param end the greatest wire diameter it covers [mm]; infinite where nothing bounds it
 */
record LawGiven<L>(L law, double end) {

  /**
   * A law without end.
   *
   * @param <L> its kind
   * @param law the law
   * @return the law, for every diameter
   */
  static <L> LawGiven<L> everywhere(L law) {
    return new LawGiven<>(law, Double.POSITIVE_INFINITY);
  }
}
