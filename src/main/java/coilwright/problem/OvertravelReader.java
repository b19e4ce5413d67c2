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
   * @param facts the loads as asked
   * @param required what one spring must do, where that is known
   * @return the length [mm], or empty where none is asked
   */
  static OptionalDouble read(Section root, LoadFacts facts, Optional<Requirement> required) {
    Optional<Section> section = root.read(LoadKeys.OVERTRAVEL);
    OptionalDouble length =
        section
            .flatMap(given -> given.require(LoadKeys.OVERTRAVEL_LENGTH))
            .map(OptionalDouble::of)
            .orElse(OptionalDouble.empty());
    double shortest = shortest(facts, required);
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
  private static double shortest(LoadFacts facts, Optional<Requirement> required) {
    double shortest = Double.POSITIVE_INFINITY;
    for (LoadAsked load : facts.loads()) {
      shortest = Math.min(shortest, load.length().orElse(shortest));
    }
    if (required.isPresent()) {
      for (var load : required.get().completed()) {
        shortest = Math.min(shortest, load.length().orElse(shortest));
      }
    }
    return shortest;
  }
}
