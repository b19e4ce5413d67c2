package coilwright.report;

import java.io.IOException;
import java.util.function.Predicate;

/**
 * A yes or no of a subject as JSON and CSV name it.
 *
 * @param key the key
 * @param of whether it is so
 * @param <T> what it is said of
 */
record Flag<T>(String key, Predicate<T> of) implements Field<T> {

  @Override
  public String key(OutputUnits units) {
    return key;
  }

  @Override
  public void writeTo(Json json, T subject) throws IOException {
    json.flag(key, of.test(subject));
  }

  @Override
  public String cell(T subject, OutputUnits units) {
    return Boolean.toString(of.test(subject));
  }
}
