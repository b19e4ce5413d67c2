package coilwright.report;

import java.math.BigDecimal;
import java.math.RoundingMode;

/** Numbers as text writes them: a decimal point, no grouping, the same on every machine. */
final class Numbers {

  private Numbers() {}

  /** With a fixed count of decimals; "inf" for infinity, "-" for no number. */
  static String fixed(double value, int decimals) {
    if (Double.isNaN(value)) {
      return "-";
    }
    if (Double.isInfinite(value)) {
      return value > 0 ? "inf" : "-inf";
    }
    return BigDecimal.valueOf(value).setScale(decimals, RoundingMode.HALF_UP).toPlainString();
  }

  /** With at most a count of decimals, trailing zeros dropped. */
  static String brief(double value, int decimals) {
    String fixed = fixed(value, decimals);
    if (fixed.indexOf('.') < 0) {
      return fixed;
    }
    int end = fixed.length();
    while (fixed.charAt(end - 1) == '0') {
      end--;
    }
    return fixed.substring(0, fixed.charAt(end - 1) == '.' ? end - 1 : end);
  }

  /** A share in per cent: "21.3 %". */
  static String percent(double share, int decimals) {
    return fixed(100 * share, decimals) + " %";
  }

  /** A margin in per cent; one that is there but too small to show says so. */
  static String margin(double share) {
    return share > 0 && share < 0.0005 ? "< 0.1 %" : percent(share, 1);
  }
}
