package coilwright.limit;

import coilwright.problem.Band;
import coilwright.problem.BucklingRule;
import coilwright.problem.DesignLimits;
import coilwright.problem.Envelope;
import coilwright.problem.LimitName;
import coilwright.problem.Problem;
import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.spring.Coil;
import coilwright.spring.CompressionState;
import coilwright.spring.EndType;
import coilwright.spring.Family;
import coilwright.spring.LoadPoint;
import coilwright.spring.Surge;
import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.ToDoubleFunction;

/** The limits that a problem sets for compression springs, in the order of their names. */
public final class CompressionLimits {

  private static final Citation ASKED = Citation.seen(Source.PROBLEM_FILE, "envelope");
  private static final DesignLimits USUAL = DesignLimits.DEFAULTS;
  private static final Citation GIVEN = Citation.seen(Source.PROBLEM_FILE, "limits");
  private static final Citation PRACTICE = Citation.seen(Source.COMMON_PRACTICE, "");
  private static final Citation CLASH =
      Citation.seen(Source.SHIGLEY, "fractional overrun to closure, at least 0.15");

  /** Limits on lengths of coils that touch, and on their count. */
  private static final Set<LimitName> STRAIGHT =
      EnumSet.of(LimitName.ACTIVE_COILS, LimitName.SOLID_LENGTH, LimitName.CLASH_ALLOWANCE);

  private final List<Limit<CompressionState>> limits = new ArrayList<>();

  private CompressionLimits() {}

  /**
   * Every limit that applies.
   *
   * @param problem the problem
   * @param loads the loads of one spring, as its states report them
   * @return the limits; bounds the file switches off are left out
   */
  public static List<Limit<CompressionState>> of(Problem problem, List<LoadPoint> loads) {
    return of(problem, loads, OptionalDouble.empty());
  }

  /**
   * Every limit that applies, where the free length too is a fact that a spring must agree with.
   *
   * @param problem the problem
   * @param loads the loads of one spring, as its states report them
   * @param freeLength L0 of the load line asked [mm], or empty
   * @return the limits; bounds the file switches off are left out
   */
  public static List<Limit<CompressionState>> of(
      Problem problem, List<LoadPoint> loads, OptionalDouble freeLength) {
    CompressionLimits all = new CompressionLimits();
    all.stress(problem.limits());
    all.proportions(problem.limits());
    all.space(problem.envelope());
    all.travel(problem.limits());
    all.stability(problem);
    all.surge(problem.limits());
    all.nominal(loads, freeLength);
    return List.copyOf(all.limits);
  }

  private void stress(DesignLimits asked) {
    String author = asked.stressCorrection().author();
    if (asked.stressAtLoad().judged()) {
      limits.add(StressBound.atLoad(asked.stressAtLoad(), author));
    }
    if (asked.stressAtSolid().judged()) {
      limits.add(StressBound.atSolid(asked.stressAtSolid(), author));
    }
  }

  private void proportions(DesignLimits asked) {
    band(
        LimitName.SPRING_INDEX,
        asked.springIndex(),
        USUAL.springIndex(),
        "mean diameter over wire diameter",
        state -> state.spring().springIndex());
    band(
        LimitName.ACTIVE_COILS,
        asked.activeCoils(),
        USUAL.activeCoils(),
        "active coils",
        CompressionState::coils);
    asked.maxPitchAngle().ifPresent(this::pitchAngle);
  }

  private void pitchAngle(double greatest) {
    limits.add(
        new ValueLimit<>(
            new Check(LimitName.PITCH_ANGLE, Side.MAX, Dimension.ANGLE, "free state"),
            state -> state.spring().pitchAngle(),
            state -> greatest,
            source(OptionalDouble.of(greatest), USUAL.maxPitchAngle(), PRACTICE),
            false,
            CompressionLimits::steepest));
  }

  /**
   * The pitch angle falls along a family, but for plain and ground ends it rises up to half a coil:
   * it goes with the cube root of n over n + 1.
   */
  private static double[] steepest(Family<CompressionState> family) {
    boolean rises = family.endForm().equals(EndType.PLAIN_GROUND.id());
    return rises ? new double[] {0.5} : new double[0];
  }

  private void band(
      LimitName name,
      Band band,
      Band usual,
      String definition,
      ToDoubleFunction<CompressionState> value) {
    fixed(
        new Check(name, Side.MIN, Dimension.NUMBER, definition),
        value,
        band.min(),
        source(band.min(), usual.min(), PRACTICE));
    fixed(
        new Check(name, Side.MAX, Dimension.NUMBER, definition),
        value,
        band.max(),
        source(band.max(), usual.max(), PRACTICE));
  }

  /** Where a bound comes from: the file, unless it is the usual one. */
  private static Citation source(OptionalDouble bound, OptionalDouble usual, Citation usualSource) {
    return bound.equals(usual) ? usualSource : GIVEN;
  }

  /** Adds a limit against a fixed bound, where there is one. */
  private void fixed(
      Check check,
      ToDoubleFunction<CompressionState> value,
      OptionalDouble bound,
      Citation source) {
    if (bound.isPresent()) {
      double limit = bound.getAsDouble();
      limits.add(
          new ValueLimit<>(check, value, state -> limit, source, STRAIGHT.contains(check.limit())));
    }
  }

  private void space(Envelope space) {
    double clearance = space.diametralClearance().orElse(0);
    length(
        LimitName.BORE,
        Side.MAX,
        "outside diameter at solid, ends held, against bore less clearance",
        state -> state.spring().outsideDiameterAtSolid(),
        shifted(space.bore(), -clearance),
        Coil.GROWTH);
    length(
        LimitName.ROD,
        Side.MIN,
        "inside diameter, free state, against rod plus clearance",
        state -> state.spring().insideDiameter(),
        shifted(space.rod(), clearance),
        ASKED);
    length(
        LimitName.OUTSIDE_DIAMETER,
        Side.MAX,
        "nominal, free state",
        state -> state.spring().outsideDiameter(),
        space.maxOutsideDiameter(),
        ASKED);
    length(
        LimitName.INSIDE_DIAMETER,
        Side.MIN,
        "nominal, free state",
        state -> state.spring().insideDiameter(),
        space.minInsideDiameter(),
        ASKED);
    length(
        LimitName.FREE_LENGTH,
        Side.MAX,
        "nominal",
        state -> state.spring().freeLength(),
        space.maxFreeLength(),
        ASKED);
    length(
        LimitName.SOLID_LENGTH,
        Side.MAX,
        "nominal wire diameter",
        CompressionState::solidLength,
        space.maxSolidLength(),
        EndType.CITATION);
  }

  private static OptionalDouble shifted(OptionalDouble value, double by) {
    return value.isPresent() ? OptionalDouble.of(value.getAsDouble() + by) : value;
  }

  private void length(
      LimitName name,
      Side side,
      String definition,
      ToDoubleFunction<CompressionState> value,
      OptionalDouble bound,
      Citation source) {
    fixed(new Check(name, side, Dimension.LENGTH, definition), value, bound, source);
  }

  private void travel(DesignLimits asked) {
    fixed(
        new Check(
            LimitName.CLASH_ALLOWANCE,
            Side.MIN,
            Dimension.SHARE,
            "travel left between the most compressed load and solid, of the deflection there"),
        CompressionState::clashAllowance,
        asked.clashAllowance(),
        source(asked.clashAllowance(), USUAL.clashAllowance(), CLASH));
    limits.add(
        new ValueLimit<>(
            new Check(
                LimitName.BEYOND_SOLID,
                Side.MAX,
                Dimension.LENGTH,
                "solid length, against the length at the most compressed load"),
            CompressionState::solidLength,
            state -> state.mostCompressed().length(),
            EndType.CITATION,
            true));
    limits.add(
        new ValueLimit<>(
            new Check(
                LimitName.BEYOND_SOLID,
                Side.MIN,
                Dimension.LENGTH,
                "pitch, free state, against the wire diameter"),
            state -> state.spring().pitch(),
            state -> state.spring().wireDiameter(),
            EndType.CITATION,
            false));
  }

  private void stability(Problem problem) {
    BucklingRule rule = problem.limits().buckling();
    boolean judged =
        rule == BucklingRule.AT_LOAD
            || rule == BucklingRule.AT_SOLID
            || rule == BucklingRule.AT_LOAD_UNLESS_GUIDED && !problem.envelope().guides();
    if (judged) {
      limits.add(new BucklingBound(rule == BucklingRule.AT_SOLID));
    }
  }

  private void surge(DesignLimits asked) {
    fixed(
        new Check(
            LimitName.SURGE_FREQUENCY,
            Side.MIN,
            Dimension.FREQUENCY,
            "first mode of the active coils, both ends seated"),
        state -> state.spring().surgeFrequency(),
        asked.minSurgeFrequency(),
        Surge.CITATION);
  }

  private void nominal(List<LoadPoint> loads, OptionalDouble freeLength) {
    if (loads.stream().anyMatch(load -> load.length().isPresent() && load.force().isPresent())) {
      limits.add(new NominalLoad(loads, freeLength));
    }
  }
}
