package coilwright.problem;

import coilwright.spring.Kind;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The keys of one bound on a stress, as a share of tensile strength.
 *
 * @param limit the limit
 * @param max its bound
 */
record StressKeys(ProblemKey<Setting<Section>> limit, ProblemKey<Setting<Double>> max) {

  private static final String OMITTED = "the value of the stress basis for the material";

  /**
   * The keys of a stress.
   *
   * @param name the limit's key
   * @param example a share
   * @param help what it means
   * @param kind the kind of spring that has it
   * @return the keys
   */
  static StressKeys of(String name, String example, String help, Kind kind) {
    String path = "limits." + name;
    return new StressKeys(
        ProblemKey.of(
                path,
                new SwitchReader<>(new SectionReader(path)),
                OMITTED,
                help,
                "{max: " + example + "}")
            .only(kind),
        ProblemKey.of(
                path + ".max",
                new SwitchReader<>(Values.shareOfStrength()),
                OMITTED,
                "greatest share",
                example)
            .only(kind));
  }

  /** Both. */
  List<ProblemKey<?>> rows() {
    return List.of(limit, max);
  }

  /**
   * Reads the bound.
   *
   * @param limits the block of limits
   * @return the bound; that of the basis where the file says nothing
   */
  StressLimit read(Optional<Section> limits) {
    OptionalDouble none = OptionalDouble.empty();
    Optional<Setting<Section>> setting = limits.flatMap(block -> block.read(limit));
    if (setting.isEmpty()) {
      return new StressLimit(true, none);
    }
    if (setting.get().value().isEmpty()) {
      return new StressLimit(false, none);
    }
    Optional<Setting<Double>> share = setting.get().value().get().read(max);
    boolean judged = share.isEmpty() || share.get().value().isPresent();
    return new StressLimit(judged, BandReader.bound(share, none));
  }
}
