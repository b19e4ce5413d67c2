package coilwright.problem;

import java.util.List;

/**
 * What a stroke belongs to: the way from the least load to the greatest, or from the free length to
 * the load where there is only one.
 *
 * @param loads the loads
 */
record Stroke(List<LoadEntry> loads) {

  /** Whether every load gives its force. */
  boolean byForces() {
    return loads.stream().allMatch(load -> load.asked().force().isPresent());
  }

  /** Whether every load gives its length, and there are two or more. */
  boolean byLengths() {
    return loads.size() > 1 && loads.stream().allMatch(load -> load.asked().length().isPresent());
  }

  /** The difference of the forces at its ends [N]. */
  double force() {
    double greatest = loads.stream().mapToDouble(LoadEntry::force).max().orElse(0);
    double least = loads.stream().mapToDouble(LoadEntry::force).min().orElse(0);
    return loads.size() > 1 ? greatest - least : greatest;
  }

  /** The difference of the lengths at its ends [mm]. */
  double length() {
    return loads.stream().mapToDouble(LoadEntry::length).max().orElse(0)
        - loads.stream().mapToDouble(LoadEntry::length).min().orElse(0);
  }

  /** In words. */
  String rule() {
    return loads.size() > 1
        ? "the stroke between the forces"
        : "the stroke from the free length to the force";
  }
}
