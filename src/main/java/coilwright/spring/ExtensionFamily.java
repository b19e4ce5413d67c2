package coilwright.spring;

import coilwright.material.Wire;
import java.util.Optional;

/**
 * The extension springs of one wire and one kind of hook that have a rate and lie on one line of
 * loads, or, where the lengths are left open, begin with the usual initial tension. The count of
 * body coils is the unknown; the mean diameter follows from the rate, the free length from body and
 * hooks, and the initial tension from both and the loads.
 *
 * <p>Rounding sets the mean diameter to its step. Natural hooks, and hooks of a given length, leave
 * the free length as it comes; where hooks follow from the free length, that is set to its step.
 * The initial tension is then chosen so that the greatest error of the loads is least.
 *
 * @param curve what its springs have in common
 * @param duty the loads, and how stress is reckoned
 * @param rounding the steps of mean diameter and free length
 */
public record ExtensionFamily(ExtensionCurve curve, ExtensionDuty duty, Rounding rounding)
    implements Family<ExtensionState> {

  private static final double FEWEST_COILS = 0.01;
  private static final double JUST_ABOVE = 1 + 1e-6;

  /** Whether it has springs at all: not where the hooks alone are softer than the rate. */
  public boolean hasSprings() {
    return mostCoils() > 0;
  }

  @Override
  public Wire wire() {
    return curve.wire();
  }

  @Override
  public String endForm() {
    return curve.hooks().type().id();
  }

  @Override
  public double fewestCoils() {
    return Math.min(FEWEST_COILS, mostCoils() / 2);
  }

  @Override
  public double mostCoils() {
    return curve.coilsAt(tightest());
  }

  /** The mean diameter at which coil and bends just have an inside [mm]. */
  private double tightest() {
    return curve.hooks().tightestIndex() * curve.coatedDiameter() * JUST_ABOVE;
  }

  @Override
  public ExtensionState at(double coils) {
    double meanDiameter = curve.meanDiameterAt(coils);
    return new ExtensionState(
        spring(meanDiameter, coils, curve.hookLengthAt(meanDiameter)),
        curve.tensionAt(meanDiameter),
        duty,
        Optional.of(curve));
  }

  private ExtensionSpring spring(double meanDiameter, double coils, double hookLength) {
    return new ExtensionSpring(
        wire(), meanDiameter, coils, curve.hooks(), hookLength, curve.coating());
  }

  @Override
  public Optional<ExtensionState> rounded(double coils) {
    double exact = curve.meanDiameterAt(coils);
    double meanDiameter = Rounding.toStep(exact, rounding.diameterStepAt(exact));
    if (!(meanDiameter > curve.hooks().tightestIndex() * curve.coatedDiameter())) {
      return Optional.empty();
    }
    ExtensionSpring spring = spring(meanDiameter, coils, hookLength(exact, meanDiameter, coils));
    if (!(spring.hookLength() > 0)) {
      return Optional.empty();
    }
    double tension = curve.lengthsOpen() ? curve.preferredAt(meanDiameter) : fitted(spring);
    return Optional.of(new ExtensionState(spring, tension, duty, Optional.of(curve)));
  }

  private double hookLength(double exact, double meanDiameter, double coils) {
    double wire = curve.coatedDiameter();
    boolean follows =
        curve.fit().rule() == HookFit.Rule.FREE_LENGTH
            || curve.fit().rule() == HookFit.Rule.PREFERRED_TENSION && !curve.lengthsOpen();
    if (follows) {
      double free = Rounding.toStep(curve.freeLengthAt(exact), rounding.lengthStepAt(exact));
      return (free - (coils + 1) * wire) / 2;
    }
    return curve.fit().rule() == HookFit.Rule.HOOK_LENGTH
        ? curve.fit().length()
        : curve.hooks().naturalLength(meanDiameter, wire);
  }

  /**
   * The initial tension with which the greatest error is least. A single load does not tell the
   * rate, so that the line's own initial tension is then held with it.
   */
  private double fitted(ExtensionSpring spring) {
    double free = spring.freeLength();
    double rate = spring.rate();
    double least = Double.POSITIVE_INFINITY;
    double greatest = Double.NEGATIVE_INFINITY;
    for (LoadPoint load : duty.loads()) {
      double meets = load.force().orElseThrow() - rate * (load.length().orElseThrow() - free);
      least = Math.min(least, meets);
      greatest = Math.max(greatest, meets);
    }
    if (duty.loads().size() == 1) {
      double own = curve.rate() * (free - curve.zeroForceLength().orElseThrow());
      least = Math.min(least, own);
      greatest = Math.max(greatest, own);
    }
    return (least + greatest) / 2;
  }

  @Override
  public double roundingShare(double coils) {
    return new ExtensionRounding(this).share(coils);
  }

  @Override
  public double play(double coils) {
    return new ExtensionRounding(this).play(coils);
  }
}
