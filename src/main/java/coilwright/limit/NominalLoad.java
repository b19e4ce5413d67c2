package coilwright.limit;

import coilwright.problem.LimitName;
import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.spring.CompressionState;
import coilwright.spring.LoadPoint;
import coilwright.unit.Dimension;
import java.util.List;

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
  private final double bound;

  NominalLoad(List<LoadPoint> asked) {
    this.asked = List.copyOf(asked);
    this.bound = SHARE * asked.stream().mapToDouble(load -> load.force().orElse(0)).max().orElse(0);
  }

  @Override
  public LimitName name() {
    return LimitName.NOMINAL_LOAD;
  }

  @Override
  public Finding judge(CompressionState state) {
    double worst = 0;
    for (int i = 0; i < asked.size(); i++) {
      double force = state.loads().get(i).force();
      worst = Math.max(worst, Math.abs(force - asked.get(i).force().orElse(force)));
    }
    return Finding.of(CHECK, worst, bound, SOURCE);
  }

  @Override
  public boolean onlyAfterRounding() {
    return true;
  }
}
