package coilwright.problem;

import coilwright.spring.LoadLine;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * The load line of the whole group, and which facts fixed it.
 *
 * @param line rate and free length
 * @param rule the facts, in words
 */
record FixedLine(LoadLine line, String rule) {

  /**
   * The line that the facts fix. Two loads at lengths win, the longest and the shortest of them,
   * where the others' rounding matters least; then a load with the rate, a load with the free
   * length, and the rate with the free length.
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
    return full.isEmpty() ? withoutLoad(facts) : oneLoad(full.get(0), facts);
  }

  private static FixedLine twoLoads(LoadEntry a, LoadEntry b) {
    return new FixedLine(
        LoadLine.through(a.length(), a.force(), b.length(), b.force()), "two loads at lengths");
  }

  private static Optional<FixedLine> oneLoad(LoadEntry load, LoadFacts facts) {
    if (facts.rate().isPresent()) {
      double rate = facts.rate().getAsDouble();
      LoadLine line = new LoadLine(rate, load.length() + load.force() / rate);
      return Optional.of(new FixedLine(line, "a load and the rate"));
    }
    if (facts.freeLength().isPresent() && facts.freeLength().getAsDouble() > load.length()) {
      double free = facts.freeLength().getAsDouble();
      LoadLine line = new LoadLine(load.force() / (free - load.length()), free);
      return Optional.of(new FixedLine(line, "a load and the free length"));
    }
    return Optional.empty();
  }

  private static Optional<FixedLine> withoutLoad(LoadFacts facts) {
    if (facts.rate().isEmpty() || facts.freeLength().isEmpty()) {
      return Optional.empty();
    }
    LoadLine line = new LoadLine(facts.rate().getAsDouble(), facts.freeLength().getAsDouble());
    return Optional.of(new FixedLine(line, "the rate and the free length"));
  }
}
