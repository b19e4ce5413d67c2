package coilwright.problem;

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
  private final List<String> later;

  /**
   * A reader of words.
   *
   * @param values what the words stand for
   * @param word the word of each
   * @param later words that are known, but not available yet
   */
  WordReader(List<T> values, Function<T, String> word, String... later) {
    values.forEach(value -> words.put(word.apply(value), value));
    this.later = List.of(later).stream().filter(known -> !words.containsKey(known)).toList();
  }

  @Override
  Optional<T> parse(String text, Spot spot) {
    if (words.containsKey(text)) {
      return Optional.of(words.get(text));
    }
    if (later.contains(text)) {
      return refuse(text, Later.WORDS, Optional.empty(), spot);
    }
    return refuse(text, "", spot.nearest(text, words.keySet()), spot);
  }

  @Override
  public String accepted() {
    return Words.either(List.copyOf(words.keySet()));
  }

  @Override
  public Form form() {
    return new Form.Word(List.copyOf(words.keySet()));
  }
}
