package coilwright.limit;

import coilwright.problem.Band;
import coilwright.problem.LimitName;
import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.spring.State;
import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;

/**
 * Bounds on plain numbers of a spring, whatever its kind: from the file, or as usual.
 *
 * @param <S> the state of the kind of spring
 */
final class Bands<S extends State> {

  static final Citation GIVEN = Citation.seen(Source.PROBLEM_FILE, "limits");
  static final Citation PRACTICE = Citation.seen(Source.COMMON_PRACTICE, "");

  private final List<Limit<S>> limits = new ArrayList<>();

  /** The limits so far. */
  List<Limit<S>> limits() {
    return limits;
  }

  /**
   * Adds both bounds of a band, where they are set.
   *
   * @param name the limit
   * @param band what is asked
   * @param usual what is asked where the file says nothing
   * @param definition which number is meant, in words
   * @param value the number [-]
   */
  void band(LimitName name, Band band, Band usual, String definition, ToDoubleFunction<S> value) {
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

  /**
   * Adds a limit against a fixed bound, where there is one.
   *
   * @param check what the bound asks
   * @param value the number judged, in the dimension's inner unit
   * @param bound the bound, in the same unit, or empty
   * @param source where it comes from
   */
  void fixed(Check check, ToDoubleFunction<S> value, OptionalDouble bound, Citation source) {
    if (bound.isPresent()) {
      boolean straight = check.limit() == LimitName.ACTIVE_COILS;
      limits.add(ValueLimit.fixed(check, value, bound.getAsDouble(), source, straight));
    }
  }

  /** Where a bound comes from: the file, unless it is the usual one. */
  static Citation source(OptionalDouble bound, OptionalDouble usual, Citation usualSource) {
    return bound.equals(usual) ? usualSource : GIVEN;
  }
}
