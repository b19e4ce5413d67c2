package coilwright.problem;

import java.util.Comparator;
import java.util.List;

/**
 * Checks that loads can lie on one straight line: places differ, and the load rises along them as
 * the kind of spring has it.
 *
 * @param form how the line runs
 */
record LoadOrder(LineForm form) {

  private static final double SAME = 1e-9;

  /**
   * Places in the order in which the load rises.
   *
   * @param form how the line runs
   * @return the order of loads that give their place
   */
  static Comparator<LoadEntry> rising(LineForm form) {
    Comparator<LoadEntry> rising = Comparator.comparingDouble(LoadEntry::place);
    return form.falling() ? rising.reversed() : rising;
  }

  /**
   * Reports loads that contradict each other.
   *
   * @param loads the loads
   */
  void check(List<LoadEntry> loads) {
    List<LoadEntry> places =
        loads.stream().filter(load -> load.at().isPresent()).sorted(rising(form)).toList();
    for (int i = 1; i < places.size(); i++) {
      LoadEntry before = places.get(i - 1);
      if (same(before.place(), places.get(i).place())) {
        repeated(before, places.get(i), before.placeKey());
      }
    }
    repeatedLoads(loads);
    List<LoadEntry> full = places.stream().filter(LoadEntry::isFull).toList();
    for (int i = 1; i < full.size(); i++) {
      risen(full.get(i - 1), full.get(i));
    }
  }

  private static void repeatedLoads(List<LoadEntry> loads) {
    List<LoadEntry> alone =
        loads.stream()
            .filter(load -> load.carries().isPresent() && !load.isFull())
            .sorted(Comparator.comparingDouble(LoadEntry::load))
            .toList();
    for (int i = 1; i < alone.size(); i++) {
      if (same(alone.get(i - 1).load(), alone.get(i).load())) {
        repeated(alone.get(i - 1), alone.get(i), alone.get(i).loadKey());
      }
    }
  }

  private static void repeated(LoadEntry a, LoadEntry b, ProblemKey<Double> key) {
    boolean inOrder = a.section().spot().mark().compareTo(b.section().spot().mark()) <= 0;
    LoadEntry earlier = inOrder ? a : b;
    LoadEntry later = inOrder ? b : a;
    String remedy = "must differ from ";
    if (key == later.placeKey()) {
      later.placeFault(remedy + earlier.section().spot(earlier.placeKey()).path());
    } else {
      later.loadFault(remedy + earlier.section().spot(earlier.loadKey()).path());
    }
  }

  private void risen(LoadEntry before, LoadEntry after) {
    if (same(before.place(), after.place()) || after.load() > before.load()) {
      return;
    }
    after
        .section()
        .spot(after.loadKey())
        .fault(
            after.shownLoad() + " at " + after.shownPlace(),
            "must be above the "
                + before.shownLoad()
                + " at "
                + before.shownPlace()
                + ": "
                + form.order());
  }

  private static boolean same(double a, double b) {
    return Math.abs(a - b) <= SAME * Math.max(Math.abs(a), Math.abs(b));
  }
}
