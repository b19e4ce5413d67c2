package coilwright.problem;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Reads a limit with two bounds of plain numbers.
 *
 * @param key the limit
 * @param minKey its lower bound
 * @param maxKey its upper bound
 */
record BandReader(
    ProblemKey<Setting<Section>> key,
    ProblemKey<Setting<Double>> minKey,
    ProblemKey<Setting<Double>> maxKey) {

  /**
   * Reads the limit.
   *
   * @param limits the limits
   * @param usual the bounds where the file gives none
   * @return the bounds; none where the file switches the limit off
   */
  Band read(Section limits, Band usual) {
    Optional<Setting<Section>> setting = limits.read(key);
    if (setting.isEmpty()) {
      return usual;
    }
    return setting
        .get()
        .value()
        .map(section -> merged(section, usual))
        .orElse(new Band(OptionalDouble.empty(), OptionalDouble.empty()));
  }

  private Band merged(Section section, Band usual) {
    Band band =
        new Band(
            bound(section.read(minKey), usual.min()), bound(section.read(maxKey), usual.max()));
    boolean both = band.min().isPresent() && band.max().isPresent();
    if (both && !(band.min().getAsDouble() <= band.max().getAsDouble())) {
      contradiction(section, band);
    }
    return band;
  }

  private void contradiction(Section section, Band band) {
    if (section.has(maxKey)) {
      String origin = section.has(minKey) ? "" : " (the default)";
      section
          .spot(maxKey)
          .fault(
              section.shown(maxKey),
              "must not be below min, " + Range.number(band.min().getAsDouble()) + origin);
    } else {
      section
          .spot(minKey)
          .fault(
              section.shown(minKey),
              "must not be above max, "
                  + Range.number(band.max().getAsDouble())
                  + " (the default)");
    }
  }

  /**
   * A bound merged with its default.
   *
   * @param given what the file says: nothing, {@code none} or a value
   * @param usual the default
   * @return the bound; empty where it is switched off
   */
  static OptionalDouble bound(Optional<Setting<Double>> given, OptionalDouble usual) {
    return given
        .map(setting -> setting.value().map(OptionalDouble::of).orElse(OptionalDouble.empty()))
        .orElse(usual);
  }
}
