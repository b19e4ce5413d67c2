package coilwright.problem;

import coilwright.spring.Kind;
import java.util.List;
import java.util.stream.Stream;

/** Problem files to start from, made from the rows of the table of keys. */
public final class Starter {

  private static final int COMMENT_COLUMN = 42;

  private static final String OFF = "# ";

  private final StringBuilder text = new StringBuilder();

  private final Kind kind;

  private Starter(Kind kind) {
    this.kind = kind;
  }

  /**
   * A commented problem file, in YAML: valid for a shortlist as it stands, with every key in it.
   * Keys that may be left out stand behind a "# " of their own; in front of a block that is left
   * out each line has another, at its beginning.
   *
   * @param kind the kind of spring
   */
  public static String of(Kind kind) {
    Starter starter = new Starter(kind);
    starter
        .text
        .append("# The loads ")
        .append(article(kind))
        .append(kind.id())
        .append(" spring must carry, and the space it has.\n");
    starter.text.append(
        "# To use a key, drop the \"# \" before it; to use a block, drop the \"# \"");
    starter.text.append(" at the beginning of all its lines.\n");
    starter.text.append("# For check, use the block design, and drop the block make.\n\n");
    starter.keys("", "", "");
    return starter.text.toString();
  }

  /**
   * The article before the word of a kind.
   *
   * @param kind the kind
   */
  static String article(Kind kind) {
    return kind == Kind.EXTENSION ? "an " : "a ";
  }

  private void keys(String parent, String before, String indent) {
    for (ProblemKey<?> key : KeyTable.children(kind, parent)) {
      if (key.examples().isEmpty()) {
        block(key, indent);
      } else {
        line(before + indent, isOn(key), entry(key, 0), comment(key));
      }
    }
  }

  /** Whether a key is in use where its block is: the file would not be valid without it. */
  private boolean isOn(ProblemKey<?> key) {
    return !key.optional()
        || HeadKeys.ROWS.contains(key)
        || Alternatives.ALL.stream().anyMatch(some -> some.needed() && some.keys().get(0) == key);
  }

  private void block(ProblemKey<?> key, String indent) {
    List<ProblemKey<?>> itemKeys = KeyTable.children(kind, key.path() + "[]");
    String before = key.optional() && needsMore(key) ? OFF : "";
    text.append('\n');
    line(before + indent, true, key.name() + ":", key.help());
    if (itemKeys.isEmpty()) {
      keys(key.path(), before, indent + "  ");
    } else {
      items(itemKeys, before + indent + "  ");
    }
  }

  /** Whether something in a block must be given. */
  private boolean needsMore(ProblemKey<?> block) {
    return Stream.of("", "[]")
        .flatMap(list -> KeyTable.children(kind, block.path() + list).stream())
        .anyMatch(key -> !key.optional());
  }

  /** The items of a list: the first with every key, each further one with what it adds. */
  private void items(List<ProblemKey<?>> keys, String before) {
    int count = keys.stream().mapToInt(key -> key.examples().size()).max().orElse(0);
    for (int item = 0; item < count; item++) {
      String lead = "- ";
      for (ProblemKey<?> key : keys) {
        if (item < key.examples().size()) {
          line(before + lead, isOn(key), entry(key, item), item == 0 ? comment(key) : "");
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

  private void line(String before, boolean on, String entry, String comment) {
    String start = before + (on ? "" : OFF) + entry;
    text.append(start);
    if (!comment.isEmpty()) {
      text.append(" ".repeat(Math.max(1, COMMENT_COLUMN - start.length()))).append(OFF);
    }
    text.append(comment).append('\n');
  }
}
