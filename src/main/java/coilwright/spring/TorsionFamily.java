package coilwright.spring;

import coilwright.material.Wire;
import coilwright.unit.Require;
import java.util.Optional;

/**
 * The torsion springs of one wire that lie on one line of torque against angle. The rate fixes the
 * product of mean diameter and active coils; what the legs take of it is the same for all, so that
 * mean diameter times body coils is too.
 *
 * @param wire grade and diameter
 * @param legs the legs
 * @param rate R [N mm/rad]
 * @param freeAngle where the line comes to no torque, in the reference of the duty's loads [rad]
 * @param legAngleFixed whether the angle of the legs at a load is asked: the body's fraction of a
 *     coil sets the free position then, so that nothing is left to adjust
 * @param duty the loads, each with its angle, and how rate and stress are reckoned
 * @param rounding the steps of mean diameter and free length
 */
public record TorsionFamily(
    Wire wire,
    Legs legs,
    double rate,
    double freeAngle,
    boolean legAngleFixed,
    TorsionDuty duty,
    Rounding rounding)
    implements Family<TorsionState> {

  private static final double FEWEST_COILS = 0.01;
  private static final double TIGHTEST_INDEX = 1 + 1e-6;
  private static final double SAFETY = 1.25;
  private static final double LEAST_SLOPE = 0.002;
  private static final double GREATEST_SLOPE = 10;

  /** Refuses a wire whose legs alone are softer than the rate. */
  public TorsionFamily {
    Require.finite(freeAngle, "free angle", "rad");
    Require.positive(
        diameterTimesBodyCoils(wire, legs, rate, duty.rateConstant()),
        "mean diameter times body coils",
        "mm");
  }

  /**
   * Whether a wire leaves anything for a body: its legs alone are stiffer than the rate.
   *
   * @param wire grade and diameter
   * @param legs the legs
   * @param rate R [N mm/rad]
   * @param rateConstant c of the rate per turn [-]
   * @return true if it does
   */
  public static boolean leavesABody(Wire wire, Legs legs, double rate, double rateConstant) {
    return diameterTimesBodyCoils(wire, legs, rate, rateConstant) > 0;
  }

  private static double diameterTimesBodyCoils(
      Wire wire, Legs legs, double rate, double rateConstant) {
    return AngularRate.diameterTimesCoils(
            wire.elasticModulus(), wire.diameter(), rate, rateConstant)
        - legs.diameterTimesCoils();
  }

  /** Mean diameter times body coils, the same for all [mm]. */
  public double diameterTimesBodyCoils() {
    return diameterTimesBodyCoils(wire, legs, rate, duty.rateConstant());
  }

  @Override
  public String endForm() {
    return Legs.ID;
  }

  @Override
  public double fewestCoils() {
    return Math.min(FEWEST_COILS, mostCoils() / 2);
  }

  @Override
  public double mostCoils() {
    return diameterTimesBodyCoils() / (TIGHTEST_INDEX * coatedDiameter());
  }

  private double coatedDiameter() {
    return wire.diameter() + 2 * duty.coating();
  }

  private double meanDiameterAt(double coils) {
    return diameterTimesBodyCoils() / coils;
  }

  @Override
  public TorsionState at(double coils) {
    return new TorsionState(spring(meanDiameterAt(coils), coils), duty, freeAngle);
  }

  private TorsionSpring spring(double meanDiameter, double coils) {
    return new TorsionSpring(wire, meanDiameter, coils, legs);
  }

  @Override
  public Optional<TorsionState> rounded(double coils) {
    double exact = meanDiameterAt(coils);
    double meanDiameter = Rounding.toStep(exact, rounding.diameterStepAt(exact));
    if (!(meanDiameter > coatedDiameter())) {
      return Optional.empty();
    }
    TorsionSpring spring = spring(meanDiameter, coils);
    return Optional.of(new TorsionState(spring, duty, setting(spring)));
  }

  private double setting(TorsionSpring spring) {
    return legAngleFixed
        ? freeAngle
        : duty.setting(freeAngle, rate, spring.rate(duty.rateConstant()));
  }

  /**
   * {@inheritDoc}
   *
   * <p>Half a step of the mean diameter moves a torque by no more than dD/D, and a stress by that
   * and by what it moves the factor; twice that covers both.
   */
  @Override
  public double roundingShare(double coils) {
    return 2 * moved(coils) * (1 + factorSlope(coils));
  }

  /**
   * {@inheritDoc}
   *
   * <p>Along the family D goes with 1/n, and the stress of one torque with the factor alone: a
   * share of stress is that share over the slope of the factor, in coils. Diameters under load
   * follow D and the deflection of a coil.
   */
  @Override
  public double play(double coils) {
    double stress = roundingShare(coils) / factorSlope(coils);
    double turned = Math.min(1, Math.abs(turnsOfACoil(coils)));
    double diameter = 2 * moved(coils) * (1 + 3 * turned);
    return SAFETY * coils * Math.max(stress, diameter);
  }

  /** Half a step of the mean diameter, as a share of it [-]. */
  private double moved(double coils) {
    double meanDiameter = meanDiameterAt(coils);
    return rounding.diameterStepAt(meanDiameter) / 2 / meanDiameter;
  }

  /** How much of a turn each coil gives at the greatest torque [-]. */
  private double turnsOfACoil(double coils) {
    TorsionState state = at(coils);
    return state.spring().bodyTurns(state.greatest().deflection()) / coils;
  }

  /** How the inner factor falls with the index, - d ln Ki / d ln C, kept from being endless [-]. */
  private double factorSlope(double coils) {
    double c = meanDiameterAt(coils) / wire.diameter();
    double slope = c * ((8 * c - 4) / (4 * c * c - 4 * c) - (8 * c - 1) / (4 * c * c - c - 1));
    return Math.min(GREATEST_SLOPE, Math.max(LEAST_SLOPE, slope));
  }
}
