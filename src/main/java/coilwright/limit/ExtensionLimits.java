package coilwright.limit;

import coilwright.problem.DesignLimits;
import coilwright.problem.ExtensionAsked;
import coilwright.problem.LimitName;
import coilwright.problem.Problem;
import coilwright.problem.StressLimit;
import coilwright.spring.ExtensionState;
import coilwright.spring.LoadPoint;
import coilwright.spring.Surge;
import coilwright.unit.Dimension;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;

/** The limits that a problem sets for extension springs, in the order of their names. */
public final class ExtensionLimits {

  /** Far more body coils than any extension spring in trade has [-]. */
  private static final double MOST_COILS = 500;

  private static final DesignLimits USUAL = DesignLimits.DEFAULTS;

  private final Problem problem;
  private final ExtensionAsked asked;
  private final Bands<ExtensionState> bands = new Bands<>();
  private final List<Limit<ExtensionState>> limits = bands.limits();

  private ExtensionLimits(Problem problem) {
    this.problem = problem;
    this.asked = problem.extension().orElseThrow();
  }

  /**
   * Every limit that applies.
   *
   * @param problem a problem of an extension spring
   * @param loads the loads of one spring, as its states report them
   * @return the limits; bounds the file switches off are left out
   */
  public static List<Limit<ExtensionState>> of(Problem problem, List<LoadPoint> loads) {
    String covered = problem.coating() > 0 ? ", coating included" : "";
    ExtensionLimits all = new ExtensionLimits(problem);
    all.proportions(problem.limits(), endless(problem));
    all.limits.addAll(ExtensionSpace.ofBody(problem.envelope(), covered));
    all.surge(problem.limits());
    all.tension();
    all.stress(ExtensionPlace.BODY, all.asked.stressInBody());
    all.stress(ExtensionPlace.HOOK_BENDING, all.asked.hookBending());
    all.stress(ExtensionPlace.HOOK_TORSION, all.asked.hookTorsion());
    all.limits.addAll(
        ExtensionSpace.ofHooks(
            all.asked, problem.envelope(), covered, problem.overtravel().isPresent()));
    if (loads.stream().anyMatch(load -> load.force().isPresent())) {
      all.limits.add(NominalLoad.ofExtension(loads, all.otherFacts(loads)));
    }
    return List.copyOf(all.limits);
  }

  /** Whether nothing ends the coils of a search: lengths are open, and no bound is set. */
  private static boolean endless(Problem problem) {
    ExtensionAsked asked = problem.extension().orElseThrow();
    boolean open = asked.line().filter(line -> line.zeroForceLength().isEmpty()).isPresent();
    return open
        && problem.design().isEmpty()
        && problem.limits().activeCoils().max().isEmpty()
        && problem.envelope().maxFreeLength().isEmpty()
        && asked.maxExtendedLength().isEmpty();
  }

  private void proportions(DesignLimits usual, boolean endless) {
    bands.band(
        LimitName.SPRING_INDEX,
        usual.springIndex(),
        USUAL.springIndex(),
        "mean diameter over wire diameter",
        state -> state.spring().springIndex());
    bands.band(
        LimitName.ACTIVE_COILS,
        usual.activeCoils(),
        USUAL.activeCoils(),
        "coils of the body",
        ExtensionState::coils);
    if (endless) {
      bands.fixed(
          new Check(
              LimitName.ACTIVE_COILS,
              Side.MAX,
              Dimension.NUMBER,
              "coils of the body; neither their number nor a length is limited"),
          ExtensionState::coils,
          OptionalDouble.of(MOST_COILS),
          Bands.PRACTICE);
    }
  }

  private void surge(DesignLimits usual) {
    bands.fixed(
        new Check(
            LimitName.SURGE_FREQUENCY,
            Side.MIN,
            Dimension.FREQUENCY,
            "first mode of the active coils, both ends held"),
        state -> state.spring().surgeFrequency(),
        usual.minSurgeFrequency(),
        Surge.CITATION);
  }

  private void tension() {
    limits.add(new TensionBound(TensionBound.End.NOT_NEGATIVE));
    if (asked.preferredTension()) {
      limits.add(new TensionBound(TensionBound.End.LEAST_PREFERRED));
      limits.add(new TensionBound(TensionBound.End.GREATEST_PREFERRED));
    }
  }

  private void stress(ExtensionPlace place, StressLimit limit) {
    if (limit.judged()) {
      limits.add(
          new ExtensionStress(
              place,
              limit,
              problem.limits().method(),
              problem.limits().stressCorrection(),
              problem.overtravel().isPresent()));
    }
  }

  /**
   * What a spring may miss beside its loads. A single load does not tell the rate, nor do loads
   * whose lengths are left open: then the rate asked counts over the way to the greatest load.
   */
  private ToDoubleFunction<ExtensionState> otherFacts(List<LoadPoint> loads) {
    boolean told = loads.size() > 1 && loads.get(0).length().isPresent();
    if (told || asked.line().isEmpty()) {
      return state -> 0;
    }
    double rate = asked.line().get().rate();
    double least = loads.size() > 1 ? least(loads) : Double.NaN;
    return state -> {
      double from = loads.size() > 1 ? least : state.initialTension();
      return Math.abs(state.rate() / rate - 1) * (state.greatestForce() - from);
    };
  }

  private static double least(List<LoadPoint> loads) {
    return loads.stream().mapToDouble(load -> load.force().orElse(0)).min().orElse(0);
  }
}
