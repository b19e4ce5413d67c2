package coilwright.problem;

import java.util.Comparator;

/**
 * A place in a problem file.
 *
 * @param line from 1; 0 where no line applies
 * @param column from 1; 0 where no line applies
 */
record Mark(int line, int column) implements Comparable<Mark> {

  /** The file as a whole. */
  static final Mark FILE = new Mark(0, 0);

  private static final Comparator<Mark> ORDER =
      Comparator.comparingInt(Mark::line).thenComparingInt(Mark::column);

  @Override
  public int compareTo(Mark other) {
    return ORDER.compare(this, other);
  }
}
