package coilwright.problem;

import java.util.List;

/** Problem files to start from, made from the rows of the table of keys. */
public final class Starter {

  private static final int COMMENT_COLUMN = 42;

  private final StringBuilder text = new StringBuilder();

  private Starter() {}

  /**
   * A commented problem file for a compression spring, in YAML: valid for a shortlist as it stands,
   * with every key in it. Keys that may be left out stand behind "# ".
   */
  public static String compression() {
    Starter starter = new Starter();
    starter.text.append("# The loads a compression spring must carry, and the space it has.\n");
    starter.text.append("# Drop the \"# \" before a key to use it.\n\n");
    starter.keys("", "", false);
    return starter.text.toString();
  }

  private void keys(String parent, String indent, boolean off) {
    for (ProblemKey<?> key : KeyTable.children(parent)) {
      boolean on = !key.optional() || HeadKeys.ROWS.contains(key);
      if (key.examples().isEmpty()) {
        block(key, indent, off || needsMore(key));
      } else {
        line(indent, off || !on, entry(key, 0), comment(key));
      }
    }
  }

  /** Whether a block may be left out, but not what belongs into it. */
  private static boolean needsMore(ProblemKey<?> block) {
    return block.optional()
        && KeyTable.children(block.path()).stream().anyMatch(key -> !key.optional());
  }

  private void block(ProblemKey<?> key, String indent, boolean off) {
    List<ProblemKey<?>> itemKeys = KeyTable.children(key.path() + "[]");
    boolean offList = !itemKeys.isEmpty() && key.optional();
    text.append('\n');
    line(indent, off || offList, key.name() + ":", key.help());
    if (itemKeys.isEmpty()) {
      keys(key.path(), indent + "  ", off);
    } else {
      items(itemKeys, indent + "  ", offList);
    }
  }

  /** The items of a list: the first with every key, each further one with what it adds. */
  private void items(List<ProblemKey<?>> keys, String indent, boolean off) {
    int count = keys.stream().mapToInt(key -> key.examples().size()).max().orElse(0);
    for (int item = 0; item < count; item++) {
      String lead = "- ";
      for (ProblemKey<?> key : keys) {
        if (item < key.examples().size()) {
          String comment = item == 0 ? comment(key) : "";
          line(indent, off || key.optional(), lead + entry(key, item), comment);
          lead = "  ";
        }
      }
    }
  }

  private static String entry(ProblemKey<?> key, int example) {
    return key.name() + ": " + key.examples().get(example);
  }

  private static String comment(ProblemKey<?> key) {
    if (!key.optional()) {
      return key.help();
    }
    boolean shown = key.omitted().equals(key.examples().get(0));
    return key.help() + (shown ? " (the default)" : "; left out: " + key.omitted());
  }

  private void line(String indent, boolean off, String entry, String comment) {
    String start = indent + (off ? "# " : "") + entry;
    text.append(start);
    if (!comment.isEmpty()) {
      text.append(" ".repeat(Math.max(1, COMMENT_COLUMN - start.length()))).append("# ");
    }
    text.append(comment).append('\n');
  }
}
