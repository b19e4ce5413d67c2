package coilwright.problem;

import coilwright.material.WireSize;
import coilwright.spring.Hand;
import java.util.List;
import java.util.Optional;

/**
 * What the spring to check has whatever its kind.
 *
 * @param material id of its grade
 * @param wire its wire
 * @param meanDiameter D [mm]
 * @param hand direction of winding
 * @param coating thickness of what covers the wire [mm]
 */
record DesignBasics(
    String material, WireSize wire, double meanDiameter, Hand hand, double coating) {

  /**
   * Reads it.
   *
   * @param ids the grades that may be named
   * @param section the spring's block of keys
   * @return what was read, or empty where it is faulty
   */
  static Optional<DesignBasics> read(MaterialIds ids, Section section) {
    long before = section.spot().faults().count();
    Optional<String> material = section.require(DesignKeys.MATERIAL);
    material.ifPresent(id -> ids.check(id, section.spot(DesignKeys.MATERIAL)));
    Optional<WireSize> wire = section.require(DesignKeys.WIRE_DIAMETER);
    double coating =
        section
            .read(DesignKeys.COATING)
            .flatMap(inner -> inner.require(DesignKeys.COATING_THICKNESS))
            .orElse(0.0);
    Optional<Double> mean = wire.flatMap(size -> mean(section, size.diameter(), coating));
    if (wire.isEmpty()) {
      only(section, DesignKeys.DIAMETERS).ifPresent(section::read);
    }
    Hand hand = section.read(DesignKeys.HAND).orElse(Hand.EITHER);
    return section.spot().faults().count() > before
        ? Optional.empty()
        : Optional.of(new DesignBasics(material.get(), wire.get(), mean.get(), hand, coating));
  }

  private static Optional<Double> mean(Section section, double wire, double coating) {
    Optional<ProblemKey<Double>> key = only(section, DesignKeys.DIAMETERS);
    Optional<Double> mean =
        key.flatMap(section::read)
            .map(given -> key.get() == DesignKeys.OUTSIDE_DIAMETER ? given - wire : given)
            .map(given -> key.get() == DesignKeys.INSIDE_DIAMETER ? given + wire : given);
    if (mean.isPresent() && !(mean.get() > wire + 2 * coating)) {
      section
          .spot(key.get())
          .fault(
              section.shown(key.get()),
              "must leave the mean diameter above the wire diameter, "
                  + section.shown(DesignKeys.WIRE_DIAMETER)
                  + (coating > 0 ? ", and its coating" : ""));
    }
    return mean;
  }

  /**
   * The one key that is given of several that stand instead of one another; reports none and two.
   *
   * @param section their block
   * @param keys the keys
   * @return the key, or empty where none is given
   */
  static Optional<ProblemKey<Double>> only(Section section, List<ProblemKey<Double>> keys) {
    List<ProblemKey<Double>> given = keys.stream().filter(section::has).toList();
    String names = String.join(", ", keys.stream().map(ProblemKey::name).toList());
    if (given.isEmpty() && keys.stream().allMatch(section::lacks)) {
      section.spot(keys.get(0)).fault("missing", "must be given, or another of " + names);
    }
    if (given.isEmpty()) {
      section.spot().faults().again();
    }
    if (given.size() > 1) {
      section
          .spot(given.get(1))
          .fault("given beside " + given.get(0).name(), "must be only one of " + names);
    }
    return given.stream().findFirst();
  }
}
