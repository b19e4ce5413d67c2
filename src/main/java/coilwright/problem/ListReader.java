package coilwright.problem;

import coilwright.spring.Kind;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;

/**
 * Reads lists of single values; one value alone is a list of one.
 *
 * @param <T> the kind of value
 */
final class ListReader<T> implements ValueReader<List<T>> {

  private final ValueReader<T> item;
  private final Function<T, Object> identity;

  /**
   * A reader of lists.
   *
   * @param item reads the items
   * @param identity what makes two items the same
   */
  ListReader(ValueReader<T> item, Function<T, Object> identity) {
    this.item = item;
    this.identity = identity;
  }

  @Override
  public Optional<List<T>> read(Node node, Spot spot) {
    if (node instanceof Node.Scalar) {
      return item.read(node, spot).map(List::of);
    }
    if (node instanceof Node.Sequence list) {
      return items(list, spot);
    }
    spot.refuse(node, accepted());
    return Optional.empty();
  }

  private Optional<List<T>> items(Node.Sequence list, Spot spot) {
    if (list.items().isEmpty()) {
      spot.fault("an empty list", "must hold one or more, or be left out");
      return Optional.empty();
    }
    List<T> values = new ArrayList<>();
    Map<Object, String> seen = new HashMap<>();
    for (int i = 0; i < list.items().size(); i++) {
      Node node = list.items().get(i);
      Spot place = spot.item(node.mark(), i);
      Optional<T> value = item.read(node, place);
      value.ifPresent(values::add);
      value
          .map(v -> seen.putIfAbsent(identity.apply(v), place.path()))
          .ifPresent(earlier -> place.fault(node.shown(), "must stand once; it is " + earlier));
    }
    return values.size() == list.items().size() ? Optional.of(values) : Optional.empty();
  }

  @Override
  public String accepted() {
    return item.accepted() + ", or a list of such";
  }

  @Override
  public Form form(Kind kind) {
    Form one = item.form(kind);
    return new Form.Either(List.of(one, new Form.Many(one, !(one instanceof Form.Text))));
  }
}
