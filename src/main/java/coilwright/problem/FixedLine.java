package coilwright.problem;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What the facts fix of the load line of the whole group, and which of them did.
 *
 * @param form how the line runs
 * @param rate R [N/mm or N mm/rad]
 * @param zero the place without load [mm or rad]; empty where no place is given
 * @param rule the facts, in words
 */
record FixedLine(LineForm form, double rate, OptionalDouble zero, String rule) {

  /**
   * The line that the facts fix. Two loads at places win, the least and the most loaded of them,
   * where the others' rounding matters least; then a load with the rate, with the stroke, or with
   * the place without load; then the rate or the stroke with that place, or alone.
   *
   * @param form how the line runs
   * @param loads loads that do not contradict each other
   * @param facts the other facts
   * @return the line, or empty where they do not fix one
   */
  static Optional<FixedLine> by(LineForm form, List<LoadEntry> loads, LineFacts facts) {
    List<LoadEntry> full =
        loads.stream().filter(LoadEntry::isFull).sorted(LoadOrder.rising(form)).toList();
    if (full.size() >= 2) {
      return Optional.of(twoLoads(form, full.get(0), full.get(full.size() - 1)));
    }
    Optional<FixedLine> rated = rated(form, loads, facts);
    return full.isEmpty()
        ? rated.flatMap(one -> one.open(loads, facts))
        : oneLoad(form, full.get(0), facts, rated);
  }

  /**
   * The load at a place; only where the place without load is fixed.
   *
   * @param place length [mm] or angle [rad]
   * @return force [N] or torque [N mm]
   */
  double loadAt(double place) {
    double from = zero.orElseThrow();
    return rate * (form.falling() ? from - place : place - from);
  }

  /**
   * The place under a load; only where the place without load is fixed.
   *
   * @param load force [N] or torque [N mm]
   * @return length [mm] or angle [rad]
   */
  double placeUnder(double load) {
    return loaded(form, zero.orElseThrow(), load / rate);
  }

  private static double loaded(LineForm form, double from, double way) {
    return form.falling() ? from - way : from + way;
  }

  private static FixedLine twoLoads(LineForm form, LoadEntry a, LoadEntry b) {
    double rate = (b.load() - a.load()) / Math.abs(b.place() - a.place());
    return through(form, a, rate, "two loads at " + form.place() + "s");
  }

  private static FixedLine through(LineForm form, LoadEntry load, double rate, String rule) {
    double zero = loaded(form, load.place(), -load.load() / rate);
    return new FixedLine(form, rate, OptionalDouble.of(zero), rule);
  }

  /** The rate, where it is given or the stroke belongs to known loads. */
  private static Optional<FixedLine> rated(LineForm form, List<LoadEntry> loads, LineFacts facts) {
    OptionalDouble none = OptionalDouble.empty();
    if (facts.rate().isPresent()) {
      return Optional.of(new FixedLine(form, facts.rate().getAsDouble(), none, "the rate"));
    }
    Stroke stroke = new Stroke(form, loads);
    if (facts.stroke().isEmpty() || !stroke.byLoads() || !(stroke.load() > 0)) {
      return Optional.empty();
    }
    double rate = stroke.load() / facts.stroke().getAsDouble();
    return Optional.of(new FixedLine(form, rate, none, stroke.rule()));
  }

  private static Optional<FixedLine> oneLoad(
      LineForm form, LoadEntry load, LineFacts facts, Optional<FixedLine> rated) {
    if (rated.isPresent()) {
      String rule = "a load and " + rated.get().rule();
      return Optional.of(through(form, load, rated.get().rate(), rule));
    }
    if (facts.zero().isEmpty()) {
      return Optional.empty();
    }
    double zero = facts.zero().getAsDouble();
    double way = form.falling() ? zero - load.place() : load.place() - zero;
    return way > 0
        ? Optional.of(
            new FixedLine(form, load.load() / way, facts.zero(), "a load and " + form.zero()))
        : Optional.empty();
  }

  /** With the place without load, or with every place left open. */
  private Optional<FixedLine> open(List<LoadEntry> loads, LineFacts facts) {
    if (facts.zero().isPresent()) {
      return Optional.of(new FixedLine(form, rate, facts.zero(), rule + " and " + form.zero()));
    }
    boolean open = loads.stream().allMatch(load -> load.at().isEmpty());
    return open ? Optional.of(this) : Optional.empty();
  }
}
