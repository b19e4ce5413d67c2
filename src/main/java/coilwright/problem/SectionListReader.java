package coilwright.problem;

import coilwright.spring.Kind;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Reads lists of blocks of keys.
 *
 * @param path the path of one block in the table of keys, such as "loads[]"
 */
record SectionListReader(String path) implements ValueReader<List<Section>> {

  @Override
  public Optional<List<Section>> read(Node node, Spot spot) {
    if (node instanceof Node.Sequence list && !list.items().isEmpty()) {
      List<Section> sections = new ArrayList<>();
      for (int i = 0; i < list.items().size(); i++) {
        Node item = list.items().get(i);
        Section.open(item, spot.item(item.mark(), i)).ifPresent(sections::add);
      }
      return Optional.of(sections);
    }
    if (node instanceof Node.Sequence) {
      spot.fault("an empty list", "must be " + accepted(spot.kind()));
    } else {
      spot.refuse(node, accepted(spot.kind()));
    }
    return Optional.empty();
  }

  @Override
  public String accepted() {
    return "a list of blocks of keys";
  }

  @Override
  public String accepted(Kind kind) {
    return accepted() + ": " + String.join(", ", KeyTable.names(kind, path));
  }

  @Override
  public boolean omits(Node node) {
    return node instanceof Node.Scalar && node.isEmpty();
  }

  @Override
  public Form form(Kind kind) {
    return new Form.Many(Forms.block(kind, path), false);
  }
}
