package coilwright.report;

import java.io.IOException;
import java.util.Optional;
import java.util.function.Function;

/**
 * A word of a subject as JSON and CSV name it.
 *
 * @param key the key
 * @param users whether it may hold what a user typed
 * @param of the word; empty where it does not apply
 * @param <T> what has the word
 */
record Word<T>(String key, boolean users, Function<T, Optional<String>> of) implements Field<T> {

  /** A word of our own that always applies. */
  static <T> Word<T> ours(String key, Function<T, String> of) {
    return new Word<>(key, false, subject -> Optional.of(of.apply(subject)));
  }

  /** A word that a user may have typed. */
  static <T> Word<T> users(String key, Function<T, String> of) {
    return new Word<>(key, true, subject -> Optional.of(of.apply(subject)));
  }

  @Override
  public String key(OutputUnits units) {
    return key;
  }

  @Override
  public void writeTo(Json json, T subject) throws IOException {
    Optional<String> word = of.apply(subject);
    if (word.isPresent()) {
      json.string(key, word.get());
    }
  }

  @Override
  public String cell(T subject, OutputUnits units) {
    String word = of.apply(subject).orElse("");
    return users ? Csv.typed(word) : word;
  }
}
