package coilwright.problem;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.PriorityQueue;

/** Collects the faults of a file and keeps the first of them in file order. */
final class Faults {

  /** How many faults are reported one by one. */
  static final int SHOWN = 50;

  private static final Comparator<Placed> IN_FILE_ORDER =
      Comparator.comparing(Placed::mark).thenComparingLong(Placed::number);

  private final PriorityQueue<Placed> first = new PriorityQueue<>(IN_FILE_ORDER.reversed());
  private long count;
  private long again;

  /**
   * Adds a fault.
   *
   * @param mark where it is
   * @param fault the fault
   */
  void add(Mark mark, Fault fault) {
    first.add(new Placed(mark, count++, fault));
    if (first.size() > SHOWN) {
      first.remove();
    }
  }

  /** Drops all faults found so far: a syntax error stands alone. */
  void clear() {
    first.clear();
    count = 0;
    again = 0;
  }

  /** Notes that a fault that was added earlier was met again. */
  void again() {
    again++;
  }

  /** How many faults have been added or met again: what rises while something faulty is read. */
  long count() {
    return count + again;
  }

  /** Whether so many faults have been found that hints are no longer worth their time. */
  boolean beyondHints() {
    return count > 10 * SHOWN;
  }

  /** The first faults in file order; where there are more, one line at the end says how many. */
  List<Fault> list() {
    List<Fault> faults = new ArrayList<>();
    first.stream().sorted(IN_FILE_ORDER).map(Placed::fault).forEach(faults::add);
    if (count > SHOWN) {
      faults.add(
          new Fault(
              0,
              "",
              (count - SHOWN) + " more faults are not shown",
              "correct these first",
              Optional.empty()));
    }
    return faults;
  }

  /** A fault, where it is, and how many were found before it. */
  private record Placed(Mark mark, long number, Fault fault) {}
}
