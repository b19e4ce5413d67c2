package coilwright.spring;

import coilwright.material.Wire;
import coilwright.unit.Require;

/**
 * An unloaded compression spring of round wire, wound at constant pitch.
 *
 * @param wire grade and diameter
 * @param meanDiameter mean coil diameter D [mm]
 * @param activeCoils active coils n [-]
 * @param freeLength free length L0 [mm]
 * @param ends how the end coils are formed
 */
public record CompressionSpring(
    Wire wire, double meanDiameter, double activeCoils, double freeLength, EndType ends) {

  /** Refuses a coil not wider than its wire, and counts or lengths that are not positive. */
  public CompressionSpring {
    Require.above(meanDiameter, wire.diameter(), "mean diameter", "mm");
    Require.positive(activeCoils, "active coils", "-");
    Require.positive(freeLength, "free length", "mm");
  }

  /** Wire diameter d [mm]. */
  public double wireDiameter() {
    return wire.diameter();
  }

  /** Spring index w = D/d [-]. */
  public double springIndex() {
    return meanDiameter / wire.diameter();
  }

  /** Outside diameter De = D + d [mm]. */
  public double outsideDiameter() {
    return meanDiameter + wire.diameter();
  }

  /** Inside diameter Di = D - d [mm]. */
  public double insideDiameter() {
    return meanDiameter - wire.diameter();
  }

  /** Total coils nt [-]. */
  public double totalCoils() {
    return activeCoils + ends.deadCoils();
  }

  /** Pitch p [mm]. */
  public double pitch() {
    return ends.pitch(freeLength, wire.diameter(), activeCoils);
  }

  /** Pitch angle alpha [rad]. */
  public double pitchAngle() {
    return Coil.pitchAngle(pitch(), meanDiameter);
  }

  /** Rate R [N/mm]. */
  public double rate() {
    return Rate.of(wire.shearModulus(), wire.diameter(), meanDiameter, activeCoils);
  }

  /** Developed wire length [mm]. */
  public double wireLength() {
    return Coil.wireLength(meanDiameter, pitch(), activeCoils, ends.deadCoils());
  }

  /** Mass [kg]. */
  public double mass() {
    return Mass.ofWire(wire.density(), wire.diameter(), wireLength());
  }

  /** First natural frequency of the active coils, both ends seated [Hz]. */
  public double surgeFrequency() {
    return Surge.firstFrequency(
        wire.diameter(), meanDiameter, activeCoils, wire.shearModulus(), wire.density());
  }

  /**
   * The deflection at which this spring buckles.
   *
   * @param seating how its ends are held
   * @return the critical deflection [mm]; positive infinity where it can never buckle
   */
  public double criticalDeflection(Seating seating) {
    return Buckling.criticalDeflection(
        meanDiameter, freeLength, seating.factor(), wire.shearModulus(), wire.elasticModulus());
  }
}
