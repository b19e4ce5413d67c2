package coilwright.limit;

import coilwright.spring.ExtensionCurve;
import coilwright.spring.ExtensionState;
import coilwright.spring.Family;
import coilwright.spring.HookFit;
import coilwright.spring.InitialTension;
import java.util.Arrays;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.solvers.PegasusSolver;

/**
 * Where the numbers of an extension family turn or cross, by the mean diameter: body coils go with
 * 1/D^3 and everything else follows from D in closed form.
 */
final class AlongExtension {

  private static final double[] NONE = new double[0];
  private static final int SAMPLES = 20;
  private static final double JUST = 1e-9;
  private static final double ACCURACY = 1e-12;
  private static final int MOST_EVALUATIONS = 200;

  private final ExtensionState end;
  private final ExtensionCurve curve;
  private final double narrowest;
  private final double widest;

  AlongExtension(Family<ExtensionState> family) {
    this.end = family.at(family.mostCoils());
    this.curve = end.curve().orElseThrow();
    this.narrowest = end.spring().meanDiameter();
    this.widest = curve.meanDiameterAt(family.fewestCoils());
  }

  /** Any spring of the family, for what all have in common. */
  ExtensionState any() {
    return end;
  }

  /** What the springs have in common. */
  ExtensionCurve curve() {
    return curve;
  }

  /** The count at which the spring index is C [-]. */
  double coilsAtIndex(double springIndex) {
    return curve.coilsAt(springIndex * curve.wire().diameter());
  }

  /**
   * Where the free length turns: natural hooks shrink with the coil while the body grows, 2 k = 3
   * nt d/D with k the hooks' share of the inside diameter and nt all active coils. Hooks of a given
   * length do not shrink.
   */
  double[] turnsOfFreeLength() {
    boolean shrink =
        curve.fit().rule() == HookFit.Rule.NATURAL
            || curve.fit().rule() == HookFit.Rule.PREFERRED_TENSION && curve.lengthsOpen();
    if (!shrink) {
      return NONE;
    }
    double wire = curve.coatedDiameter();
    double cubed = (curve.coilsAt(1) + curve.hooks().bothActive()) * wire;
    double share = curve.hooks().type().naturalShare();
    return new double[] {curve.coilsAt(Math.sqrt(Math.sqrt(3 * cubed / (2 * share))))};
  }

  /** Where initial tension beyond an end of its preferred range turns, but for a factor. */
  double[] turnsOfTension(boolean least) {
    return curve.tensionChosen() ? NONE : counts(turningDiameters(least));
  }

  /** The two sides of every count at which the initial tension leaves its range upward. */
  double[] besideHighTension() {
    if (curve.tensionChosen()) {
      return NONE;
    }
    double[] turns = turningDiameters(false);
    double[] beside = new double[2 * (turns.length + 1)];
    int count = 0;
    double from = narrowest;
    for (int i = 0; i <= turns.length; i++) {
      double to = i < turns.length ? turns[i] : widest;
      if (excess(from, false) * excess(to, false) < 0) {
        double coils = curve.coilsAt(root(mean -> excess(mean, false), from, to));
        beside[count++] = coils * (1 - JUST);
        beside[count++] = coils * (1 + JUST);
      }
      from = to;
    }
    return Arrays.copyOf(beside, count);
  }

  /**
   * Mean diameters [mm] at which excess times diameter turns, rising: where its slope changes sign
   * between samples at even ratios. It turns three times at the most.
   */
  private double[] turningDiameters(boolean least) {
    double ratio = StrictMath.pow(widest / narrowest, 1.0 / SAMPLES);
    double[] turns = new double[SAMPLES];
    int count = 0;
    double from = narrowest;
    double before = slope(from, least);
    for (int i = 0; i < SAMPLES; i++) {
      double to = i == SAMPLES - 1 ? widest : from * ratio;
      double after = slope(to, least);
      if (before * after < 0) {
        turns[count++] = root(mean -> slope(mean, least), from, to);
      }
      from = to;
      before = after;
    }
    return Arrays.copyOf(turns, count);
  }

  /** Slope of excess times mean diameter [N] along the mean diameter [mm]. */
  private double slope(double mean, boolean least) {
    double d = curve.wire().diameter();
    double stress = InitialTension.USUAL.slopeAt(mean / d, least) / d;
    return curve.tensionAt(mean)
        + mean * curve.tensionSlopeAt(mean)
        - InitialTension.force(stress, 1, d);
  }

  private static double root(DoubleUnaryOperator value, double from, double to) {
    return new PegasusSolver(ACCURACY, ACCURACY)
        .solve(MOST_EVALUATIONS, value::applyAsDouble, from, to);
  }

  /** Initial tension beyond an end of its preferred range [N] at a mean diameter [mm]. */
  private double excess(double mean, boolean least) {
    double d = curve.wire().diameter();
    InitialTension relation = InitialTension.USUAL;
    double stress = least ? relation.least(mean / d) : relation.greatest(mean / d);
    return curve.tensionAt(mean) - InitialTension.force(stress, mean, d);
  }

  /** Where what the hooks reach beyond the shortest that can be bent turns. */
  double[] turnsOfHookLength() {
    return curve.fit().rule() == HookFit.Rule.HOOK_LENGTH
        ? NONE
        : turns(
            mean ->
                curve.hookLengthAt(mean) - curve.hooks().leastLength(mean, curve.coatedDiameter()));
  }

  /** Where the opening inside the hooks turns: where their length comes to decide, and with it. */
  double[] turnsOfHookInside() {
    boolean growsWithTheCoil =
        curve.fit().rule() == HookFit.Rule.HOOK_LENGTH
            || curve.fit().rule() == HookFit.Rule.NATURAL;
    return growsWithTheCoil
        ? NONE
        : turns(
            mean ->
                Math.min(
                    2 * curve.hooks().bendRadius() * mean - curve.coatedDiameter(),
                    curve.hookLengthAt(mean)));
  }

  /** Where the length under the greatest force turns, where the lengths are left open. */
  double[] turnsOfExtendedLength() {
    return curve.lengthsOpen() ? turns(this::extension) : NONE;
  }

  private double extension(double mean) {
    return curve.freeLengthAt(mean) - curve.tensionAt(mean) / curve.rate();
  }

  /** The turns of a number that the mean diameter tells, as counts of body coils. */
  double[] turns(DoubleUnaryOperator byMeanDiameter) {
    return counts(Extremes.between(narrowest, widest, byMeanDiameter));
  }

  private double[] counts(double[] meanDiameters) {
    double[] counts = new double[meanDiameters.length];
    for (int i = 0; i < counts.length; i++) {
      counts[i] = curve.coilsAt(meanDiameters[i]);
    }
    return counts;
  }
}
