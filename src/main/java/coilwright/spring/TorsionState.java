package coilwright.spring;

import coilwright.material.Wire;
import coilwright.source.Citation;
import coilwright.source.Source;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * A torsion spring at all its loads. The numbers that several limits ask for are computed once; the
 * rest follow from them when asked.
 */
public final class TorsionState implements State {

  /** Below this many body coils friction and ends tell more than the body [-]. */
  public static final double FEW_COILS = 3;

  /** Where they are taken from. */
  public static final Citation FEW_COILS_SOURCE =
      Citation.seen(Source.EN_13906_3, "scope, at least 3 active coils");

  private final TorsionSpring spring;
  private final TorsionDuty duty;
  private final double freeAngle;
  private final double rate;
  private final TorqueState greatest;

  /**
   * Computes a spring at its loads.
   *
   * @param spring the spring
   * @param duty the loads, and how rate and stress are reckoned
   * @param freeAngle where it is set to come to no torque, in the loads' reference [rad]
   */
  public TorsionState(TorsionSpring spring, TorsionDuty duty, double freeAngle) {
    this.spring = spring;
    this.duty = duty;
    this.freeAngle = freeAngle;
    this.rate = spring.rate(duty.rateConstant());
    double deflection = 0;
    for (TorquePoint load : duty.loads()) {
      deflection = Math.max(deflection, deflection(load));
    }
    this.greatest = at(deflection);
  }

  /** Deflection of a load [rad]; a spring not yet reached by an angle bears nothing. */
  private double deflection(TorquePoint load) {
    return load.angle().isPresent()
        ? Math.max(0, duty.sign() * (load.angle().getAsDouble() - freeAngle))
        : load.torque().orElseThrow() / rate;
  }

  private TorqueState at(double deflection) {
    double torque = rate * deflection;
    double stress = BendingStress.uncorrected(torque, spring.wireDiameter());
    double turns = duty.sign() * spring.bodyTurns(deflection);
    double mean = WoundBody.meanDiameter(spring.meanDiameter(), spring.bodyCoils(), turns);
    return new TorqueState(
        duty.referenced()
            ? OptionalDouble.of(freeAngle + duty.sign() * deflection)
            : OptionalDouble.empty(),
        torque,
        deflection,
        stress,
        stress * duty.factor().at(spring.springIndex()),
        mean - spring.wireDiameter(),
        mean + spring.wireDiameter(),
        WoundBody.length(coatedDiameter(), spring.bodyCoils(), turns));
  }

  /** The spring. */
  public TorsionSpring spring() {
    return spring;
  }

  /** What it was asked, and how it was reckoned. */
  public TorsionDuty duty() {
    return duty;
  }

  @Override
  public Wire wire() {
    return spring.wire();
  }

  @Override
  public String endForm() {
    return Legs.ID;
  }

  @Override
  public boolean ground() {
    return false;
  }

  /** Legs are straightened off the coil; where there are none, nothing is done. */
  @Override
  public EndWork endWork() {
    return spring.legs().length() > 0 ? EndWork.LEG_FORMING : EndWork.NO_LEGS;
  }

  @Override
  public double coils() {
    return spring.bodyCoils();
  }

  @Override
  public double mass() {
    return spring.mass();
  }

  @Override
  public double wireLength() {
    return spring.wireLength();
  }

  @Override
  public boolean massHardlyVaries() {
    return true;
  }

  /** Angular rate R [N mm/rad]. */
  public double rate() {
    return rate;
  }

  /** The loads, in the order asked. */
  public List<TorqueState> loads() {
    List<TorqueState> states = new ArrayList<>(duty.loads().size());
    for (TorquePoint load : duty.loads()) {
      states.add(at(deflection(load)));
    }
    return states;
  }

  /** The load of the greatest torque. */
  public TorqueState greatest() {
    return greatest;
  }

  /** Where it comes to no torque, in the loads' reference [rad]; empty where they have none. */
  public OptionalDouble freeAngle() {
    return duty.referenced() ? OptionalDouble.of(freeAngle) : OptionalDouble.empty();
  }

  /**
   * Angle from the first to the second leg when free: both seen pointing away from the body, along
   * the axis, counted in the winding direction [rad].
   */
  public double freeLegAngle() {
    return spring.legAngle(0);
  }

  /**
   * The same at a load.
   *
   * @param load which, the first being 1
   * @return the angle [rad], from 0 to below 2 pi
   */
  public double legAngleAt(int load) {
    return spring.legAngle(duty.sign() * deflection(duty.loads().get(load - 1)));
  }

  /** Length of the free body, coating included [mm]. */
  public double freeBodyLength() {
    return WoundBody.length(coatedDiameter(), spring.bodyCoils(), 0);
  }

  /** Wire diameter over its coating [mm]. */
  public double coatedDiameter() {
    return spring.wireDiameter() + 2 * duty.coating();
  }

  /** The least inside diameter within the coating, from free to the greatest torque [mm]. */
  public double leastInsideDiameter() {
    return Math.min(spring.insideDiameter(), greatest.insideDiameter()) - 2 * duty.coating();
  }

  /** The greatest outside diameter over the coating, from free to the greatest torque [mm]. */
  public double greatestOutsideDiameter() {
    return Math.max(spring.outsideDiameter(), greatest.outsideDiameter()) + 2 * duty.coating();
  }

  /** Whether the body has so few coils that friction and ends tell more than the body. */
  public boolean fewCoils() {
    return spring.bodyCoils() < FEW_COILS;
  }
}
