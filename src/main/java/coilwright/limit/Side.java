package coilwright.limit;

/** Which way a bound cuts. */
public enum Side {
  /** The value must not be below the bound. */
  MIN("min"),
  /** The value must not be above the bound. */
  MAX("max");

  private final String id;

  Side(String id) {
    this.id = id;
  }

  /** The word used in output. */
  public String id() {
    return id;
  }

  /**
   * How far a value is on the right side of a bound.
   *
   * @param value the value
   * @param bound the bound, in the same unit
   * @return positive inside, negative outside, in the same unit; NaN if either is
   */
  public double slack(double value, double bound) {
    return this == MIN ? value - bound : bound - value;
  }

  /**
   * Moves a bound so that more values are inside.
   *
   * @param bound the bound
   * @param distance how far, in the same unit
   * @return the bound moved
   */
  double outward(double bound, double distance) {
    return this == MIN ? bound - distance : bound + distance;
  }
}
