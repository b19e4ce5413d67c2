package coilwright.cli;

import coilwright.unit.Spelling;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/**
 * Reads one word of several.
 *
 * @param <T> what the words stand for
 */
abstract class WordConverter<T> implements ITypeConverter<T> {

  private final Map<String, T> words = new LinkedHashMap<>();

  /**
   * A reader of words.
   *
   * @param values what the words stand for
   * @param word the word of each
   */
  WordConverter(List<T> values, Function<T, String> word) {
    values.forEach(value -> words.put(word.apply(value), value));
  }

  @Override
  public final T convert(String word) {
    if (words.containsKey(word)) {
      return words.get(word);
    }
    Optional<String> nearest = Spelling.nearest(word, words.keySet());
    throw new TypeConversionException(
        "\""
            + word
            + "\""
            + "; accepted: "
            + String.join(", ", words.keySet())
            + didYouMean(nearest));
  }

  /**
   * The hint of a message.
   *
   * @param nearest the nearest known word
   */
  static String didYouMean(Optional<String> nearest) {
    return nearest.map(known -> " (did you mean " + known + "?)").orElse("");
  }
}
