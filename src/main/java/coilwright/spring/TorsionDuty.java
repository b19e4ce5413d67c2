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

  /** The sign of a deflection in the winding direction: 1 where the spring closes, else -1. */
  public int sign() {
    return closing ? 1 : -1;
  }
}
