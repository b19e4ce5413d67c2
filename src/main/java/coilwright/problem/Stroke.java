package coilwright.problem;

import java.util.List;

/**
 * What a stroke belongs to: the way from the least load to the greatest, or from the free spring to
 * the load where there is only one.
 *
 * @param form how the line runs
 * @param loads the loads
 */
record Stroke(LineForm form, List<LoadEntry> loads) {

  /** Whether every load gives its force or torque, and there are two where the line needs them. */
  boolean byLoads() {
    return (form.startsFree() || loads.size() > 1)
        && loads.stream().allMatch(load -> load.carries().isPresent());
  }

  /** Whether every load gives its place, and there are two or more. */
  boolean byPlaces() {
    return loads.size() > 1 && loads.stream().allMatch(load -> load.at().isPresent());
  }

  /** The difference of the loads at its ends [N or N mm]. */
  double load() {
    double greatest = loads.stream().mapToDouble(LoadEntry::load).max().orElse(0);
    double least = loads.stream().mapToDouble(LoadEntry::load).min().orElse(0);
    return loads.size() > 1 ? greatest - least : greatest;
  }

  /** The difference of the places at its ends [mm or rad]. */
  double way() {
    return loads.stream().mapToDouble(LoadEntry::place).max().orElse(0)
        - loads.stream().mapToDouble(LoadEntry::place).min().orElse(0);
  }

  /** In words. */
  String rule() {
    return loads.size() > 1
        ? "the stroke between the " + form.load() + "s"
        : "the stroke from " + form.zero() + " to the " + form.load();
  }
}
