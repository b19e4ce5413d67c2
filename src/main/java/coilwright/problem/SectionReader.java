package coilwright.problem;

import coilwright.spring.Kind;
import java.util.Optional;

/**
 * Reads blocks of keys; an empty one counts as left out.
 *
 * @param path the block's path in the table of keys
 */
record SectionReader(String path) implements ValueReader<Section> {

  @Override
  public Optional<Section> read(Node node, Spot spot) {
    return Section.open(node, spot);
  }

  @Override
  public String accepted() {
    return "a block of keys";
  }

  @Override
  public String accepted(Kind kind) {
    return accepted(kind, path);
  }

  @Override
  public boolean omits(Node node) {
    return node.isEmpty();
  }

  @Override
  public Form form(Kind kind) {
    return Forms.block(kind, path);
  }

  /**
   * What a block accepts, in words.
   *
   * @param kind the kind of spring
   * @param path its path in the table of keys
   * @return "a block of keys: bore, rod"
   */
  static String accepted(Kind kind, String path) {
    return "a block of keys: " + String.join(", ", KeyTable.names(kind, path));
  }
}
