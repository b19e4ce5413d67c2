package coilwright.unit;

import java.util.regex.Pattern;

/**
 * Reads decimal numbers with a point: optional sign, digits, fraction and exponent, and nothing
 * else. What other readers take in silence, such as 010, 1_000 or 1,5, is refused.
 */
public final class DecimalNumber {

  /** No number that anyone means is longer [signs]. */
  private static final int LONGEST = 100;

  private static final Pattern DECIMAL =
      Pattern.compile("[+-]?(?:0|[1-9][0-9]*+)?(?:\\.[0-9]++)?(?:[eE][+-]?[0-9]++)?");
  private static final Pattern LEADING_ZERO = Pattern.compile("[+-]?0[0-9].*", Pattern.DOTALL);
  private static final Pattern DIGIT = Pattern.compile("[0-9]");
  private static final Pattern NOT_ZERO = Pattern.compile("[1-9]");

  private DecimalNumber() {}

  /**
   * Reads a number.
   *
   * @param text the number, without blanks around it
   * @return the number, finite; or why it is refused
   */
  public static Parsed<Double> parse(String text) {
    if (text.length() > LONGEST) {
      return Parsed.refused("too long a number");
    }
    if (DECIMAL.matcher(text).matches() && DIGIT.matcher(mantissa(text)).find()) {
      return inRange(text);
    }
    return Parsed.refused(whyNot(text));
  }

  private static Parsed<Double> inRange(String text) {
    double value = Double.parseDouble(text);
    if (!(Math.abs(value) < Double.POSITIVE_INFINITY)) {
      return Parsed.refused("too large a number");
    }
    if (value == 0 && NOT_ZERO.matcher(mantissa(text)).find()) {
      return Parsed.refused("too small a number");
    }
    return Parsed.of(value + 0.0); // -0 becomes 0
  }

  private static String mantissa(String text) {
    int exponent = Math.max(text.indexOf('e'), text.indexOf('E'));
    return exponent < 0 ? text : text.substring(0, exponent);
  }

  private static String whyNot(String text) {
    if (LEADING_ZERO.matcher(text).matches()) {
      return "with a leading zero";
    }
    if (text.indexOf(',') >= 0) {
      return "with a comma where a point may stand";
    }
    return text.indexOf('_') >= 0 ? "with an underscore" : "";
  }
}
