package coilwright.limit;

import coilwright.source.Citation;
import coilwright.spring.Family;
import coilwright.spring.State;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;

/**
 * A limit that holds one number of a spring against one bound, whose margin turns at known counts
 * or not at all.
 *
 * @param check what the bound asks
 * @param value the number judged, in the dimension's inner unit
 * @param bound the bound, in the same unit
 * @param source where bound or law comes from
 * @param straight whether the margin goes with the coil count in a straight line
 * @param turnsOf coil counts where the margin may turn
 * @param <S> the state of the kind of spring it judges
 */
record ValueLimit<S extends State>(
    Check check,
    ToDoubleFunction<S> value,
    ToDoubleFunction<S> bound,
    Citation source,
    boolean straight,
    Function<Family<S>, double[]> turnsOf)
    implements Limit<S> {

  /** A limit whose margin never turns. */
  ValueLimit(
      Check check,
      ToDoubleFunction<S> value,
      ToDoubleFunction<S> bound,
      Citation source,
      boolean straight) {
    this(check, value, bound, source, straight, family -> new double[0]);
  }

  /** A limit whose bound is the same for every spring and whose margin never turns. */
  static <S extends State> ValueLimit<S> fixed(
      Check check, ToDoubleFunction<S> value, double bound, Citation source, boolean straight) {
    return new ValueLimit<>(check, value, state -> bound, source, straight);
  }

  @Override
  public Finding judge(S state) {
    return Finding.of(check, value.applyAsDouble(state), bound.applyAsDouble(state), source);
  }

  @Override
  public double[] turns(Family<S> family) {
    return turnsOf.apply(family);
  }
}
