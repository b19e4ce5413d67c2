package coilwright.problem;

import coilwright.material.WireSize;
import coilwright.spring.Kind;
import coilwright.unit.Dimension;
import java.util.Optional;

/** Reads a wire diameter and keeps how it is written. */
final class WireSizeReader extends ScalarReader<WireSize> {

  private final QuantityReader length = new QuantityReader(Range.ABOVE_ZERO, Dimension.LENGTH);

  @Override
  Optional<WireSize> parse(String text, Spot spot) {
    return length
        .parse(text, spot)
        .map(quantity -> WireSize.explicit(ShownText.of(text), quantity.inner()));
  }

  @Override
  public String accepted() {
    return length.accepted();
  }

  @Override
  public Form form(Kind kind) {
    return length.form(kind);
  }
}
