package coilwright.problem;

/** The units in which text is shown, and which defaults of supply and rounding apply. */
public enum UnitSystem {
  /** Millimetre, newton. */
  METRIC("metric"),
  /** Inch, pound-force. */
  INCH("inch");

  private final String id;

  UnitSystem(String id) {
    this.id = id;
  }

  /** The id used in problem files and options. */
  public String id() {
    return id;
  }
}
