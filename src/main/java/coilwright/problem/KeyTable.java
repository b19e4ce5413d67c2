package coilwright.problem;

import coilwright.spring.Kind;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Every key of a problem file: one row each, or one for each kind of spring where they differ. */
public final class KeyTable {

  /** The rows in the order of a problem file. */
  static final List<ProblemKey<?>> ROWS = rows();

  private static final Map<Kind, Map<String, List<ProblemKey<?>>>> BY_PARENT = byParent();

  private KeyTable() {}

  /**
   * The rows of a block.
   *
   * @param kind the kind of spring
   * @param parent the block's path; empty for the top
   * @return its rows
   */
  static List<ProblemKey<?>> children(Kind kind, String parent) {
    return BY_PARENT.get(kind).getOrDefault(parent, List.of());
  }

  /**
   * The keys accepted in a block.
   *
   * @param kind the kind of spring
   * @param parent the block's path; empty for the top
   * @return the keys
   */
  static List<String> names(Kind kind, String parent) {
    List<String> names = new ArrayList<>();
    children(kind, parent).forEach(key -> names.add(key.name()));
    return names;
  }

  /**
   * The kinds of springs whose files have a key.
   *
   * @param parent the path of its block; empty for the top
   * @param name the key
   * @return the kinds; none where it is unknown there
   */
  static List<Kind> kindsOf(String parent, String name) {
    List<Kind> kinds = new ArrayList<>();
    for (Kind kind : Kind.values()) {
      if (names(kind, parent).contains(name)) {
        kinds.add(kind);
      }
    }
    return kinds;
  }

  /**
   * Where a key stands that is known in one place only.
   *
   * @param kind the kind of spring
   * @param name the key
   * @return its path, or empty where there is none or more than one
   */
  static Optional<String> pathOf(Kind kind, String name) {
    List<String> paths = new ArrayList<>();
    for (ProblemKey<?> key : ROWS) {
      if (key.kinds().contains(kind) && key.name().equals(name)) {
        paths.add(key.path());
      }
    }
    return paths.size() == 1 ? Optional.of(paths.get(0)) : Optional.empty();
  }

  /** The table in Markdown: key, kinds, how it is written, what holds where left out, meaning. */
  public static String markdown() {
    return KeyMarkdown.of(ROWS);
  }

  /**
   * The form of a problem file: every key with what may stand there.
   *
   * @param kind the kind of spring
   */
  public static Form.Block form(Kind kind) {
    return Forms.block(kind, "");
  }

  /** The forms of the files of all kinds of springs, in the order of the kinds. */
  public static Map<Kind, Form.Block> forms() {
    Map<Kind, Form.Block> forms = new EnumMap<>(Kind.class);
    for (Kind kind : Kind.values()) {
      forms.put(kind, form(kind));
    }
    return forms;
  }

  private static List<ProblemKey<?>> rows() {
    List<ProblemKey<?>> rows = new ArrayList<>();
    rows.addAll(HeadKeys.ROWS);
    rows.addAll(LoadKeys.ROWS);
    rows.addAll(TorqueKeys.ROWS);
    rows.add(LoadKeys.SPRINGS_IN_PARALLEL);
    rows.addAll(EnvelopeKeys.ROWS);
    rows.addAll(MakeKeys.ROWS);
    rows.addAll(DesignKeys.ROWS);
    rows.addAll(LimitKeys.ROWS);
    rows.addAll(MaterialKeys.ROWS);
    rows.addAll(RankKeys.ROWS);
    return List.copyOf(rows);
  }

  private static Map<Kind, Map<String, List<ProblemKey<?>>>> byParent() {
    Map<Kind, Map<String, List<ProblemKey<?>>>> all = new EnumMap<>(Kind.class);
    for (Kind kind : Kind.values()) {
      Map<String, List<ProblemKey<?>>> byParent = new HashMap<>();
      for (ProblemKey<?> key : ROWS) {
        if (key.kinds().contains(kind)) {
          byParent.computeIfAbsent(key.parent(), parent -> new ArrayList<>()).add(key);
        }
      }
      all.put(kind, byParent);
    }
    return all;
  }
}
