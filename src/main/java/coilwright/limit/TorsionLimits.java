package coilwright.limit;

import coilwright.problem.DesignLimits;
import coilwright.problem.LegsAsked;
import coilwright.problem.LimitName;
import coilwright.problem.Problem;
import coilwright.problem.TorsionAsked;
import coilwright.spring.TorquePoint;
import coilwright.spring.TorsionState;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The limits that a problem sets for torsion springs, in the order of their names. */
public final class TorsionLimits {

  private static final DesignLimits USUAL = DesignLimits.DEFAULTS;

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
    Bands<TorsionState> bands = new Bands<>();
    bands.band(
        LimitName.SPRING_INDEX,
        asked.springIndex(),
        USUAL.springIndex(),
        "mean diameter over wire diameter, free state",
        state -> state.spring().springIndex());
    bands.band(
        LimitName.ACTIVE_COILS,
        asked.activeCoils(),
        USUAL.activeCoils(),
        "coils of the body, free state",
        TorsionState::coils);
    limits.addAll(bands.limits());
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
