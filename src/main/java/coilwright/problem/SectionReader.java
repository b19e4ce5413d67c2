package coilwright.problem;

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
    return accepted(path);
  }

  @Override
  public String written() {
    return "a block of keys";
  }

  @Override
  public boolean omits(Node node) {
    return node.isEmpty();
  }

  @Override
  public Form form() {
    return Forms.block(path);
  }

  /**
   * What a block accepts, in words.
   *
   * @param path its path in the table of keys
   * @return "a block of keys: bore, rod"
   */
  static String accepted(String path) {
    return "a block of keys: " + String.join(", ", KeyTable.names(path));
  }
}
