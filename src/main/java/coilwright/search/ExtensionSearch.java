package coilwright.search;

import coilwright.limit.CoilSet;
import coilwright.limit.ExtensionLimits;
import coilwright.limit.Limit;
import coilwright.material.Wire;
import coilwright.problem.Design;
import coilwright.problem.ExtensionAsked;
import coilwright.problem.ExtensionDesign;
import coilwright.problem.HookLength;
import coilwright.problem.HooksAsked;
import coilwright.problem.LimitName;
import coilwright.problem.LoadAsked;
import coilwright.problem.Problem;
import coilwright.problem.TensionLine;
import coilwright.spring.ExtensionCurve;
import coilwright.spring.ExtensionDuty;
import coilwright.spring.ExtensionFamily;
import coilwright.spring.ExtensionSpring;
import coilwright.spring.ExtensionState;
import coilwright.spring.HookFit;
import coilwright.spring.HookType;
import coilwright.spring.Hooks;
import coilwright.spring.LoadPoint;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** The search for extension springs: a problem's wires and hooks as families, and its limits. */
public final class ExtensionSearch implements Synthesis<ExtensionState> {

  private static final double HALF = 0.5;
  private static final double QUARTER = 0.25;

  @Override
  public List<ExtensionFamily> families(Problem problem, List<Wire> wires) {
    List<ExtensionFamily> families = new ArrayList<>();
    for (ExtensionFamily family : all(problem, wires)) {
      if (family.hasSprings()) {
        families.add(family);
      }
    }
    return families;
  }

  /** Hooks that alone are softer than the rate leave no body. */
  @Override
  public List<Conflict> impossible(Problem problem, List<Wire> wires) {
    List<Conflict> conflicts = new ArrayList<>();
    for (ExtensionFamily family : all(problem, wires)) {
      if (!family.hasSprings()) {
        Conflict.Part none = new Conflict.Part(LimitName.HOOKS, CoilSet.EMPTY);
        conflicts.add(new Conflict(family.wire(), family.endForm(), List.of(none)));
      }
    }
    return conflicts;
  }

  private static List<ExtensionFamily> all(Problem problem, List<Wire> wires) {
    ExtensionAsked asked = problem.extension().orElseThrow();
    TensionLine line = asked.line().orElseThrow();
    ExtensionDuty duty = duty(problem, line.loads());
    HookFit fit = fit(asked);
    List<ExtensionFamily> families = new ArrayList<>();
    for (Wire wire : wires) {
      for (HookType type : asked.hooks().types()) {
        ExtensionCurve curve =
            new ExtensionCurve(
                wire,
                hooks(asked.hooks(), type, wire),
                fit,
                line.rate(),
                line.zeroForceLength(),
                problem.coating());
        families.add(new ExtensionFamily(curve, duty, problem.make().rounding()));
      }
    }
    return families;
  }

  private static ExtensionDuty duty(Problem problem, List<LoadPoint> loads) {
    return new ExtensionDuty(loads, problem.limits().stressCorrection(), problem.overtravel());
  }

  private static HookFit fit(ExtensionAsked asked) {
    HookLength length = asked.hooks().length();
    return switch (length.rule()) {
      case NATURAL -> HookFit.natural();
      case GIVEN -> HookFit.ofHookLength(length.given().orElseThrow());
      case FREE ->
          asked.freeLength().isPresent()
              ? HookFit.ofFreeLength(asked.freeLength().getAsDouble())
              : HookFit.ofPreferredTension();
    };
  }

  private static Hooks hooks(HooksAsked asked, HookType type, Wire wire) {
    double active =
        asked.activeCoils().orElse(type.activeCoils(wire.shearModulus(), wire.elasticModulus()));
    return new Hooks(type, asked.bendRadius(), asked.sideRadius(), active);
  }

  @Override
  public int endForms(Problem problem) {
    return problem.extension().orElseThrow().hooks().types().size();
  }

  /**
   * {@inheritDoc}
   *
   * <p>The coil step counts body coils. Hooks in one plane leave whole and half coils, or multiples
   * of a coil step that is coarser and a multiple of a half; hooks at a right angle leave a quarter
   * and three quarters, whatever the step.
   */
  @Override
  public CoilStep step(Problem problem) {
    double step = problem.make().coilStep();
    return switch (problem.extension().orElseThrow().hooks().planes()) {
      case IN_LINE -> new CoilStep(step % HALF == 0 ? step : HALF);
      case RIGHT_ANGLE -> new CoilStep(HALF, QUARTER);
      case ANY -> new CoilStep(step);
    };
  }

  @Override
  public List<Limit<ExtensionState>> limits(Problem problem) {
    return ExtensionLimits.of(
        problem, problem.extension().orElseThrow().line().orElseThrow().loads());
  }

  @Override
  public ExtensionState designed(Problem problem, Design design, Wire wire) {
    ExtensionDesign asked = (ExtensionDesign) design;
    Hooks hooks = hooks(asked.hooks(), asked.hooks().types().get(0), wire);
    double coated = wire.diameter() + 2 * asked.coating();
    double length =
        asked.hooks().length().given().orElse(hooks.naturalLength(asked.meanDiameter(), coated));
    ExtensionSpring spring =
        new ExtensionSpring(
            wire, asked.meanDiameter(), asked.coils(), hooks, length, asked.coating());
    return new ExtensionState(spring, asked.initialTension(), duty(problem, checkLoads(problem)));
  }

  @Override
  public List<Limit<ExtensionState>> checkLimits(Problem problem) {
    return ExtensionLimits.of(problem, checkLoads(problem));
  }

  /** The loads of one spring; where the facts fix their line, it completes them. */
  private static List<LoadPoint> checkLoads(Problem problem) {
    ExtensionAsked asked = problem.extension().orElseThrow();
    if (asked.line().isPresent()) {
      return asked.line().get().loads();
    }
    int parallel = problem.facts().springsInParallel();
    List<LoadPoint> loads = new ArrayList<>();
    for (LoadAsked load : problem.facts().loads()) {
      OptionalDouble force = load.force();
      loads.add(
          new LoadPoint(
              load.length(),
              force.isPresent() ? OptionalDouble.of(force.getAsDouble() / parallel) : force));
    }
    return loads;
  }
}
