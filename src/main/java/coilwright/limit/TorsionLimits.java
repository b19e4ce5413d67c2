package coilwright.limit;

import coilwright.problem.Band;
import coilwright.problem.DesignLimits;
import coilwright.problem.LegsAsked;
import coilwright.problem.LimitName;
import coilwright.problem.Problem;
import coilwright.problem.TorsionAsked;
import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.spring.TorquePoint;
import coilwright.spring.TorsionState;
import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;

/** The limits that a problem sets for torsion springs, in the order of their names. */
public final class TorsionLimits {

  private static final DesignLimits USUAL = DesignLimits.DEFAULTS;
  private static final Citation GIVEN = Citation.seen(Source.PROBLEM_FILE, "limits");
  private static final Citation PRACTICE = Citation.seen(Source.COMMON_PRACTICE, "");

  private final List<Limit<TorsionState>> limits = new ArrayList<>();

  private TorsionLimits() {}

  /**
   * Every limit that applies.
   *
   * @param problem a problem of a torsion spring
   * @param loads the loads of one spring that its torques are held to, as its states report them;
   *     none where no torque is asked at an angle
   * @param legs the legs of a given spring, whose angle is judged where it is asked; empty in a
   *     search, whose coil counts set it
   * @return the limits; bounds the file switches off are left out
   */
  public static List<Limit<TorsionState>> of(
      Problem problem, List<TorquePoint> loads, Optional<LegsAsked> legs) {
    TorsionAsked asked = problem.torsion().orElseThrow();
    String covered = problem.coating() > 0 ? ", coating included" : "";
    TorsionLimits all = new TorsionLimits();
    all.proportions(problem.limits());
    all.limits.addAll(TorsionSpace.outside(problem.envelope(), asked.closing(), covered));
    all.stress(asked, BendingBasis.of(problem.limits().method()));
    all.limits.addAll(
        TorsionSpace.inside(problem.envelope(), asked.maxBodyLength(), asked.closing(), covered));
    legs.ifPresent(all::legAngle);
    if (!loads.isEmpty()) {
      all.limits.add(new NominalTorque(loads));
    }
    return List.copyOf(all.limits);
  }

  private void proportions(DesignLimits asked) {
    band(
        LimitName.SPRING_INDEX,
        asked.springIndex(),
        USUAL.springIndex(),
        "mean diameter over wire diameter, free state",
        state -> state.spring().springIndex());
    band(
        LimitName.ACTIVE_COILS,
        asked.activeCoils(),
        USUAL.activeCoils(),
        "coils of the body, free state",
        TorsionState::coils);
  }

  private void band(
      LimitName name,
      Band band,
      Band usual,
      String definition,
      ToDoubleFunction<TorsionState> value) {
    bound(new Check(name, Side.MIN, Dimension.NUMBER, definition), value, band.min(), usual.min());
    bound(new Check(name, Side.MAX, Dimension.NUMBER, definition), value, band.max(), usual.max());
  }

  private void bound(
      Check check,
      ToDoubleFunction<TorsionState> value,
      OptionalDouble bound,
      OptionalDouble usual) {
    if (bound.isPresent()) {
      boolean straight = check.limit() == LimitName.ACTIVE_COILS;
      Citation source = bound.equals(usual) ? PRACTICE : GIVEN;
      limits.add(ValueLimit.fixed(check, value, bound.getAsDouble(), source, straight));
    }
  }

  private void stress(TorsionAsked asked, BendingBasis basis) {
    if (asked.bendingStress().judged()) {
      limits.add(BendingBound.of(asked.bendingStress(), basis, asked.closing()));
    }
  }

  private void legAngle(LegsAsked legs) {
    if (legs.angle().isPresent()) {
      limits.add(new LegAngleBound(legs.angle().getAsDouble(), legs.atLoad()));
    }
  }
}
