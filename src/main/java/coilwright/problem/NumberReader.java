package coilwright.problem;

import coilwright.spring.Kind;
import coilwright.unit.DecimalNumber;
import coilwright.unit.Parsed;
import java.util.Optional;

/** Reads plain numbers, without a unit. */
final class NumberReader extends ScalarReader<Double> {

  private final Range range;
  private final boolean whole;

  /**
   * A reader of plain numbers.
   *
   * @param range what makes sense
   * @param whole whether only whole numbers are accepted
   */
  NumberReader(Range range, boolean whole) {
    this.range = range;
    this.whole = whole;
  }

  @Override
  Optional<Double> parse(String text, Spot spot) {
    Parsed<Double> parsed = DecimalNumber.parse(text);
    if (parsed.value().isEmpty()
        || whole && Math.rint(parsed.value().get()) != parsed.value().get()) {
      return refuse(text, parsed.why(), Optional.empty(), spot);
    }
    Optional<String> remedy = range.refuses(parsed.value().get(), Optional.empty());
    remedy.ifPresent(words -> spot.fault(ShownText.of(text), words));
    return remedy.isPresent() ? Optional.empty() : parsed.value();
  }

  @Override
  public String accepted() {
    return whole ? "a whole number" : "a plain number";
  }

  @Override
  public Form form(Kind kind) {
    return new Form.Number(range, whole);
  }
}
