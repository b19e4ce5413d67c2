package coilwright.problem;

import coilwright.material.DiameterRange;
import coilwright.material.WireGrade;
import java.util.List;
import java.util.Optional;

/**
 * Works out the wire diameters for which an own grade's data hold.
 *
 * @param section the grade's block of keys
 * @param like the grade that what is left out is taken from, where there is one
 * @param taken what is taken from that grade and ends with its diameters, such as "strength"; empty
 *     where nothing is
 */
record OwnDiameters(Section section, Optional<WireGrade> like, String taken) {

  /**
   * Reads the diameters.
   *
   * @param ends where the grade's own tables end [mm]; infinite for what has no end
   * @return the diameters, or empty where there are none
   */
  Optional<DiameterRange> read(List<Double> ends) {
    Optional<Section> given = section.read(MaterialKeys.DIAMETERS);
    Optional<Double> min = given.flatMap(block -> block.read(MaterialKeys.DIAMETERS_MIN));
    Optional<Double> max = given.flatMap(block -> block.read(MaterialKeys.DIAMETERS_MAX));
    DiameterRange usual =
        like.map(WireGrade::diameters).orElse(new DiameterRange(0, Double.POSITIVE_INFINITY));
    double end = ends.stream().mapToDouble(Double::doubleValue).min().getAsDouble();
    given.ifPresent(block -> within(block, min, max, usual));
    if (max.isPresent() && max.get() > end) {
      given
          .get()
          .spot(MaterialKeys.DIAMETERS_MAX)
          .fault(
              given.get().shown(MaterialKeys.DIAMETERS_MAX),
              "must be at most " + Range.number(end) + " mm, where a table of this grade ends");
    }
    return range(min.orElse(usual.min()), max.orElse(Math.min(usual.max(), end)));
  }

  private void within(
      Section block, Optional<Double> min, Optional<Double> max, DiameterRange usual) {
    if (taken.isEmpty() || like.isEmpty()) {
      return;
    }
    String instead = " mm of " + like.get().id() + ", whose " + taken + " is taken";
    if (min.isPresent() && !usual.contains(Math.min(min.get(), usual.max()))) {
      block
          .spot(MaterialKeys.DIAMETERS_MIN)
          .fault(
              block.shown(MaterialKeys.DIAMETERS_MIN),
              "must be at least the " + Range.number(usual.min()) + instead);
    }
    if (max.isPresent() && !usual.contains(Math.max(max.get(), usual.min()))) {
      block
          .spot(MaterialKeys.DIAMETERS_MAX)
          .fault(
              block.shown(MaterialKeys.DIAMETERS_MAX),
              "must be at most the " + Range.number(usual.max()) + instead);
    }
  }

  private Optional<DiameterRange> range(double min, double max) {
    if (min <= max) {
      return Optional.of(new DiameterRange(min, max));
    }
    section
        .spot(MaterialKeys.DIAMETERS)
        .fault(
            "no diameter is left: the thinnest is "
                + Range.number(min)
                + " mm, the thickest "
                + Range.number(max)
                + " mm",
            "must leave some");
    return Optional.empty();
  }
}
