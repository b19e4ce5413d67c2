package coilwright.unit;

/**
 * A number with its unit, as written.
 *
 * @param number the number, in {@code unit}
 * @param unit the unit it was written in
 * @param dimension what kind of quantity it is
 */
public record Quantity(double number, Unit unit, Dimension dimension) {

  /** Refuses a number that is not finite. */
  public Quantity {
    Require.finite(number, dimension.phrase(), unit.symbol());
  }

  /**
   * The value in the dimension's inner unit. A unit that is a whole fraction of the inner one
   * divides, so that 35 % is 0.35 to the last digit.
   */
  public double inner() {
    double parts = Math.rint(1 / unit.factor());
    return parts > 1 && 1 / parts == unit.factor() ? number / parts : unit.toInner(number);
  }
}
