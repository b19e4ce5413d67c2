package coilwright.unit;

/**
 * Guards for the numbers a type is built from. Each returns its argument, and each is written so
 * that NaN fails.
 */
public final class Require {

  private Require() {}

  /**
   * Accepts a positive, finite value.
   *
   * @param value the value, in {@code unit}
   * @param name what it is, for the message
   * @param unit its unit, for the message; "-" for a plain number
   * @return {@code value}
   * @throws IllegalArgumentException if it is zero, negative, infinite or NaN
   */
  public static double positive(double value, String name, String unit) {
    if (value > 0 && value < Double.POSITIVE_INFINITY) {
      return value;
    }
    throw refused(value, name, unit, "positive and finite");
  }

  /**
   * Accepts zero or a positive, finite value.
   *
   * @param value the value, in {@code unit}
   * @param name what it is, for the message
   * @param unit its unit, for the message; "-" for a plain number
   * @return {@code value}
   * @throws IllegalArgumentException if it is negative, infinite or NaN
   */
  public static double notNegative(double value, String name, String unit) {
    if (value >= 0 && value < Double.POSITIVE_INFINITY) {
      return value;
    }
    throw refused(value, name, unit, "zero or above and finite");
  }

  /**
   * Accepts any finite value.
   *
   * @param value the value, in {@code unit}
   * @param name what it is, for the message
   * @param unit its unit, for the message; "-" for a plain number
   * @return {@code value}
   * @throws IllegalArgumentException if it is infinite or NaN
   */
  public static double finite(double value, String name, String unit) {
    if (Math.abs(value) < Double.POSITIVE_INFINITY) {
      return value;
    }
    throw refused(value, name, unit, "finite");
  }

  /**
   * Accepts a value above a floor.
   *
   * @param value the value, in {@code unit}
   * @param floor what it must exceed, in {@code unit}
   * @param name what it is, for the message
   * @param unit its unit, for the message; "-" for a plain number
   * @return {@code value}
   * @throws IllegalArgumentException if it is not above the floor, infinite or NaN
   */
  public static double above(double value, double floor, String name, String unit) {
    if (value > floor && value < Double.POSITIVE_INFINITY) {
      return value;
    }
    throw refused(value, name, unit, "above " + floor + " and finite");
  }

  private static IllegalArgumentException refused(
      double value, String name, String unit, String rule) {
    return new IllegalArgumentException(name + ": " + value + " " + unit + " must be " + rule);
  }
}
