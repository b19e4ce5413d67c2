package coilwright.limit;

import coilwright.problem.BucklingRule;
import coilwright.problem.DesignLimits;
import coilwright.problem.LimitName;
import coilwright.problem.Problem;
import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.spring.CompressionState;
import coilwright.spring.EndType;
import coilwright.spring.GapSum;
import coilwright.spring.LoadPoint;
import coilwright.spring.Method;
import coilwright.spring.Surge;
import coilwright.unit.Dimension;
import java.util.List;
import java.util.OptionalDouble;

/** The limits that a problem sets for compression springs, in the order of their names. */
public final class CompressionLimits {

  private static final DesignLimits USUAL = DesignLimits.DEFAULTS;
  private static final Citation CLASH =
      Citation.seen(Source.SHIGLEY, "fractional overrun to closure, at least 0.15");

  private static final Limit<CompressionState> GAP_SUM =
      new ValueLimit<>(
          new Check(
              LimitName.CLASH_ALLOWANCE,
              Side.MIN,
              Dimension.LENGTH,
              "travel left between the most compressed load and solid, against the least sum of"
                  + " gaps"),
          CompressionState::travelLeft,
          CompressionState::leastGapSum,
          GapSum.CITATION,
          false);

  private final Method method;
  private final boolean overtravel;
  private final String covered;
  private final Bands<CompressionState> bands = new Bands<>();
  private final List<Limit<CompressionState>> limits = bands.limits();

  private CompressionLimits(Problem problem) {
    this.method = problem.limits().method();
    this.overtravel = problem.overtravel().isPresent();
    this.covered = problem.coating() > 0 ? ", coating included" : "";
  }

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
    CompressionLimits all = new CompressionLimits(problem);
    all.stress(problem.limits(), StressBasis.of(all.method, problem.setRemoved()));
    all.proportions(problem.limits());
    all.limits.addAll(SpaceLimits.of(problem.envelope(), all.method, all.covered));
    all.travel(problem.limits());
    all.stability(problem);
    all.surge(problem.limits());
    all.nominal(loads, freeLength);
    return List.copyOf(all.limits);
  }

  private void stress(DesignLimits asked, StressBasis basis) {
    if (asked.stressAtLoad().judged()) {
      limits.add(
          StressBound.atLoad(asked.stressAtLoad(), basis, asked.stressCorrection(), overtravel));
    }
    if (asked.stressAtSolid().judged()) {
      limits.add(StressBound.atSolid(asked.stressAtSolid(), basis, asked.stressCorrection()));
    }
  }

  private void proportions(DesignLimits asked) {
    bands.band(
        LimitName.SPRING_INDEX,
        asked.springIndex(),
        USUAL.springIndex(),
        "mean diameter over wire diameter",
        state -> state.spring().springIndex());
    bands.band(
        LimitName.ACTIVE_COILS,
        asked.activeCoils(),
        USUAL.activeCoils(),
        "active coils",
        CompressionState::coils);
    asked.maxPitchAngle().ifPresent(this::pitchAngle);
  }

  private void pitchAngle(double greatest) {
    Citation source =
        Bands.source(OptionalDouble.of(greatest), USUAL.maxPitchAngle(), Bands.PRACTICE);
    limits.add(new PitchAngleBound(greatest, source));
  }

  private void travel(DesignLimits asked) {
    if (asked.clashAllowance().isPresent()) {
      limits.add(new Shaping<>(clashShare(asked.clashAllowance())));
    }
    if (asked.gapSum()) {
      limits.add(new Shaping<>(GAP_SUM));
    }
    limits.add(
        new ValueLimit<>(
            new Check(
                LimitName.BEYOND_SOLID,
                Side.MAX,
                Dimension.LENGTH,
                "solid length"
                    + covered
                    + (overtravel
                        ? ", against the shortest length, overtravel included"
                        : ", against the length at the most compressed load")),
            CompressionState::solidLength,
            state -> state.extreme().length(),
            method.solidCitation(),
            true));
    limits.add(
        new ValueLimit<>(
            new Check(
                LimitName.BEYOND_SOLID,
                Side.MIN,
                Dimension.LENGTH,
                "pitch, free state, against the wire diameter" + covered),
            state -> state.spring().pitch(),
            CompressionState::coatedDiameter,
            EndType.CITATION,
            false));
  }

  private static Limit<CompressionState> clashShare(OptionalDouble share) {
    return ValueLimit.fixed(
        new Check(
            LimitName.CLASH_ALLOWANCE,
            Side.MIN,
            Dimension.SHARE,
            "travel left between the most compressed load and solid, of the deflection there"),
        CompressionState::clashAllowance,
        share.getAsDouble(),
        Bands.source(share, USUAL.clashAllowance(), CLASH),
        true);
  }

  private void stability(Problem problem) {
    BucklingRule rule = problem.limits().buckling();
    boolean judged =
        rule == BucklingRule.AT_LOAD
            || rule == BucklingRule.AT_SOLID
            || rule == BucklingRule.AT_LOAD_UNLESS_GUIDED && !problem.envelope().guides();
    if (judged) {
      limits.add(
          new BucklingBound(rule == BucklingRule.AT_SOLID, problem.overtravel().isPresent()));
    }
  }

  private void surge(DesignLimits asked) {
    bands.fixed(
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
    if (loads.stream().anyMatch(LoadPoint::fixesForce)) {
      limits.add(NominalLoad.ofCompression(loads, freeLength));
    }
  }
}
