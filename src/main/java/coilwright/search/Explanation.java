package coilwright.search;

import coilwright.limit.CoilSet;
import coilwright.problem.LimitName;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;

/**
 * Finds, among the coil counts that each limit leaves, the limits that cannot hold together: a
 * limit that leaves none; else the pair farthest apart; else the fewest that leave nothing between
 * them.
 */
final class Explanation {

  private final Map<LimitName, CoilSet> sets;

  Explanation(Map<LimitName, CoilSet> sets) {
    this.sets = new EnumMap<>(sets);
  }

  /** The parts, in the order of the names; empty where the limits do leave something together. */
  List<Conflict.Part> parts() {
    for (Map.Entry<LimitName, CoilSet> entry : sets.entrySet()) {
      if (entry.getValue().isEmpty()) {
        return List.of(new Conflict.Part(entry.getKey(), entry.getValue()));
      }
    }
    if (!Limits.together(sets).isEmpty()) {
      return List.of();
    }
    List<Conflict.Part> pair = farthestPair();
    return pair.isEmpty() ? fewest() : pair;
  }

  private List<Conflict.Part> farthestPair() {
    List<Conflict.Part> all = all();
    List<Conflict.Part> farthest = List.of();
    double widest = 0;
    for (int i = 0; i < all.size(); i++) {
      for (int j = i + 1; j < all.size(); j++) {
        double gap = all.get(i).coils().distanceTo(all.get(j).coils());
        if (gap > widest) {
          widest = gap;
          farthest = List.of(all.get(i), all.get(j));
        }
      }
    }
    return farthest;
  }

  /** Leaves out one limit after another for as long as the others still leave nothing. */
  private List<Conflict.Part> fewest() {
    Map<LimitName, CoilSet> needed = new EnumMap<>(sets);
    for (LimitName name : sets.keySet()) {
      if (Limits.without(needed, name).isEmpty()) {
        needed.remove(name);
      }
    }
    return new Explanation(needed).all();
  }

  private List<Conflict.Part> all() {
    List<Conflict.Part> parts = new ArrayList<>();
    sets.forEach((name, set) -> parts.add(new Conflict.Part(name, set)));
    return parts;
  }
}
