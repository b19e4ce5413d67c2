package coilwright.spring;

import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.unit.Require;

/** The least sum of gaps between the active coils that EN 13906-1 keeps at the greatest load. */
public final class GapSum {

  /** Where the law is published. */
  public static final Citation CITATION =
      Citation.remembered(Source.EN_13906_1, "clause 9.9, cold-coiled springs under static load");

  private GapSum() {}

  /**
   * The least sum of gaps of a cold-coiled spring under static load, Sa = n (0.0015 D^2/d + 0.1 d).
   *
   * @param meanDiameter D [mm]
   * @param wireDiameter d [mm]
   * @param activeCoils n [-]
   * @return Sa [mm]
   * @throws IllegalArgumentException if an argument is not positive and finite
   * @see #CITATION
   */
  public static double least(double meanDiameter, double wireDiameter, double activeCoils) {
    double d = Require.positive(wireDiameter, "wire diameter", "mm");
    double mean = Require.positive(meanDiameter, "mean diameter", "mm");
    return Require.positive(activeCoils, "active coils", "-")
        * (0.0015 * mean * mean / d + 0.1 * d);
  }
}
