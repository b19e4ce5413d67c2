package coilwright.problem;

import java.util.List;
import java.util.Optional;

/**
 * What a file says about the load line, as read.
 *
 * @param form how the line runs
 * @param loads the loads with their places
 * @param facts the other facts, for the whole group of springs
 * @param fixed the line, where the facts fix it
 */
record LineRead(LineForm form, List<LoadEntry> loads, LineFacts facts, Optional<FixedLine> fixed) {

  /**
   * Reads the loads and the other facts and reports those that contradict each other.
   *
   * @param root the file
   * @param form how the line runs
   * @param keys the keys of the facts
   * @param purpose a shortlist needs the line
   * @return what was read; incomplete where there are faults
   */
  static LineRead of(Section root, LineForm form, LineKeys keys, Purpose purpose) {
    long before = root.spot().faults().count();
    List<LoadEntry> loads =
        root.require(LoadKeys.LOADS).orElse(List.of()).stream()
            .map(form.turning() ? TorqueEntry::read : LoadEntry::read)
            .toList();
    LineFacts facts = keys.read(root);
    if (root.spot().faults().count() == before) {
      new LoadOrder(form).check(loads);
      strokeBetween(root, keys, new Stroke(form, loads));
    }
    LineRead read = new LineRead(form, loads, facts, Optional.empty());
    return root.spot().faults().count() > before ? read : read.fixedBy(root, keys, purpose);
  }

  /** How many springs share the loads; one where the file does not say. */
  static int parallel(Section root) {
    return root.read(LoadKeys.SPRINGS_IN_PARALLEL).orElse(1);
  }

  private LineRead fixedBy(Section root, LineKeys keys, Purpose purpose) {
    long before = root.spot().faults().count();
    Optional<FixedLine> line = FixedLine.by(form, loads, facts);
    if (line.isPresent()) {
      new Agreement(root, keys, line.get()).check(loads, facts);
      return new LineRead(form, loads, facts, line);
    }
    Unloaded.check(form, loads, facts.zero());
    boolean asked = purpose == Purpose.SHORTLIST && !keys.misspeltIn(root);
    if (asked && root.spot().faults().count() == before) {
      root.spot(LoadKeys.LOADS).fault("the facts do not fix the load line", keys.remedy());
    }
    return this;
  }

  /** Reports a stroke that belongs to nothing. */
  private static void strokeBetween(Section root, LineKeys keys, Stroke stroke) {
    if (!root.has(keys.stroke()) || stroke.byLoads() || stroke.byPlaces()) {
      return;
    }
    String place = stroke.form().place();
    String load = stroke.form().load();
    String shown = root.shown(keys.stroke());
    Spot spot = root.spot(keys.stroke());
    if (stroke.loads().size() == 1 && !stroke.form().startsFree()) {
      spot.fault(
          shown + " beside one load",
          "must go with two: how far the free length is from one depends on the initial tension");
    } else {
      spot.fault(
          shown + " between loads of which some lack their " + load,
          "must go with loads that all give a "
              + load
              + ", or that all give "
              + (place.equals("angle") ? "an " : "a ")
              + place);
    }
  }
}
