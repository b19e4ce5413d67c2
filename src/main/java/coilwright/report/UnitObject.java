package coilwright.report;

import coilwright.unit.Dimension;
import java.io.IOException;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/**
 * An object whose key names the unit of all its numbers: "range_n": {"min": 1, "max": 2}. The
 * columns of CSV are "range_min_n" and so on.
 *
 * @param stem the key without the unit
 * @param dimension what kind of quantity its numbers are
 * @param numbers the numbers
 * @param part what has them; empty where it does not apply
 * @param <S> what the part belongs to
 * @param <U> the part
 */
record UnitObject<S, U>(
    String stem, Dimension dimension, List<Quantity<U>> numbers, Function<S, Optional<U>> part)
    implements SpringPart<S> {

  @Override
  public void writeTo(Json json, S spring) throws IOException {
    Optional<U> inner = part.apply(spring);
    if (inner.isPresent()) {
      json.object(stem + OutputUnits.suffix(dimension), body -> write(body, inner.get()));
    }
  }

  private void write(Json json, U inner) throws IOException {
    for (Quantity<U> number : numbers) {
      json.number(number.stem(), OutputUnits.plain(dimension, number.of().applyAsDouble(inner)));
    }
  }

  @Override
  public <T> void addTo(Columns<T> columns, Function<T, Optional<S>> spring) {
    columns.addPart(stem + "_", numbers, row -> spring.apply(row).flatMap(part));
  }
}
