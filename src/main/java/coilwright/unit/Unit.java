package coilwright.unit;

/**
 * A unit of measure.
 *
 * @param symbol how it is written, such as "lbf/in"
 * @param factor how many of the dimension's inner units one of it is
 */
public record Unit(String symbol, double factor) {

  /** Refuses a factor that is not positive and finite. */
  public Unit {
    Require.positive(factor, "factor of " + symbol, "-");
  }

  /**
   * From this unit to the inner one.
   *
   * @param value in this unit
   * @return in the dimension's inner unit
   */
  public double toInner(double value) {
    return value * factor;
  }

  /**
   * From the inner unit to this one.
   *
   * @param value in the dimension's inner unit
   * @return in this unit
   */
  public double fromInner(double value) {
    return value / factor;
  }
}
