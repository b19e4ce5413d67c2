package coilwright.problem;

import coilwright.spring.Rounding;
import java.util.Optional;

/**
 * The steps to which springs are rounded where the file does not say.
 *
 * @param diameter of the mean diameter [mm]
 * @param length of the free length [mm]
 */
record StepDefaults(double diameter, double length) {

  private static final double SMALL_PARTS = 10;
  private static final double MM_PER_INCH = 25.4;

  /**
   * The steps of a unit system.
   *
   * @param units the system
   * @return its steps
   */
  static StepDefaults of(UnitSystem units) {
    return units == UnitSystem.INCH
        ? new StepDefaults(0.0005 * MM_PER_INCH, 0.005 * MM_PER_INCH)
        : new StepDefaults(0.01, 0.1);
  }

  /**
   * The rounding: an explicit step holds at every diameter, a default is a tenth for small springs.
   *
   * @param diameterStep explicit step of the mean diameter [mm]
   * @param lengthStep explicit step of the free length [mm]
   * @return the rounding
   */
  Rounding rounding(Optional<Double> diameterStep, Optional<Double> lengthStep) {
    return new Rounding(
        diameterStep.orElse(diameter),
        lengthStep.orElse(length),
        diameterStep.orElse(diameter / SMALL_PARTS),
        lengthStep.orElse(length / SMALL_PARTS));
  }
}
