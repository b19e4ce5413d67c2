package coilwright.problem;

import coilwright.spring.Kind;
import coilwright.unit.Spelling;
import java.util.ArrayList;
import java.util.List;

/**
 * Finds the kind of spring that a file is read as, before its keys are judged: the one that the
 * file names; else the one whose word is nearest, or whose keys are the most in the file, so that
 * the other faults still make sense.
 */
final class KindPeek {

  private static final int DEEPEST = 4;

  private KindPeek() {}

  /**
   * Finds it.
   *
   * @param root the file
   * @return the kind
   */
  static Kind of(Node root) {
    List<String> ids = new ArrayList<>();
    for (Kind kind : Kind.values()) {
      ids.add(kind.id());
    }
    String word = word(root);
    int at = ids.indexOf(word);
    if (at < 0) {
      at = Spelling.nearest(word, ids).map(ids::indexOf).orElse(-1);
    }
    return at < 0 ? byKeys(root) : Kind.values()[at];
  }

  private static String word(Node root) {
    if (root instanceof Node.Mapping mapping) {
      for (Node.Entry entry : mapping.entries()) {
        if (entry.key().equals(HeadKeys.SPRING.name())
            && entry.value() instanceof Node.Scalar scalar) {
          return scalar.text();
        }
      }
    }
    return "";
  }

  /** The kind to which the fewest keys are foreign; the first of them where several are equal. */
  private static Kind byKeys(Node root) {
    Kind best = Kind.COMPRESSION;
    for (Kind kind : Kind.values()) {
      if (foreign(root, "", kind, 0) < foreign(root, "", best, 0)) {
        best = kind;
      }
    }
    return best;
  }

  /** How many keys another kind of spring has and this one has not. */
  private static int foreign(Node node, String path, Kind kind, int depth) {
    int count = 0;
    if (node instanceof Node.Mapping mapping && depth < DEEPEST) {
      for (Node.Entry entry : mapping.entries()) {
        List<Kind> kinds = KeyTable.kindsOf(path, entry.key());
        count += kinds.isEmpty() || kinds.contains(kind) ? 0 : 1;
        String inner = path.isEmpty() ? entry.key() : path + "." + entry.key();
        count += kinds.isEmpty() ? 0 : foreign(entry.value(), inner, kind, depth + 1);
      }
    } else if (node instanceof Node.Sequence list && depth < DEEPEST) {
      for (Node item : list.items()) {
        count += foreign(item, path + "[]", kind, depth);
      }
    }
    return count;
  }
}
