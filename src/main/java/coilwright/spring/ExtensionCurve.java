package coilwright.spring;

import coilwright.material.Wire;
import coilwright.unit.Require;
import java.util.OptionalDouble;

/**
 * What is known of an extension family by the mean diameter alone, without computing its springs:
 * the active coils go with 1/D^3, and body, hooks, free length and initial tension follow.
 *
 * @param wire grade and diameter
 * @param hooks the hooks
 * @param fit what their length follows from
 * @param rate R [N/mm]
 * @param zeroForceLength length at which the line of the loads would come to no force [mm]; empty
 *     where the lengths are left open
 * @param coating thickness of what covers the wire [mm]
 */
public record ExtensionCurve(
    Wire wire,
    Hooks hooks,
    HookFit fit,
    double rate,
    OptionalDouble zeroForceLength,
    double coating) {

  /** Refuses a rate that is not positive and a coating below zero. */
  public ExtensionCurve {
    Require.positive(rate, "rate", "N/mm");
    Require.notNegative(coating, "coating", "mm");
  }

  /** Wire diameter over its coating [mm]. */
  public double coatedDiameter() {
    return wire.diameter() + 2 * coating;
  }

  /** Body coils nb at a mean diameter D [mm]; below zero where the hooks alone are softer. */
  public double coilsAt(double meanDiameter) {
    return Rate.activeCoils(wire.shearModulus(), wire.diameter(), rate, meanDiameter)
        - hooks.bothActive();
  }

  /** The mean diameter D [mm] at a count of body coils. */
  public double meanDiameterAt(double bodyCoils) {
    return Rate.meanDiameter(
        wire.shearModulus(), wire.diameter(), rate, bodyCoils + hooks.bothActive());
  }

  /** Whether the lengths are left open. */
  public boolean lengthsOpen() {
    return zeroForceLength.isEmpty();
  }

  /** Whether the initial tension is put to the middle of its preferred range. */
  public boolean tensionChosen() {
    return lengthsOpen() || fit.rule() == HookFit.Rule.PREFERRED_TENSION;
  }

  /** The middle of the preferred initial tension [N] at a mean diameter D [mm]. */
  public double preferredAt(double meanDiameter) {
    double d = wire.diameter();
    return InitialTension.force(InitialTension.USUAL.middle(meanDiameter / d), meanDiameter, d);
  }

  /** Body length [mm] at a mean diameter D [mm]. */
  public double bodyLengthAt(double meanDiameter) {
    return (coilsAt(meanDiameter) + 1) * coatedDiameter();
  }

  /** How far each hook reaches beyond the body [mm] at a mean diameter D [mm]. */
  public double hookLengthAt(double meanDiameter) {
    return switch (fit.rule()) {
      case NATURAL -> hooks.naturalLength(meanDiameter, coatedDiameter());
      case HOOK_LENGTH -> fit.length();
      case FREE_LENGTH -> (fit.length() - bodyLengthAt(meanDiameter)) / 2;
      case PREFERRED_TENSION ->
          lengthsOpen()
              ? hooks.naturalLength(meanDiameter, coatedDiameter())
              : (zeroForceLength.getAsDouble()
                      + preferredAt(meanDiameter) / rate
                      - bodyLengthAt(meanDiameter))
                  / 2;
    };
  }

  /** Free length L0 inside the hooks [mm] at a mean diameter D [mm]. */
  public double freeLengthAt(double meanDiameter) {
    return bodyLengthAt(meanDiameter) + 2 * hookLengthAt(meanDiameter);
  }

  /** Initial tension F0 [N] at a mean diameter D [mm]; below zero where there is none such. */
  public double tensionAt(double meanDiameter) {
    return tensionChosen()
        ? preferredAt(meanDiameter)
        : rate * (freeLengthAt(meanDiameter) - zeroForceLength.getAsDouble());
  }

  /** How the initial tension of given lengths changes with the mean diameter D [mm], in N/mm. */
  public double tensionSlopeAt(double meanDiameter) {
    double active = coilsAt(meanDiameter) + hooks.bothActive();
    double body = -3 * active / meanDiameter * coatedDiameter();
    return switch (fit.rule()) {
      case NATURAL -> rate * (body + 2 * hooks.type().naturalShare());
      case HOOK_LENGTH -> rate * body;
      case FREE_LENGTH, PREFERRED_TENSION -> 0;
    };
  }
}
