package coilwright.report;

import coilwright.unit.Dimension;
import java.io.IOException;
import java.util.function.ToDoubleFunction;

/**
 * A number of a spring as every output names it.
 *
 * @param stem the key without its unit
 * @param label the words in text
 * @param dimension what kind of quantity it is
 * @param decimals how many decimals text shows in metric units
 * @param of the number, in the dimension's inner unit; NaN or infinite where it does not apply
 * @param <T> what has the number
 */
record Quantity<T>(
    String stem, String label, Dimension dimension, int decimals, ToDoubleFunction<T> of)
    implements Field<T> {

  @Override
  public String key(OutputUnits units) {
    return stem + units.keySuffix(dimension);
  }

  @Override
  public void writeTo(Json json, T subject) throws IOException {
    json.number(
        key(OutputUnits.METRIC), OutputUnits.METRIC.data(dimension, of.applyAsDouble(subject)));
  }

  @Override
  public String cell(T subject, OutputUnits units) {
    return Csv.number(units.data(dimension, of.applyAsDouble(subject)));
  }

  /** The value as text writes it, without its unit. */
  String text(T subject, OutputUnits units) {
    return units.fixed(dimension, of.applyAsDouble(subject), decimals);
  }

  /** Adds a row of label, number and unit. */
  void addTo(TextTable table, T subject, OutputUnits units) {
    table.row(label, text(subject, units), units.symbol(dimension));
  }
}
