package coilwright.report;

import coilwright.unit.Dimension;
import java.util.function.ToDoubleFunction;

/**
 * A number of a spring as every output names it.
 *
 * @param stem the key without its unit
 * @param label the words in text
 * @param dimension what kind of quantity it is
 * @param decimals how many decimals text shows in metric units
 * @param of the number, in the dimension's inner unit; NaN where it does not apply
 * @param <T> what has the number
 */
record Quantity<T>(
    String stem, String label, Dimension dimension, int decimals, ToDoubleFunction<T> of) {

  /** The JSON key. */
  String key() {
    return stem + OutputUnits.suffix(dimension);
  }

  /** The value as JSON writes it. */
  double plain(T subject) {
    return OutputUnits.plain(dimension, of.applyAsDouble(subject));
  }

  /** The value as text writes it, without its unit. */
  String text(T subject, OutputUnits units) {
    return Numbers.fixed(units.convert(dimension, of.applyAsDouble(subject)), decimals);
  }
}
