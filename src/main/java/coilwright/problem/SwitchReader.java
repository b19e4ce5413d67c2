package coilwright.problem;

import coilwright.spring.Kind;
import java.util.List;
import java.util.Optional;

/**
 * Reads what the word {@code none} may switch off.
 *
 * @param <T> the kind of value
 * @param inner reads the value
 */
record SwitchReader<T>(ValueReader<T> inner) implements ValueReader<Setting<T>> {

  /** The word that switches off. */
  static final String NONE = "none";

  @Override
  public Optional<Setting<T>> read(Node node, Spot spot) {
    if (node instanceof Node.Scalar scalar && scalar.text().equals(NONE)) {
      return Optional.of(new Setting<>(Optional.empty()));
    }
    return inner.read(node, spot.or(NONE)).map(value -> new Setting<>(Optional.of(value)));
  }

  @Override
  public String accepted() {
    return inner.accepted() + ", or " + NONE;
  }

  @Override
  public boolean omits(Node node) {
    return inner.omits(node);
  }

  @Override
  public Form form(Kind kind) {
    return new Form.Either(List.of(inner.form(kind), new Form.Word(List.of(NONE))));
  }
}
