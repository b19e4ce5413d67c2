package coilwright.problem;

import java.util.Optional;

/**
 * Reads the one torsion spring that a check judges.
 *
 * @param ids the grades that may be named
 * @param section its block of keys
 * @param loads how many loads the file has
 */
record TorsionDesignReader(MaterialIds ids, Section section, int loads) {

  /**
   * Reads the spring.
   *
   * @return the spring, or empty where it is faulty
   */
  Optional<TorsionDesign> read() {
    long before = section.spot().faults().count();
    Optional<DesignBasics> basics = DesignBasics.read(ids, section);
    Optional<Double> coils = section.require(DesignKeys.BODY_COILS_OF_TORSION);
    LegsAsked legs = LegsReader.read(Optional.of(section), LegKeys.DESIGN, loads);
    if (section.spot().faults().count() > before) {
      return Optional.empty();
    }
    return basics.map(
        common ->
            new TorsionDesign(
                common.material(),
                common.wire(),
                common.meanDiameter(),
                coils.get(),
                legs,
                common.hand(),
                common.coating()));
  }
}
