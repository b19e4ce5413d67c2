package coilwright.problem;

import java.util.List;

/**
 * One key of problem files: the row from which come its acceptance, the hints, the starter file and
 * the table of keys.
 *
 * @param <T> the kind of its value
 * @param path its path, lists without index: "loads[].length"
 * @param reader reads its value
 * @param omitted what happens where it is left out, in words; empty where it must be given
 * @param help what it means, in one line
 * @param examples how it may be written, for the starter file; two for the two loads there
 */
record ProblemKey<T>(
    String path, ValueReader<T> reader, String omitted, String help, List<String> examples) {

  /**
   * A key.
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
    return new ProblemKey<>(path, reader, omitted, help, List.of(examples));
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
