package coilwright.spring;

import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.unit.Require;

/** Waves that run along the coils. */
public final class Surge {

  /** Where the law is published. */
  public static final Citation CITATION =
      Citation.remembered(Source.SHIGLEY, "equation 10-25; EN 13906-1, natural frequency");

  private static final double MM_PER_M = 1000;
  private static final double PASCAL_PER_MPA = 1e6;

  private Surge() {}

  /**
   * First natural frequency of the active coils between two seated ends, f = d sqrt(G/(2 rho)) / (2
   * pi D^2 n).
   *
   * @param wireDiameter d [mm]
   * @param meanDiameter D [mm]
   * @param activeCoils n [-]
   * @param shearModulus G [MPa]
   * @param density rho [kg/m^3]
   * @return f [Hz]
   * @throws IllegalArgumentException if an argument is not positive and finite
   * @see #CITATION
   */
  public static double firstFrequency(
      double wireDiameter,
      double meanDiameter,
      double activeCoils,
      double shearModulus,
      double density) {
    double d = Require.positive(wireDiameter, "wire diameter", "mm") / MM_PER_M;
    double dia = Require.positive(meanDiameter, "mean diameter", "mm") / MM_PER_M;
    double g = Require.positive(shearModulus, "shear modulus", "MPa") * PASCAL_PER_MPA;
    double rho = Require.positive(density, "density", "kg/m^3");
    double n = Require.positive(activeCoils, "active coils", "-");
    return d * Math.sqrt(g / (2 * rho)) / (2 * Math.PI * dia * dia * n);
  }
}
