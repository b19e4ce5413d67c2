package coilwright.problem;

import coilwright.spring.LoadPoint;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Reads the length that a spring must survive beyond its loads: pressed shorter than all of them,
 * or, an extension spring, pulled longer.
 *
 * @param root the file
 * @param form how the line runs, force against length
 */
record OvertravelReader(Section root, LineForm form) {

  /**
   * Reads the overtravel.
   *
   * @param asked the loads as asked
   * @param completed the loads of one spring with the lengths that the line gives them; none where
   *     it is not fixed
   * @return the length [mm], or empty where none is asked
   */
  OptionalDouble read(List<LoadAsked> asked, List<LoadPoint> completed) {
    Optional<Section> section = root.read(LoadKeys.OVERTRAVEL);
    OptionalDouble length =
        section
            .flatMap(given -> given.require(LoadKeys.OVERTRAVEL_LENGTH))
            .map(OptionalDouble::of)
            .orElse(OptionalDouble.empty());
    double utmost = none();
    for (LoadAsked load : asked) {
      utmost = utmost(utmost, load.length());
    }
    for (LoadPoint load : completed) {
      utmost = utmost(utmost, load.length());
    }
    if (length.isPresent() && !beyond(length.getAsDouble(), utmost)) {
      section
          .get()
          .spot(LoadKeys.OVERTRAVEL_LENGTH)
          .fault(section.get().shown(LoadKeys.OVERTRAVEL_LENGTH), remedy(utmost));
    }
    return length;
  }

  /** A length [mm] that every other one is beyond. */
  private double none() {
    return form.falling() ? Double.POSITIVE_INFINITY : Double.NEGATIVE_INFINITY;
  }

  private double utmost(double before, OptionalDouble length) {
    double other = length.orElse(before);
    return form.falling() ? Math.min(before, other) : Math.max(before, other);
  }

  private boolean beyond(double length, double loaded) {
    return form.falling() ? length < loaded : length > loaded;
  }

  private String remedy(double loaded) {
    return (form.falling()
            ? "must be below the shortest loaded length, "
            : "must be above the longest loaded length, ")
        + Range.number(loaded)
        + " mm";
  }
}
