package coilwright.problem;

import coilwright.spring.Kind;
import java.util.Optional;

/** Reads text as it stands. */
final class TextReader extends ScalarReader<String> {

  private final String accepted;

  /**
   * A reader of text.
   *
   * @param accepted what the text is, in words
   */
  TextReader(String accepted) {
    this.accepted = accepted;
  }

  @Override
  Optional<String> parse(String text, Spot spot) {
    return Optional.of(text);
  }

  @Override
  public String accepted() {
    return accepted;
  }

  @Override
  public Form form(Kind kind) {
    return new Form.Text("");
  }
}
