package coilwright.problem;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Every key of a problem file for a compression spring, one row each. */
public final class KeyTable {

  /** The rows in the order of a problem file. */
  static final List<ProblemKey<?>> ROWS = rows();

  private static final Map<String, List<ProblemKey<?>>> BY_PARENT = byParent();

  private KeyTable() {}

  /**
   * The rows of a block.
   *
   * @param parent the block's path; empty for the top
   * @return its rows
   */
  static List<ProblemKey<?>> children(String parent) {
    return BY_PARENT.getOrDefault(parent, List.of());
  }

  /**
   * The keys accepted in a block.
   *
   * @param parent the block's path; empty for the top
   * @return the keys
   */
  static List<String> names(String parent) {
    List<String> names = new ArrayList<>();
    children(parent).forEach(key -> names.add(key.name()));
    return names;
  }

  /**
   * Where a key stands that is known in one place only.
   *
   * @param name the key
   * @return its path, or empty where there is none or more than one
   */
  static Optional<String> pathOf(String name) {
    List<String> paths =
        ROWS.stream().filter(key -> key.name().equals(name)).<String>map(ProblemKey::path).toList();
    return paths.size() == 1 ? Optional.of(paths.get(0)) : Optional.empty();
  }

  /** The table in Markdown: key, how it is written, what holds where it is left out, meaning. */
  public static String markdown() {
    StringBuilder text = new StringBuilder("| key | written as | left out | meaning |\n");
    text.append("|---|---|---|---|\n");
    for (ProblemKey<?> key : ROWS) {
      String omitted = key.omitted().isEmpty() ? "must be given" : key.omitted();
      text.append("| `").append(key.path()).append("` | ").append(cell(key.reader().written()));
      text.append(" | ").append(cell(omitted)).append(" | ").append(cell(key.help()));
      text.append(" |\n");
    }
    return text.toString();
  }

  /** The form of a problem file: every key with what may stand there. */
  public static Form.Block form() {
    return Forms.block("");
  }

  private static String cell(String text) {
    return text.replace("|", "\\|");
  }

  private static List<ProblemKey<?>> rows() {
    List<ProblemKey<?>> rows = new ArrayList<>();
    rows.addAll(HeadKeys.ROWS);
    rows.addAll(LoadKeys.ROWS);
    rows.addAll(EnvelopeKeys.ROWS);
    rows.addAll(MakeKeys.ROWS);
    rows.addAll(DesignKeys.ROWS);
    rows.addAll(LimitKeys.ROWS);
    rows.addAll(MaterialKeys.ROWS);
    rows.addAll(RankKeys.ROWS);
    return List.copyOf(rows);
  }

  private static Map<String, List<ProblemKey<?>>> byParent() {
    Map<String, List<ProblemKey<?>>> byParent = new HashMap<>();
    for (ProblemKey<?> key : ROWS) {
      byParent.computeIfAbsent(key.parent(), parent -> new ArrayList<>()).add(key);
    }
    return byParent;
  }
}
