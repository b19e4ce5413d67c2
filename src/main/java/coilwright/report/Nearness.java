package coilwright.report;

import coilwright.search.Conflict;
import coilwright.search.Nearest;

/** How near a wire without a candidate comes to having one. */
final class Nearness {

  private Nearness() {}

  /**
   * How far apart the limits in conflict are, as a share of a coil count: 0 where more than two
   * limits only just fail together, infinite where one limit fails alone.
   */
  static double of(Conflict conflict) {
    return switch (conflict.parts().size()) {
      case 0, 1 -> Double.POSITIVE_INFINITY;
      case 2 ->
          Nearest.of(conflict.parts().get(0).coils(), conflict.parts().get(1).coils()).apart();
      default -> 0;
    };
  }
}
