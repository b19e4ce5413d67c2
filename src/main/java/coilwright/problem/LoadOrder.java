package coilwright.problem;

import java.util.Comparator;
import java.util.List;

/**
 * Checks that loads can lie on one falling line: lengths differ, and force rises as length falls.
 */
final class LoadOrder {

  private static final double SAME = 1e-9;

  private LoadOrder() {}

  /**
   * Reports loads that contradict each other.
   *
   * @param loads the loads
   */
  static void check(List<LoadEntry> loads) {
    List<LoadEntry> lengths =
        loads.stream()
            .filter(load -> load.asked().length().isPresent())
            .sorted(Comparator.comparingDouble(LoadEntry::length).reversed())
            .toList();
    for (int i = 1; i < lengths.size(); i++) {
      if (same(lengths.get(i - 1).length(), lengths.get(i).length())) {
        repeated(lengths.get(i - 1), lengths.get(i), LoadKeys.LENGTH);
      }
    }
    repeatedForces(loads);
    List<LoadEntry> full = lengths.stream().filter(LoadEntry::isFull).toList();
    for (int i = 1; i < full.size(); i++) {
      rising(full.get(i - 1), full.get(i));
    }
  }

  private static void repeatedForces(List<LoadEntry> loads) {
    List<LoadEntry> forces =
        loads.stream()
            .filter(load -> load.asked().force().isPresent() && !load.isFull())
            .sorted(Comparator.comparingDouble(LoadEntry::force))
            .toList();
    for (int i = 1; i < forces.size(); i++) {
      if (same(forces.get(i - 1).force(), forces.get(i).force())) {
        repeated(forces.get(i - 1), forces.get(i), LoadKeys.FORCE);
      }
    }
  }

  private static void repeated(LoadEntry a, LoadEntry b, ProblemKey<?> key) {
    boolean inOrder = a.section().spot().mark().compareTo(b.section().spot().mark()) <= 0;
    Section earlier = (inOrder ? a : b).section();
    Section later = (inOrder ? b : a).section();
    later.spot(key).fault(later.shown(key), "must differ from " + earlier.spot(key).path());
  }

  private static void rising(LoadEntry longer, LoadEntry shorter) {
    if (same(longer.length(), shorter.length()) || shorter.force() > longer.force()) {
      return;
    }
    Section section = shorter.section();
    section
        .spot(LoadKeys.FORCE)
        .fault(
            section.shown(LoadKeys.FORCE) + " at " + section.shown(LoadKeys.LENGTH),
            "must be above the "
                + longer.section().shown(LoadKeys.FORCE)
                + " at "
                + longer.section().shown(LoadKeys.LENGTH)
                + ": a shorter length needs a greater force");
  }

  private static boolean same(double a, double b) {
    return Math.abs(a - b) <= SAME * Math.max(a, b);
  }
}
