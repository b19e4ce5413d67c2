package coilwright.problem;

import java.util.Optional;
import java.util.OptionalDouble;

/** Reads the length that a spring must survive beyond its loads. */
final class OvertravelReader {

  private OvertravelReader() {}

  /**
   * Reads the overtravel.
   *
   * @param root the file
   * @param loads the loads as read
   * @return the length [mm], or empty where none is asked
   */
  static OptionalDouble read(Section root, LoadsRead loads) {
    Optional<Section> section = root.read(LoadKeys.OVERTRAVEL);
    OptionalDouble length =
        section
            .flatMap(given -> given.require(LoadKeys.OVERTRAVEL_LENGTH))
            .map(OptionalDouble::of)
            .orElse(OptionalDouble.empty());
    double shortest = shortest(loads);
    if (length.isPresent() && !(length.getAsDouble() < shortest)) {
      section
          .get()
          .spot(LoadKeys.OVERTRAVEL_LENGTH)
          .fault(
              section.get().shown(LoadKeys.OVERTRAVEL_LENGTH),
              "must be below the shortest loaded length, " + Range.number(shortest) + " mm");
    }
    return length;
  }

  /** The shortest loaded length known [mm]; positive infinity where none is. */
  private static double shortest(LoadsRead loads) {
    double shortest = Double.POSITIVE_INFINITY;
    for (LoadAsked load : loads.facts().loads()) {
      shortest = Math.min(shortest, load.length().orElse(shortest));
    }
    if (loads.required().isPresent()) {
      for (var load : loads.required().get().completed()) {
        shortest = Math.min(shortest, load.length().orElse(shortest));
      }
    }
    return shortest;
  }
}
