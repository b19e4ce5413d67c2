package coilwright.problem;

import coilwright.spring.Kind;
import java.util.List;

/**
 * One key of problem files: the row from which come its acceptance, the hints, the starter file and
 * the table of keys. Where a key differs from kind to kind, it has a row for each.
 *
 * @param <T> the kind of its value
 * @param path its path, lists without index: "loads[].length"
 * @param kinds the kinds of springs in whose files it may stand, one or more
 * @param reader reads its value
 * @param omitted what happens where it is left out, in words; empty where it must be given
 * @param help what it means, in one line
 * @param examples how it may be written, for the starter file; two for the two loads there
 */
record ProblemKey<T>(
    String path,
    List<Kind> kinds,
    ValueReader<T> reader,
    String omitted,
    String help,
    List<String> examples) {

  private static final List<Kind> ALL = List.of(Kind.values());

  /**
   * A key of every kind of spring.
   *
   * @param <T> the kind of its value
   * @param path its path
   * @param reader reads its value
   * @param omitted what happens where it is left out; empty where it must be given
   * @param help what it means
   * @param examples how it may be written
   * @return the row
   */
  static <T> ProblemKey<T> of(
      String path, ValueReader<T> reader, String omitted, String help, String... examples) {
    return new ProblemKey<>(path, ALL, reader, omitted, help, List.of(examples));
  }

  /**
   * A block of keys.
   *
   * @param path its path
   * @param omitted what happens where it is left out
   * @param help what it holds
   * @return the row
   */
  static ProblemKey<Section> section(String path, String omitted, String help) {
    return of(path, new SectionReader(path), omitted, help);
  }

  /**
   * The same key for some kinds of springs only.
   *
   * @param some the kinds, one or more
   * @return the row
   */
  ProblemKey<T> only(Kind... some) {
    return new ProblemKey<>(path, List.of(some), reader, omitted, help, examples);
  }

  /**
   * The same key, written otherwise in starter files.
   *
   * @param others how it may be written
   * @return the row
   */
  ProblemKey<T> shown(String... others) {
    return new ProblemKey<>(path, kinds, reader, omitted, help, List.of(others));
  }

  /** Whether it may be left out. */
  boolean optional() {
    return !omitted.isEmpty();
  }

  /** The last part of the path: the key itself. */
  String name() {
    return path.substring(path.lastIndexOf('.') + 1);
  }

  /** The path of the block it stands in; empty at the top. */
  String parent() {
    return path.substring(0, Math.max(0, path.lastIndexOf('.')));
  }
}
