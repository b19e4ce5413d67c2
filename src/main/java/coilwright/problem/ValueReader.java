package coilwright.problem;

import coilwright.spring.Kind;
import java.util.Optional;
import java.util.function.Function;

/**
 * Reads one kind of value. It reports what is wrong, returns what it can, and never throws.
 *
 * @param <T> the kind
 */
interface ValueReader<T> {

  /**
   * Reads a value.
   *
   * @param node what stands in the file
   * @param spot its place, which takes faults
   * @return the value, or empty where it is faulty
   */
  Optional<T> read(Node node, Spot spot);

  /** What it accepts, in words: "a length in mm, um, cm, m, in or ft". */
  String accepted();

  /**
   * The same where the keys of a block may be told: which they are depends on the kind of spring.
   *
   * @param kind the kind of spring
   */
  default String accepted(Kind kind) {
    return accepted();
  }

  /**
   * What a value that it accepts looks like; nothing that it accepts is left out of the form.
   *
   * @param kind the kind of spring
   */
  Form form(Kind kind);

  /**
   * Whether something that stands in the file counts as left out, as an empty section does.
   *
   * @param node what stands in the file
   * @return true if the key is as good as omitted
   */
  default boolean omits(Node node) {
    return false;
  }

  /**
   * This reader with its values turned into another kind.
   *
   * @param <U> the other kind
   * @param turn how
   * @return the reader
   */
  default <U> ValueReader<U> map(Function<T, U> turn) {
    ValueReader<T> inner = this;
    return new ValueReader<>() {
      @Override
      public Optional<U> read(Node node, Spot spot) {
        return inner.read(node, spot).map(turn);
      }

      @Override
      public String accepted() {
        return inner.accepted();
      }

      @Override
      public Form form(Kind kind) {
        return inner.form(kind);
      }
    };
  }
}
