package coilwright.limit;

import coilwright.problem.LimitName;
import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.spring.TorquePoint;
import coilwright.spring.TorqueState;
import coilwright.spring.TorsionState;
import coilwright.unit.Dimension;
import java.util.List;

/**
 * The torques of a spring as it is set against the torques asked: what rounding may cost. A body
 * that is wound off before an angle is reached bears nothing there.
 */
final class NominalTorque implements Limit<TorsionState> {

  private static final double SHARE = 0.01;
  private static final Check CHECK =
      new Check(
          LimitName.NOMINAL_LOAD,
          Side.MAX,
          Dimension.TORQUE,
          "greatest difference from a torque asked, against 1 % of the greatest torque");
  private static final Citation SOURCE =
      Citation.seen(Source.COMMON_PRACTICE, "a drawing rounds within 1 %");

  private final List<TorquePoint> asked;
  private final double bound;

  /**
   * The loads asked.
   *
   * @param asked the loads in the order a state reports them; those with a torque are judged
   */
  NominalTorque(List<TorquePoint> asked) {
    this.asked = List.copyOf(asked);
    double greatest = 0;
    for (TorquePoint load : asked) {
      greatest = Math.max(greatest, load.torque().orElse(0));
    }
    this.bound = SHARE * greatest;
  }

  @Override
  public Check check() {
    return CHECK;
  }

  @Override
  public Finding judge(TorsionState state) {
    double worst = 0;
    List<TorqueState> loads = state.loads();
    for (int i = 0; i < asked.size(); i++) {
      double torque = borne(loads.get(i));
      worst = Math.max(worst, Math.abs(torque - asked.get(i).torque().orElse(torque)));
    }
    return Finding.of(CHECK, worst, bound, SOURCE);
  }

  private static double borne(TorqueState load) {
    return load.outsideDiameter() < Double.POSITIVE_INFINITY ? load.torque() : 0;
  }

  /** {@inheritDoc} Only bodies without limits on stress and index can be wound off. */
  @Override
  public boolean onlyAfterRounding() {
    return true;
  }
}
