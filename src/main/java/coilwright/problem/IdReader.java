package coilwright.problem;

import coilwright.spring.Kind;
import java.util.Optional;
import java.util.regex.Pattern;

/** Reads the id of an own grade: it becomes part of the ids of springs, between slashes. */
final class IdReader extends ScalarReader<String> {

  private static final Pattern ID = Pattern.compile("[^\\s/,\\p{Cntrl}]+");

  @Override
  Optional<String> parse(String text, Spot spot) {
    boolean reserved = text.equals(MaterialIds.ALL) || text.equals(SwitchReader.NONE);
    return ID.matcher(text).matches() && !reserved
        ? Optional.of(text)
        : refuse(text, "", Optional.empty(), spot);
  }

  @Override
  public String accepted() {
    return "a word without blanks, slashes and commas, not all or none";
  }

  @Override
  public Form form(Kind kind) {
    return new Form.Text("^(?!(?:all|none)$)[^\\u0000-\\u0020\\u007f/,]+$");
  }
}
