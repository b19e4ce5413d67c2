package coilwright.report;

import java.io.IOException;

/**
 * A number that may be infinite: JSON says null then, where any other number that does not apply is
 * left out.
 *
 * @param quantity the number
 * @param <T> what has the number
 */
record Boundless<T>(Quantity<T> quantity) implements Field<T> {

  @Override
  public String key(OutputUnits units) {
    return quantity.key(units);
  }

  @Override
  public void writeTo(Json json, T subject) throws IOException {
    if (Double.isInfinite(quantity.of().applyAsDouble(subject))) {
      json.nothing(key(OutputUnits.METRIC));
    } else {
      quantity.writeTo(json, subject);
    }
  }

  @Override
  public String cell(T subject, OutputUnits units) {
    return quantity.cell(subject, units);
  }
}
