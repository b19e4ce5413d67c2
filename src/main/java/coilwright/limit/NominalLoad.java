package coilwright.limit;

import coilwright.problem.LimitName;
import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.spring.CompressionState;
import coilwright.spring.ExtensionState;
import coilwright.spring.LoadPoint;
import coilwright.spring.State;
import coilwright.unit.Dimension;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;

/**
 * The loads of a spring as it is set against the loads asked: what rounding may cost.
 *
 * @param <S> the state of the kind of spring
 */
final class NominalLoad<S extends State> implements Limit<S> {

  /** What a spring bears at one of its loads. */
  private interface Forces<S> {
    double[] of(S state);
  }

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
  private final Forces<S> forces;
  private final ToDoubleFunction<S> other;
  private final double bound;

  private NominalLoad(List<LoadPoint> asked, Forces<S> forces, ToDoubleFunction<S> other) {
    this.asked = List.copyOf(asked);
    this.forces = forces;
    this.other = other;
    this.bound = SHARE * asked.stream().mapToDouble(load -> load.force().orElse(0)).max().orElse(0);
  }

  /**
   * The loads asked of a compression spring.
   *
   * @param asked the loads in the order a state reports them
   * @param freeLength the length at which no force is asked [mm], where that is a fact of its own
   */
  static NominalLoad<CompressionState> ofCompression(
      List<LoadPoint> asked, OptionalDouble freeLength) {
    return new NominalLoad<>(
        asked,
        state -> state.loads().stream().mapToDouble(load -> load.force()).toArray(),
        state -> unloaded(state, freeLength));
  }

  /** What the spring's line gives at the free length asked, pulling where it is shorter [N]. */
  private static double unloaded(CompressionState state, OptionalDouble freeLength) {
    double own = state.spring().freeLength();
    return Math.abs(state.rate() * (own - freeLength.orElse(own)));
  }

  /**
   * The loads asked of an extension spring.
   *
   * @param asked the loads in the order a state reports them
   * @param other what a spring may miss of another fact that is asked [N]
   */
  static NominalLoad<ExtensionState> ofExtension(
      List<LoadPoint> asked, ToDoubleFunction<ExtensionState> other) {
    return new NominalLoad<>(asked, ExtensionState::forces, other);
  }

  @Override
  public Check check() {
    return CHECK;
  }

  @Override
  public Finding judge(S state) {
    double worst = other.applyAsDouble(state);
    double[] own = forces.of(state);
    for (int i = 0; i < own.length; i++) {
      worst = Math.max(worst, Math.abs(own[i] - asked.get(i).force().orElse(own[i])));
    }
    return Finding.of(CHECK, worst, bound, SOURCE);
  }

  @Override
  public boolean onlyAfterRounding() {
    return true;
  }
}
