package coilwright.problem;

import java.util.List;
import java.util.stream.Collectors;

/**
 * Regular expressions of numbers and words in problem files, in the part of the language that ECMA
 * 262 and Java share. They know the sign and zero of a range, and none of its other bounds.
 */
final class NumberPattern {

  private static final String MANTISSA = "(?:(?:0|[1-9][0-9]*)(?:\\.[0-9]+)?|\\.[0-9]+)";

  private static final String EXPONENT = "[eE][+-]?[0-9]+";

  private static final String WHOLE = "(?:0|[1-9][0-9]*)(?:\\.0+)?";

  private static final String NOT_ZERO = "[0.]*[1-9]";

  private NumberPattern() {}

  /**
   * A decimal number.
   *
   * @param range its bounds
   * @return its pattern, without anchors
   */
  static String of(Range range) {
    return sign(range) + MANTISSA + "(?:" + EXPONENT + ")?";
  }

  /**
   * A decimal number that is whole, as far as its digits show.
   *
   * @param range its bounds
   * @return its pattern, without anchors
   */
  static String whole(Range range) {
    return sign(range) + "(?:" + WHOLE + "|" + MANTISSA + EXPONENT + ")";
  }

  private static String sign(Range range) {
    if (range.low() < 0) {
      return "[+-]?";
    }
    boolean zero = range.low() == 0 && range.lowIncluded();
    return zero ? "(?:\\+?|-(?!" + NOT_ZERO + "))" : "\\+?(?=" + NOT_ZERO + ")";
  }

  /**
   * One of several words.
   *
   * @param words the words
   * @return their pattern, without anchors
   */
  static String anyOf(List<String> words) {
    return words.stream()
        .map(word -> word.replaceAll("[.^$*+?()\\[\\]{}|\\\\]", "\\\\$0"))
        .collect(Collectors.joining("|", "(?:", ")"));
  }
}
