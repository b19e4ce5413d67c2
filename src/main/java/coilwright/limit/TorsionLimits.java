package coilwright.limit;

import coilwright.problem.DesignLimits;
import coilwright.problem.LegsAsked;
import coilwright.problem.LimitName;
import coilwright.problem.Problem;
import coilwright.problem.TorsionAsked;
import coilwright.spring.TorquePoint;
import coilwright.spring.TorsionState;
import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** The limits that a problem sets for torsion springs, in the order of their names. */
public final class TorsionLimits {

  private static final DesignLimits USUAL = DesignLimits.DEFAULTS;

  /** Far more body coils than any torsion spring in trade has [-]. */
  private static final double MOST_COILS = 200;

  private final List<Limit<TorsionState>> limits = new ArrayList<>();

  private TorsionLimits() {}

  /**
   * The limits of a search.
   *
   * <p>Nothing else ends the coils of a torsion spring: where the file sets neither a greatest
   * number nor a greatest body length, {@link #MOST_COILS} does.
   *
   * @param problem a problem of a torsion spring
   * @param loads the loads of one spring, as its states report them
   * @return the limits; bounds the file switches off are left out
   */
  public static List<Limit<TorsionState>> ofSearch(Problem problem, List<TorquePoint> loads) {
    boolean endless =
        problem.limits().activeCoils().max().isEmpty()
            && problem.torsion().orElseThrow().maxBodyLength().isEmpty();
    return of(problem, endless, loads, Optional.empty());
  }

  /**
   * The limits that a given spring is held to.
   *
   * @param problem a problem of a torsion spring
   * @param loads the loads of one spring that its torques are held to, as its states report them;
   *     none where no torque is asked at an angle
   * @param legs its legs, whose angle is judged where it is asked; in a search the coil counts set
   *     it
   * @return the limits; bounds the file switches off are left out
   */
  public static List<Limit<TorsionState>> ofCheck(
      Problem problem, List<TorquePoint> loads, LegsAsked legs) {
    return of(problem, false, loads, Optional.of(legs));
  }

  private static List<Limit<TorsionState>> of(
      Problem problem, boolean endless, List<TorquePoint> loads, Optional<LegsAsked> legs) {
    TorsionAsked asked = problem.torsion().orElseThrow();
    String covered = problem.coating() > 0 ? ", coating included" : "";
    TorsionLimits all = new TorsionLimits();
    all.proportions(problem.limits(), endless);
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

  private void proportions(DesignLimits asked, boolean endless) {
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
    if (endless) {
      bands.fixed(
          new Check(
              LimitName.ACTIVE_COILS,
              Side.MAX,
              Dimension.NUMBER,
              "coils of the body, free state; neither their number nor the body length is limited"),
          TorsionState::coils,
          OptionalDouble.of(MOST_COILS),
          Bands.PRACTICE);
    }
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
