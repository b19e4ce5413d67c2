package coilwright.search;

import coilwright.problem.Problem;
import coilwright.problem.TorqueAsked;
import coilwright.problem.TorqueLine;
import coilwright.problem.TorsionAsked;
import coilwright.spring.BendingFactor;
import coilwright.spring.Method;
import coilwright.spring.TorquePoint;
import coilwright.spring.TorsionDuty;
import java.util.List;
import java.util.OptionalDouble;

/**
 * The loads of one torsion spring, and where it comes to no torque.
 *
 * @param points the loads in file order
 * @param freeAngle the angle without torque [rad]; empty where it follows from a load and the rate
 *     of the spring that is checked
 * @param referenced whether the angles have a reference of the file's; else they count from free
 * @param sign of a deflection in the winding direction: 1 where the spring closes, else -1
 * @param fixed whether the file fixes torque against angle, so that a spring's torques are judged
 */
record TorsionLoads(
    List<TorquePoint> points,
    OptionalDouble freeAngle,
    boolean referenced,
    int sign,
    boolean fixed) {

  /**
   * The loads of a problem.
   *
   * @param problem a problem of a torsion spring
   */
  static TorsionLoads of(Problem problem) {
    TorsionAsked asked = problem.torsion().orElseThrow();
    int sign = asked.closing() ? 1 : -1;
    return asked.line().isPresent()
        ? onLine(asked.line().get(), sign)
        : alone(asked, problem.facts().springsInParallel(), sign);
  }

  /** Loads on a line; without a reference they count from the line's free position. */
  private static TorsionLoads onLine(TorqueLine line, int sign) {
    if (line.freeAngle().isPresent()) {
      return new TorsionLoads(line.loads(), line.freeAngle(), true, sign, true);
    }
    List<TorquePoint> points =
        line.loads().stream().map(load -> fromFree(load, line.rate(), sign)).toList();
    return new TorsionLoads(points, OptionalDouble.of(0), false, sign, true);
  }

  private static TorquePoint fromFree(TorquePoint load, double rate, int sign) {
    double torque = load.torque().orElseThrow();
    return new TorquePoint(OptionalDouble.of(sign * torque / rate), load.torque());
  }

  /** Loads that fix no line: what is open follows from the spring that is checked. */
  private static TorsionLoads alone(TorsionAsked asked, int springs, int sign) {
    List<TorquePoint> points =
        asked.loads().stream().map(TorqueAsked::point).map(load -> share(load, springs)).toList();
    boolean referenced = points.stream().anyMatch(load -> load.angle().isPresent());
    return new TorsionLoads(points, asked.facts().freeAngle(), referenced, sign, false);
  }

  private static TorquePoint share(TorquePoint load, int springs) {
    return load.torque().isPresent()
        ? new TorquePoint(load.angle(), OptionalDouble.of(load.torque().getAsDouble() / springs))
        : load;
  }

  /** The loads whose torques a spring is held to; none where no line is fixed. */
  List<TorquePoint> judged() {
    return fixed ? points : List.of();
  }

  /** What a spring is asked to do. */
  TorsionDuty duty(Problem problem) {
    TorsionAsked asked = problem.torsion().orElseThrow();
    return new TorsionDuty(
        asked.closing(),
        points,
        referenced,
        asked.rateConstant(),
        problem.limits().method() == Method.EN_13906 ? BendingFactor.EN_13906 : BendingFactor.INNER,
        problem.coating());
  }

  /**
   * Where a spring comes to no torque: as the file fixes it, else so that the first load with both
   * angle and torque is met, else where angles count from.
   *
   * @param rate R of the spring [N mm/rad]
   * @return the angle [rad]
   */
  double freeAngleAt(double rate) {
    if (freeAngle.isPresent()) {
      return freeAngle.getAsDouble();
    }
    for (TorquePoint load : points) {
      if (load.angle().isPresent() && load.torque().isPresent()) {
        return load.angle().getAsDouble() - sign * load.torque().getAsDouble() / rate;
      }
    }
    return 0;
  }
}
