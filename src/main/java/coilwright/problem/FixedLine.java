package coilwright.problem;

import coilwright.spring.LoadLine;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What the facts fix of the load line of the whole group, and which of them did.
 *
 * @param rate R [N/mm]
 * @param freeLength L0 [mm]; empty where no length is given and the shortest is to be found
 * @param rule the facts, in words
 */
record FixedLine(double rate, OptionalDouble freeLength, String rule) {

  /**
   * The line that the facts fix. Two loads at lengths win, the longest and the shortest of them,
   * where the others' rounding matters least; then a load with the rate, with the stroke, or with
   * the free length; then the rate or the stroke with the free length, or alone.
   *
   * @param loads loads that do not contradict each other
   * @param facts the same loads with the other facts
   * @return the line, or empty where they do not fix one
   */
  static Optional<FixedLine> by(List<LoadEntry> loads, LoadFacts facts) {
    List<LoadEntry> full =
        loads.stream()
            .filter(LoadEntry::isFull)
            .sorted(Comparator.comparingDouble(LoadEntry::length).reversed())
            .toList();
    if (full.size() >= 2) {
      return Optional.of(twoLoads(full.get(0), full.get(full.size() - 1)));
    }
    Optional<FixedLine> rated = rated(loads, facts);
    return full.isEmpty()
        ? rated.flatMap(one -> one.open(loads, facts))
        : oneLoad(full, facts, rated);
  }

  /** The line itself; only where the free length is fixed. */
  LoadLine line() {
    return new LoadLine(rate, freeLength.orElseThrow());
  }

  private static FixedLine twoLoads(LoadEntry a, LoadEntry b) {
    LoadLine line = LoadLine.through(a.length(), a.force(), b.length(), b.force());
    return of(line, "two loads at lengths");
  }

  private static FixedLine of(LoadLine line, String rule) {
    return new FixedLine(line.rate(), OptionalDouble.of(line.freeLength()), rule);
  }

  /** The rate, where it is given or the stroke belongs to known forces. */
  private static Optional<FixedLine> rated(List<LoadEntry> loads, LoadFacts facts) {
    OptionalDouble none = OptionalDouble.empty();
    if (facts.rate().isPresent()) {
      return Optional.of(new FixedLine(facts.rate().getAsDouble(), none, "the rate"));
    }
    Stroke stroke = new Stroke(loads);
    if (facts.stroke().isEmpty() || !stroke.byForces() || !(stroke.force() > 0)) {
      return Optional.empty();
    }
    double rate = stroke.force() / facts.stroke().getAsDouble();
    return Optional.of(new FixedLine(rate, none, stroke.rule()));
  }

  private static Optional<FixedLine> oneLoad(
      List<LoadEntry> full, LoadFacts facts, Optional<FixedLine> rated) {
    double length = full.get(0).length();
    double force = full.get(0).force();
    if (rated.isPresent()) {
      double rate = rated.get().rate();
      LoadLine line = new LoadLine(rate, length + force / rate);
      return Optional.of(of(line, "a load and " + rated.get().rule()));
    }
    if (facts.freeLength().isPresent() && facts.freeLength().getAsDouble() > length) {
      double free = facts.freeLength().getAsDouble();
      LoadLine line = new LoadLine(force / (free - length), free);
      return Optional.of(of(line, "a load and the free length"));
    }
    return Optional.empty();
  }

  /** With the free length, or with every length left open. */
  private Optional<FixedLine> open(List<LoadEntry> loads, LoadFacts facts) {
    if (facts.freeLength().isPresent()) {
      double free = facts.freeLength().getAsDouble();
      return Optional.of(of(new LoadLine(rate, free), rule + " and the free length"));
    }
    boolean open = loads.stream().allMatch(load -> load.asked().length().isEmpty());
    return open ? Optional.of(this) : Optional.empty();
  }
}
