package coilwright.spring;

import coilwright.material.Wire;
import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.unit.Require;

/**
 * An unloaded extension spring of round wire, its body wound close. Lengths are measured inside the
 * hooks.
 *
 * @param wire grade and diameter
 * @param meanDiameter mean coil diameter D [mm]
 * @param bodyCoils coils of the body nb [-]
 * @param hooks its two hooks
 * @param hookLength how far each reaches beyond the body to its inside [mm]
 * @param coating thickness of what covers the wire [mm], zero for bare wire
 */
public record ExtensionSpring(
    Wire wire,
    double meanDiameter,
    double bodyCoils,
    Hooks hooks,
    double hookLength,
    double coating) {

  /** Body length (nb + 1) d, and hooks beyond it. */
  public static final Citation BODY =
      Citation.seen(Source.MACHINERYS_HANDBOOK, "extension springs, length over the coils");

  /** Refuses a coil or a bend not wider than its wire, coils below zero and unknown lengths. */
  public ExtensionSpring {
    double index = hooks.tightestIndex();
    Require.above(meanDiameter, index * wire.diameter(), "mean diameter", "mm");
    Require.positive(bodyCoils, "body coils", "-");
    Require.finite(hookLength, "hook length", "mm");
    Require.notNegative(coating, "coating", "mm");
  }

  /** Wire diameter d [mm]. */
  public double wireDiameter() {
    return wire.diameter();
  }

  /** Wire diameter over its coating [mm]. */
  public double coatedDiameter() {
    return wire.diameter() + 2 * coating;
  }

  /** Spring index C = D/d [-]. */
  public double springIndex() {
    return meanDiameter / wire.diameter();
  }

  /** Outside diameter D + d [mm]. */
  public double outsideDiameter() {
    return meanDiameter + wire.diameter();
  }

  /** Inside diameter D - d [mm]. */
  public double insideDiameter() {
    return meanDiameter - wire.diameter();
  }

  /** Active coils: the body's and what the hooks add [-]. */
  public double activeCoils() {
    return bodyCoils + hooks.bothActive();
  }

  /** Length of the body, (nb + 1) d over the coating [mm]. */
  public double bodyLength() {
    return (bodyCoils + 1) * coatedDiameter();
  }

  /** Free length inside the hooks L0 [mm]. */
  public double freeLength() {
    return bodyLength() + 2 * hookLength;
  }

  /** The shortest that its hooks can be bent [mm]. */
  public double leastHookLength() {
    return hooks.leastLength(meanDiameter, coatedDiameter());
  }

  /**
   * The free opening inside a hook over the coating [mm]: 2 r1 - d across the loop, and no more
   * than the hook reaches beyond the body.
   */
  public double loopInside() {
    return Math.min(2 * hooks.bendRadius() * meanDiameter - coatedDiameter(), hookLength);
  }

  /**
   * How far a load on the axis lies from the wire of the loop, D/2 or r1 where that is more [mm].
   */
  public double loopArm() {
    return Math.max(0.5, hooks.bendRadius()) * meanDiameter;
  }

  /** The index of the loop C1 = 2 r1/d [-]. */
  public double bendIndex() {
    return hooks.bendIndex(springIndex());
  }

  /** The index of the side bend C2 = 2 r2/d [-]. */
  public double sideIndex() {
    return hooks.sideIndex(springIndex());
  }

  /** Rate R once the coils have parted [N/mm]. */
  public double rate() {
    return Rate.of(wire.shearModulus(), wire.diameter(), meanDiameter, activeCoils());
  }

  /** Developed wire length [mm]. */
  public double wireLength() {
    return Coil.wireLength(meanDiameter, coatedDiameter(), bodyCoils, 0)
        + 2 * hooks.wireLength(meanDiameter, coatedDiameter(), hookLength);
  }

  /** Mass [kg]. */
  public double mass() {
    return Mass.ofWire(wire.density(), wire.diameter(), wireLength());
  }

  /** First natural frequency of the active coils, both ends held [Hz]. */
  public double surgeFrequency() {
    return Surge.firstFrequency(
        wire.diameter(), meanDiameter, activeCoils(), wire.shearModulus(), wire.density());
  }
}
