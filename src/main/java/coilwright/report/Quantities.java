package coilwright.report;

import coilwright.search.Candidate;
import coilwright.spring.State;
import coilwright.unit.Dimension;
import java.util.List;
import java.util.function.ToDoubleFunction;

/** Makes and finds the numbers that outputs name. */
final class Quantities {

  private Quantities() {}

  /** A number with a dimension. */
  static <T> Quantity<T> of(
      String stem, String label, Dimension dimension, int decimals, ToDoubleFunction<T> value) {
    return new Quantity<>(stem, label, dimension, decimals, value);
  }

  /** A plain number. */
  static <T> Quantity<T> number(
      String stem, String label, int decimals, ToDoubleFunction<T> value) {
    return of(stem, label, Dimension.NUMBER, decimals, value);
  }

  /** One of a list, by the stem of its key. */
  static <T> Quantity<T> in(List<Quantity<T>> all, String stem) {
    for (Quantity<T> quantity : all) {
      if (quantity.stem().equals(stem)) {
        return quantity;
      }
    }
    throw new IllegalArgumentException("no quantity " + stem);
  }

  /** The id under which a candidate is picked: material, series, size, ends, coils. */
  static String id(Candidate<?> candidate) {
    State state = candidate.state();
    String series = state.wire().size().series().map(known -> known.id() + "/").orElse("");
    return state.wire().grade().id()
        + "/"
        + series
        + state.wire().size().label()
        + "/"
        + state.endForm()
        + "/"
        + Numbers.brief(state.coils(), 6);
  }
}
