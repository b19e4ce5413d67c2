package coilwright.problem;

import coilwright.spring.Kind;
import coilwright.unit.Words;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;

/**
 * Reads one word of several.
 *
 * @param <T> what the words stand for
 */
final class WordReader<T> extends ScalarReader<T> {

  private final Map<String, T> words = new LinkedHashMap<>();

  /**
   * A reader of words.
   *
   * @param values what the words stand for
   * @param word the word of each
   */
  WordReader(List<T> values, Function<T, String> word) {
    values.forEach(value -> words.put(word.apply(value), value));
  }

  @Override
  Optional<T> parse(String text, Spot spot) {
    if (words.containsKey(text)) {
      return Optional.of(words.get(text));
    }
    return refuse(text, "", spot.nearest(text, words.keySet()), spot);
  }

  @Override
  public String accepted() {
    return Words.either(List.copyOf(words.keySet()));
  }

  @Override
  public Form form(Kind kind) {
    return new Form.Word(List.copyOf(words.keySet()));
  }
}
