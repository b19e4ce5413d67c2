package coilwright.problem;

import coilwright.spring.Kind;
import coilwright.unit.Dimension;
import coilwright.unit.Parsed;
import coilwright.unit.Quantity;
import coilwright.unit.QuantityParser;
import java.util.List;
import java.util.Optional;

/** Reads quantities: a number with its unit. */
final class QuantityReader extends ScalarReader<Quantity> {

  private final Range range;
  private final String outside;
  private final List<Dimension> dimensions;

  /**
   * A reader of quantities of one of several kinds.
   *
   * @param range what makes sense, in inner units
   * @param dimensions the kinds accepted
   */
  QuantityReader(Range range, Dimension... dimensions) {
    this(range, "", dimensions);
  }

  /**
   * A reader of quantities of one of several kinds.
   *
   * @param range what makes sense, in inner units
   * @param outside what a message says of a quantity outside the range, after a comma; may be empty
   * @param dimensions the kinds accepted
   */
  QuantityReader(Range range, String outside, Dimension... dimensions) {
    this.range = range;
    this.outside = outside;
    this.dimensions = List.of(dimensions);
  }

  @Override
  Optional<Quantity> parse(String text, Spot spot) {
    Parsed<Quantity> parsed = QuantityParser.parse(text, dimensions);
    if (parsed.value().isEmpty()) {
      return refuse(text, parsed.why(), parsed.nearest(), spot);
    }
    Quantity quantity = parsed.value().get();
    Optional<String> remedy = range.refuses(quantity.inner(), Optional.of(quantity.unit()));
    String found = ShownText.of(text) + (outside.isEmpty() ? "" : ", " + outside);
    remedy.ifPresent(words -> spot.fault(found, words));
    return remedy.isPresent() ? Optional.empty() : parsed.value();
  }

  @Override
  public String accepted() {
    return QuantityParser.accepted(dimensions);
  }

  @Override
  public Form form(Kind kind) {
    return new Form.Measure(range, QuantityParser.symbols(dimensions));
  }
}
