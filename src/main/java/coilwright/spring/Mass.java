package coilwright.spring;

import coilwright.unit.Require;

/** What a length of round wire weighs. */
public final class Mass {

  private static final double CUBIC_MM_PER_CUBIC_M = 1e9;

  private Mass() {}

  /**
   * Mass of round wire, density times volume.
   *
   * @param density rho [kg/m^3]
   * @param wireDiameter d [mm]
   * @param wireLength developed length [mm]
   * @return mass [kg]
   * @throws IllegalArgumentException if an argument is not positive and finite
   */
  public static double ofWire(double density, double wireDiameter, double wireLength) {
    double d = Require.positive(wireDiameter, "wire diameter", "mm");
    double volume = Math.PI / 4 * d * d * Require.positive(wireLength, "wire length", "mm");
    return Require.positive(density, "density", "kg/m^3") * volume / CUBIC_MM_PER_CUBIC_M;
  }
}
