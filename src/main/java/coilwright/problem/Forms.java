package coilwright.problem;

import coilwright.spring.Kind;
import java.util.ArrayList;
import java.util.List;

/** Makes the forms of blocks from the rows of the table of keys. */
final class Forms {

  private static final Node NOTHING = new Node.Scalar(Mark.FILE, "");

  private Forms() {}

  /**
   * The form of a block.
   *
   * @param kind the kind of spring
   * @param path its path in the table of keys; empty for the file
   * @return the form
   */
  static Form.Block block(Kind kind, String path) {
    List<Form.Key> keys = new ArrayList<>();
    KeyTable.children(kind, path).forEach(key -> keys.add(key(kind, key)));
    List<Form.Choice> choices = new ArrayList<>();
    for (Alternatives some : Alternatives.ALL) {
      if (some.parent().equals(path) && some.standsFor(kind)) {
        choices.add(some.form());
      }
    }
    return new Form.Block(keys, choices);
  }

  private static Form.Key key(Kind kind, ProblemKey<?> key) {
    boolean instead = Alternatives.ALL.stream().anyMatch(some -> some.keys().contains(key));
    return new Form.Key(
        key.name(),
        key.reader().form(kind),
        !key.optional() && !instead,
        key.optional() && key.reader().omits(NOTHING),
        key.help(),
        key.reader().accepted(),
        key.omitted(),
        key.examples());
  }
}
