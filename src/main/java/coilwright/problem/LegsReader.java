package coilwright.problem;

import java.util.Optional;
import java.util.OptionalDouble;

/** Reads the legs of a torsion spring. */
final class LegsReader {

  private LegsReader() {}

  /**
   * Reads the legs.
   *
   * @param block the block in which they stand
   * @param keys their keys there
   * @param loads how many loads there are
   * @return the legs; of no length where the file gives none
   */
  static LegsAsked read(Optional<Section> block, LegKeys keys, int loads) {
    Optional<Section> given = block.flatMap(section -> section.read(keys.legs()));
    if (given.isEmpty()) {
      return new LegsAsked(0, 0, OptionalDouble.empty(), 1);
    }
    Section legs = given.get();
    int atLoad = legs.read(keys.atLoad()).orElse(1);
    if (legs.has(keys.atLoad()) && legs.lacks(keys.angle())) {
      legs.spot(keys.atLoad()).fault("no angle to go with it", "must stand with an angle");
    } else if (loads > 0 && atLoad > loads) {
      legs.spot(keys.atLoad())
          .fault(legs.shown(keys.atLoad()), "must be at most the number of loads, " + loads);
    }
    return new LegsAsked(
        legs.read(keys.first()).orElse(0.0),
        legs.read(keys.second()).orElse(0.0),
        legs.number(keys.angle()),
        atLoad);
  }
}
