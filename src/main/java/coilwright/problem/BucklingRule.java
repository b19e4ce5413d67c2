package coilwright.problem;

/** Where sideways stability is judged. */
public enum BucklingRule {
  /**
   * At the most compressed load; reported only, not judged, where a bore or rod guides the spring.
   */
  AT_LOAD_UNLESS_GUIDED("at-load"),
  /** At the most compressed load, guided or not. */
  AT_LOAD("at-load"),
  /** At solid. */
  AT_SOLID("at-solid"),
  /** Nowhere. */
  NONE("none");

  private final String id;

  BucklingRule(String id) {
    this.id = id;
  }

  /** The word used in problem files. */
  public String id() {
    return id;
  }
}
