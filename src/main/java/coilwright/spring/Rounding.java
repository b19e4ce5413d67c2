package coilwright.spring;

import coilwright.unit.Require;
import java.math.BigDecimal;

/**
 * The steps to which a shop's drawing rounds a spring. A small spring, with a mean diameter below 5
 * mm, may have finer steps.
 *
 * @param diameterStep of the mean diameter [mm]; 0 for no rounding
 * @param lengthStep of the free length [mm]; 0 for no rounding
 * @param smallDiameterStep the same for small springs [mm]
 * @param smallLengthStep the same for small springs [mm]
 */
public record Rounding(
    double diameterStep, double lengthStep, double smallDiameterStep, double smallLengthStep) {

  /** Mean diameter below which the steps for small springs apply [mm]. */
  public static final double SMALL_BELOW = 5;

  /** A part of a step that is the rounding of the arithmetic [-]. */
  private static final double SAME = 1e-9;

  /** No rounding at all. */
  public static final Rounding NONE = new Rounding(0, 0, 0, 0);

  /** Refuses negative steps. */
  public Rounding {
    Require.notNegative(diameterStep, "diameter step", "mm");
    Require.notNegative(lengthStep, "length step", "mm");
    Require.notNegative(smallDiameterStep, "diameter step of small springs", "mm");
    Require.notNegative(smallLengthStep, "length step of small springs", "mm");
  }

  /**
   * The step of a mean diameter.
   *
   * @param meanDiameter D before rounding [mm]
   * @return the step [mm]
   */
  public double diameterStepAt(double meanDiameter) {
    return meanDiameter < SMALL_BELOW ? smallDiameterStep : diameterStep;
  }

  /**
   * The step of a free length.
   *
   * @param meanDiameter D before rounding [mm]
   * @return the step [mm]
   */
  public double lengthStepAt(double meanDiameter) {
    return meanDiameter < SMALL_BELOW ? smallLengthStep : lengthStep;
  }

  /**
   * The nearest multiple of a step, reckoned in decimal so that 122 steps of 0.1 mm are 12.2 mm and
   * not a neighbour of it.
   *
   * @param value the value [mm]
   * @param step the step [mm]; 0 leaves the value as it is
   * @return the rounded value [mm]
   */
  public static double toStep(double value, double step) {
    return step == 0 ? value : times(Math.rint(value / step), step);
  }

  /**
   * The least multiple of a step that is not below a value, in decimal like {@link #toStep}.
   *
   * @param value the value [mm]
   * @param step the step [mm]; 0 leaves the value as it is
   * @return the rounded value [mm], below the value by no more than the rounding of the arithmetic
   */
  public static double upToStep(double value, double step) {
    return step == 0 ? value : times(Math.ceil(value / step - SAME), step);
  }

  private static double times(double steps, double step) {
    return BigDecimal.valueOf(step).multiply(BigDecimal.valueOf(steps)).doubleValue();
  }
}
