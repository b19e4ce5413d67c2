package coilwright.report;

import java.io.IOException;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/**
 * Values of a spring that stand together: keys, an object or a list in JSON, columns in CSV.
 *
 * @param <S> what has the values
 */
interface SpringPart<S> {

  /** Writes them. */
  void writeTo(Json json, S spring) throws IOException;

  /**
   * Adds their columns.
   *
   * @param columns the table
   * @param spring the spring of a row; empty in a row without one
   * @param <T> a row
   */
  <T> void addTo(Columns<T> columns, Function<T, Optional<S>> spring);

  /** Keys of the spring itself. */
  static <S> SpringPart<S> of(List<? extends Field<? super S>> fields) {
    return new Flat<>(fields);
  }

  /**
   * An object; its columns begin with its key.
   *
   * @param key the key
   * @param fields its values
   * @param part what has them; empty where it does not apply
   */
  static <S, U> SpringPart<S> object(
      String key, List<? extends Field<? super U>> fields, Function<S, Optional<U>> part) {
    return new Inner<>(key, fields, part);
  }

  /**
   * A list; the columns of each item begin with the word for one and its number.
   *
   * @param key the key
   * @param one the word for one
   * @param count how many columns of items there are
   * @param fields the values of an item
   * @param items the items
   */
  static <S, U> SpringPart<S> list(
      String key,
      String one,
      int count,
      List<? extends Field<? super U>> fields,
      Function<S, List<U>> items) {
    return new Items<>(key, one, count, fields, items);
  }

  /** See {@link #of}. */
  record Flat<S>(List<? extends Field<? super S>> fields) implements SpringPart<S> {

    @Override
    public void writeTo(Json json, S spring) throws IOException {
      json.fields(fields, spring);
    }

    @Override
    public <T> void addTo(Columns<T> columns, Function<T, Optional<S>> spring) {
      columns.addPart("", fields, spring);
    }
  }

  /** See {@link #object}. */
  record Inner<S, U>(
      String key, List<? extends Field<? super U>> fields, Function<S, Optional<U>> part)
      implements SpringPart<S> {

    @Override
    public void writeTo(Json json, S spring) throws IOException {
      Optional<U> inner = part.apply(spring);
      if (inner.isPresent()) {
        json.object(key, body -> body.fields(fields, inner.get()));
      }
    }

    @Override
    public <T> void addTo(Columns<T> columns, Function<T, Optional<S>> spring) {
      columns.addPart(key + "_", fields, row -> spring.apply(row).flatMap(part));
    }
  }

  /** See {@link #list}. */
  record Items<S, U>(
      String key,
      String one,
      int count,
      List<? extends Field<? super U>> fields,
      Function<S, List<U>> items)
      implements SpringPart<S> {

    @Override
    public void writeTo(Json json, S spring) throws IOException {
      json.array(
          key,
          list -> {
            for (U item : items.apply(spring)) {
              list.braces(body -> body.fields(fields, item));
            }
          });
    }

    @Override
    public <T> void addTo(Columns<T> columns, Function<T, Optional<S>> spring) {
      for (int i = 0; i < count; i++) {
        int item = i;
        columns.addPart(
            one + "_" + (i + 1) + "_",
            fields,
            row -> spring.apply(row).map(at -> items.apply(at).get(item)));
      }
    }
  }
}
