package coilwright.unit;

import java.util.Optional;

/**
 * What came of reading a text: a value, or why there is none.
 *
 * @param <T> the kind of value
 * @param value the value; empty where the text is refused
 * @param why what is wrong with the text, to stand behind it after a comma; empty where the text is
 *     simply something else
 * @param nearest the nearest known word, where one is misspelt
 */
public record Parsed<T>(Optional<T> value, String why, Optional<String> nearest) {

  /**
   * A value.
   *
   * @param <T> its kind
   * @param value the value
   * @return the result that holds it
   */
  public static <T> Parsed<T> of(T value) {
    return new Parsed<>(Optional.of(value), "", Optional.empty());
  }

  /**
   * A refusal.
   *
   * @param <T> the kind of value that was looked for
   * @param why what is wrong with the text; may be empty
   * @return the result without a value
   */
  public static <T> Parsed<T> refused(String why) {
    return new Parsed<>(Optional.empty(), why, Optional.empty());
  }

  /**
   * A refusal of a misspelt word.
   *
   * @param <T> the kind of value that was looked for
   * @param why what is wrong with the text
   * @param nearest the nearest known word, where there is one
   * @return the result without a value
   */
  public static <T> Parsed<T> misspelt(String why, Optional<String> nearest) {
    return new Parsed<>(Optional.empty(), why, nearest);
  }

  /**
   * This refusal for another kind of value.
   *
   * @param <U> the other kind
   * @return the same reason, without a value
   */
  <U> Parsed<U> stillRefused() {
    return new Parsed<>(Optional.empty(), why, nearest);
  }
}
