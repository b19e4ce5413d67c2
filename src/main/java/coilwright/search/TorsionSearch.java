package coilwright.search;

import coilwright.limit.CoilSet;
import coilwright.limit.Limit;
import coilwright.limit.TorsionLimits;
import coilwright.material.Wire;
import coilwright.problem.Design;
import coilwright.problem.LegsAsked;
import coilwright.problem.LimitName;
import coilwright.problem.Problem;
import coilwright.problem.TorqueLine;
import coilwright.problem.TorsionAsked;
import coilwright.problem.TorsionDesign;
import coilwright.spring.Legs;
import coilwright.spring.TorsionDuty;
import coilwright.spring.TorsionFamily;
import coilwright.spring.TorsionSpring;
import coilwright.spring.TorsionState;
import java.util.ArrayList;
import java.util.List;

/** The search for torsion springs: a problem's wires as families, and its limits. */
public final class TorsionSearch implements Synthesis<TorsionState> {

  /** A fraction of a coil is kept to this many parts: far finer than a leg can be set [1/coil]. */
  private static final double PARTS = 1e9;

  @Override
  public List<TorsionFamily> families(Problem problem, List<Wire> wires) {
    TorsionAsked asked = asked(problem);
    TorqueLine line = asked.line().orElseThrow();
    TorsionLoads loads = TorsionLoads.of(problem);
    List<TorsionFamily> families = new ArrayList<>();
    for (Wire wire : wires) {
      if (leavesABody(asked, wire)) {
        families.add(
            new TorsionFamily(
                wire,
                legs(asked.legs()),
                line.rate(),
                loads.freeAngle().orElseThrow(),
                asked.legs().angle().isPresent(),
                loads.duty(problem),
                problem.make().rounding()));
      }
    }
    return families;
  }

  @Override
  public List<Conflict> impossible(Problem problem, List<Wire> wires) {
    TorsionAsked asked = asked(problem);
    List<Conflict> conflicts = new ArrayList<>();
    for (Wire wire : wires) {
      if (!leavesABody(asked, wire)) {
        conflicts.add(
            new Conflict(wire, Legs.ID, List.of(new Conflict.Part(LimitName.LEGS, CoilSet.EMPTY))));
      }
    }
    return conflicts;
  }

  private static boolean leavesABody(TorsionAsked asked, Wire wire) {
    double rate = asked.line().orElseThrow().rate();
    return TorsionFamily.leavesABody(wire, legs(asked.legs()), rate, asked.rateConstant());
  }

  @Override
  public int endForms(Problem problem) {
    return 1;
  }

  /** {@inheritDoc} An angle between the legs leaves whole coils and one fraction. */
  @Override
  public CoilStep step(Problem problem) {
    LegsAsked legs = asked(problem).legs();
    return legs.angle().isPresent()
        ? new CoilStep(1, fraction(asked(problem), legs))
        : new CoilStep(problem.make().coilStep());
  }

  /** What the legs' angle at a load leaves of a coil beyond whole ones when free. */
  private static double fraction(TorsionAsked asked, LegsAsked legs) {
    TorqueLine line = asked.line().orElseThrow();
    double torque = line.loads().get(legs.atLoad() - 1).torque().orElseThrow();
    double windingUp = (asked.closing() ? 1 : -1) * torque / line.rate();
    double free = legs.angle().orElseThrow() - windingUp;
    double parts = Math.rint(Legs.fractionOfACoil(free) * PARTS);
    return parts < PARTS ? parts / PARTS : 0;
  }

  @Override
  public List<Limit<TorsionState>> limits(Problem problem) {
    return TorsionLimits.ofSearch(problem, TorsionLoads.of(problem).judged());
  }

  @Override
  public TorsionState designed(Problem problem, Design design, Wire wire) {
    TorsionDesign asked = (TorsionDesign) design;
    TorsionSpring spring =
        new TorsionSpring(wire, asked.meanDiameter(), asked.coils(), legs(asked.legs()));
    TorsionLoads loads = TorsionLoads.of(problem);
    double rate = spring.rate(asked(problem).rateConstant());
    TorsionDuty duty = loads.duty(problem);
    boolean set = loads.fixed() && asked.legs().angle().isEmpty();
    double free = loads.freeAngleAt(rate);
    return new TorsionState(
        spring,
        duty,
        set ? duty.setting(free, asked(problem).line().orElseThrow().rate(), rate) : free);
  }

  @Override
  public List<Limit<TorsionState>> checkLimits(Problem problem) {
    TorsionDesign design = (TorsionDesign) problem.design().orElseThrow();
    return TorsionLimits.ofCheck(problem, TorsionLoads.of(problem).judged(), design.legs());
  }

  private static TorsionAsked asked(Problem problem) {
    return problem.torsion().orElseThrow();
  }

  private static Legs legs(LegsAsked asked) {
    return new Legs(asked.first(), asked.second());
  }
}
