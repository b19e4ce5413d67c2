package coilwright.problem;

import coilwright.unit.Unit;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Optional;

/**
 * The values that make sense for a key.
 *
 * @param low the lower bound
 * @param lowIncluded whether the bound itself is accepted
 * @param high the upper bound
 * @param highIncluded whether the bound itself is accepted
 */
public record Range(double low, boolean lowIncluded, double high, boolean highIncluded) {

  /** Beyond this no product of a formula is safe from overflow; no spring comes near it. */
  private static final double LARGEST = 1e9;

  /** Below this, zero aside, likewise. */
  private static final double SMALLEST = 1e-9;

  /** Anything, whatever its sign. */
  static final Range ANY = new Range(-LARGEST, true, LARGEST, true);

  /** Anything above zero. */
  static final Range ABOVE_ZERO = new Range(0, false, LARGEST, true);

  /** Zero and above. */
  static final Range FROM_ZERO = new Range(0, true, LARGEST, true);

  /** One and above. */
  static final Range FROM_ONE = new Range(1, true, LARGEST, true);

  /**
   * Values above a bound.
   *
   * @param low the bound, itself not accepted
   * @return the range
   */
  static Range above(double low) {
    return new Range(low, false, LARGEST, true);
  }

  /**
   * Values between two bounds, both accepted.
   *
   * @param low the lower bound
   * @param high the upper bound
   * @return the range
   */
  static Range within(double low, double high) {
    return new Range(low, true, high, true);
  }

  /**
   * Checks a value.
   *
   * @param value in the inner unit
   * @param unit the unit it was typed in; empty for a plain number
   * @return what it must be, or empty where it is in the range
   */
  Optional<String> refuses(double value, Optional<Unit> unit) {
    boolean aboveLow = lowIncluded ? value >= low : value > low;
    boolean belowHigh = highIncluded ? value <= high : value < high;
    if (!aboveLow || !belowHigh) {
      return Optional.of("must be " + words(belowHigh, unit));
    }
    return value == 0 || Math.abs(value) >= SMALLEST
        ? Optional.empty()
        : Optional.of("must be at least " + typed(SMALLEST, unit));
  }

  private String words(boolean belowHigh, Optional<Unit> unit) {
    String least = (lowIncluded ? "at least " : "above ") + typed(low, unit);
    String most = (highIncluded ? "at most " : "below ") + typed(high, unit);
    if (high < LARGEST) {
      return least + " and " + most;
    }
    return belowHigh ? least : most;
  }

  private static String typed(double inner, Optional<Unit> unit) {
    double number = unit.map(u -> u.fromInner(inner)).orElse(inner);
    String text = number(number);
    return unit.map(u -> text + " " + u.symbol()).orElse(text);
  }

  /**
   * A number as messages print it: at most six digits, no trailing zeros.
   *
   * @param value finite
   * @return the text
   */
  static String number(double value) {
    BigDecimal rounded = new BigDecimal(value).round(new MathContext(6)).stripTrailingZeros();
    return rounded.signum() == 0 ? "0" : rounded.toPlainString();
  }
}
