package coilwright.problem;

import coilwright.spring.Kind;
import coilwright.unit.Dimension;
import coilwright.unit.Quantity;
import coilwright.unit.Words;
import java.util.List;
import java.util.Optional;

/** Reads how far hooks reach beyond the body: a word or a length. */
final class HookLengthReader extends ScalarReader<HookLength> {

  private static final String NATURAL = "natural";
  private static final String FREE = "free";

  private final QuantityReader length = new QuantityReader(Range.ABOVE_ZERO, Dimension.LENGTH);
  private final List<String> words;

  /**
   * A reader of hook lengths.
   *
   * @param chosen whether the length may be left to the search
   */
  HookLengthReader(boolean chosen) {
    this.words = chosen ? List.of(NATURAL, FREE) : List.of(NATURAL);
  }

  @Override
  Optional<HookLength> parse(String text, Spot spot) {
    if (words.contains(text)) {
      return Optional.of(text.equals(FREE) ? HookLength.free() : HookLength.natural());
    }
    if (Character.isLetter(text.codePointAt(0))) {
      return refuse(text, "", spot.nearest(text, words), spot);
    }
    return length
        .parse(text, spot.or(Words.either(words)))
        .map(Quantity::inner)
        .map(HookLength::of);
  }

  @Override
  public String accepted() {
    return length.accepted() + ", or " + Words.either(words);
  }

  @Override
  public Form form(Kind kind) {
    return new Form.Either(List.of(new Form.Word(words), length.form(kind)));
  }
}
