package coilwright.spring;

import coilwright.material.Wire;
import coilwright.unit.Require;

/**
 * An unloaded torsion spring of round wire, its body wound close.
 *
 * @param wire grade and diameter
 * @param meanDiameter mean coil diameter D [mm]
 * @param bodyCoils coils of the body nb [-]
 * @param legs its legs
 */
public record TorsionSpring(Wire wire, double meanDiameter, double bodyCoils, Legs legs) {

  private static final double TURN = 2 * Math.PI;

  /** Refuses a coil not wider than its wire, and a count that is not positive. */
  public TorsionSpring {
    Require.above(meanDiameter, wire.diameter(), "mean diameter", "mm");
    Require.positive(bodyCoils, "body coils", "-");
  }

  /** Wire diameter d [mm]. */
  public double wireDiameter() {
    return wire.diameter();
  }

  /** Spring index w = D/d [-]. */
  public double springIndex() {
    return meanDiameter / wire.diameter();
  }

  /** Outside diameter De = D + d when free [mm]. */
  public double outsideDiameter() {
    return meanDiameter + wire.diameter();
  }

  /** Inside diameter Di = D - d when free [mm]. */
  public double insideDiameter() {
    return meanDiameter - wire.diameter();
  }

  /** Active coils n: those of the body, and what the legs are worth [-]. */
  public double activeCoils() {
    return bodyCoils + legs.diameterTimesCoils() / meanDiameter;
  }

  /**
   * Angular rate R.
   *
   * @param constant c of the rate per turn [-]
   * @return R [N mm/rad]
   */
  public double rate(double constant) {
    return AngularRate.of(
        wire.elasticModulus(), wire.diameter(), meanDiameter, activeCoils(), constant);
  }

  /** Developed wire length: the body along its helix, the legs straight [mm]. */
  public double wireLength() {
    return Coil.wireLength(meanDiameter, wire.diameter(), bodyCoils, 0) + legs.length();
  }

  /** Mass [kg]. */
  public double mass() {
    return Mass.ofWire(wire.density(), wire.diameter(), wireLength());
  }

  /**
   * The turns by which the body itself winds up when the legs are deflected: the rest of the
   * deflection is bending of the legs.
   *
   * @param deflection of one leg against the other, from free [rad]
   * @return turns of the body [-]
   */
  public double bodyTurns(double deflection) {
    return deflection / TURN * bodyCoils / activeCoils();
  }

  /**
   * Angle from the first to the second leg, both seen pointing away from the body, along the axis,
   * counted in the winding direction.
   *
   * @param windingUp how far the spring is wound up from free; negative where it is unwound [rad]
   * @return the angle [rad], from 0 to below 2 pi
   */
  public double legAngle(double windingUp) {
    return Legs.angleAfter(TURN * bodyCoils + windingUp);
  }
}
