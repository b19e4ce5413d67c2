package coilwright.limit;

import coilwright.problem.LimitName;
import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.spring.CompressionState;
import coilwright.spring.LoadPoint;
import coilwright.spring.LoadState;
import coilwright.unit.Dimension;
import java.util.List;
import java.util.OptionalDouble;

/** The loads of a spring as it is set against the loads asked: what rounding may cost. */
final class NominalLoad implements Limit<CompressionState> {

  private static final double SHARE = 0.01;
  private static final Check CHECK =
      new Check(
          LimitName.NOMINAL_LOAD,
          Side.MAX,
          Dimension.FORCE,
          "greatest difference from a load asked, against 1 % of the greatest load");
  private static final Citation SOURCE =
      Citation.seen(Source.COMMON_PRACTICE, "a drawing rounds within 1 %");

  private final List<LoadPoint> asked;
  private final OptionalDouble freeLength;
  private final double bound;

  /**
   * The loads asked.
   *
   * @param asked the loads in the order a state reports them
   * @param freeLength the length at which no force is asked [mm], where that is a fact of its own
   */
  NominalLoad(List<LoadPoint> asked, OptionalDouble freeLength) {
    this.freeLength = freeLength;
    this.asked = List.copyOf(asked);
    this.bound = SHARE * asked.stream().mapToDouble(load -> load.force().orElse(0)).max().orElse(0);
  }

  @Override
  public Check check() {
    return CHECK;
  }

  @Override
  public Finding judge(CompressionState state) {
    double worst = unloaded(state);
    List<LoadState> loads = state.loads();
    for (int i = 0; i < asked.size(); i++) {
      double force = loads.get(i).force();
      worst = Math.max(worst, Math.abs(force - asked.get(i).force().orElse(force)));
    }
    return Finding.of(CHECK, worst, bound, SOURCE);
  }

  @Override
  public boolean onlyAfterRounding() {
    return true;
  }

  /** What the spring's line gives at the free length asked, pulling where it is shorter [N]. */
  private double unloaded(CompressionState state) {
    double own = state.spring().freeLength();
    return Math.abs(state.rate() * (own - freeLength.orElse(own)));
  }
}
