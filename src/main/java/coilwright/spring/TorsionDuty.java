package coilwright.spring;

import coilwright.unit.Require;
import java.util.List;

/**
 * What a torsion spring is asked to do, and how its rate and stress are reckoned.
 *
 * @param closing whether the loads wind the spring up; else they unwind it
 * @param loads the loads of one spring, in the order they are reported; at least one, each with an
 *     angle or a torque
 * @param referenced whether the angles of the loads have a reference of their own; else they count
 *     from the free position asked and are not reported
 * @param rateConstant c of the rate per turn [-]
 * @param factor what corrects the stress
 * @param coating thickness of what covers the wire [mm]
 */
public record TorsionDuty(
    boolean closing,
    List<TorquePoint> loads,
    boolean referenced,
    double rateConstant,
    BendingFactor factor,
    double coating) {

  /** Copies the list; refuses none at all, and a negative coating. */
  public TorsionDuty {
    Require.positive(rateConstant, "rate constant", "-");
    Require.notNegative(coating, "coating", "mm");
    if (loads.isEmpty()) {
      throw new IllegalArgumentException("loads: none - must be at least one");
    }
    loads = List.copyOf(loads);
  }

  /**
   * The free angle that a spring of about the rate asked is set to: its least and its greatest load
   * miss what is asked by the same torque, one above and one below. A single load is met.
   *
   * @param asked the free angle asked [rad]
   * @param askedRate the rate asked [N mm/rad]
   * @param rate that of the spring [N mm/rad]
   * @return the angle [rad]
   */
  public double setting(double asked, double askedRate, double rate) {
    double least = Double.POSITIVE_INFINITY;
    double most = 0;
    for (TorquePoint load : loads) {
      double deflection = sign() * (load.angle().orElseThrow() - asked);
      least = Math.min(least, deflection);
      most = Math.max(most, deflection);
    }
    return asked + sign() * (1 - askedRate / rate) * (least + most) / 2;
  }

  /** The sign of a deflection in the winding direction: 1 where the spring closes, else -1. */
  public int sign() {
    return closing ? 1 : -1;
  }
}
