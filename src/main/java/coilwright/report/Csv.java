package coilwright.report;

import com.fasterxml.jackson.core.io.NumberOutput;
import java.util.List;

/** Lines of CSV after RFC 4180, with commas, ended by line feeds. */
final class Csv {

  /** What a spreadsheet would take for the beginning of a formula. */
  private static final String FORMULA = "=+-@\t";

  private final StringBuilder text = new StringBuilder();

  /** Adds a line. */
  void line(List<String> cells) {
    for (int i = 0; i < cells.size(); i++) {
      text.append(i == 0 ? "" : ",").append(quoted(cells.get(i)));
    }
    text.append('\n');
  }

  /** The lines so far. */
  String text() {
    return text.toString();
  }

  /** A number in full, with the digits that JSON has; empty where it is not finite. */
  static String number(double value) {
    return Double.isFinite(value) ? NumberOutput.toString(value, true) : "";
  }

  /**
   * What a user typed, so that a spreadsheet takes it for text: an apostrophe before what would
   * begin a formula. A control character becomes a space; what begins with blanks and then a
   * formula counts as one, for some programs drop the blanks.
   */
  static String typed(String word) {
    StringBuilder plain = new StringBuilder(word.length() + 1);
    for (int i = 0; i < word.length(); i++) {
      plain.append(Character.isISOControl(word.charAt(i)) ? ' ' : word.charAt(i));
    }
    String first = plain.toString().stripLeading();
    boolean formula =
        word.startsWith("\t") || !first.isEmpty() && FORMULA.indexOf(first.charAt(0)) >= 0;
    return (formula ? "'" : "") + plain;
  }

  private static String quoted(String cell) {
    boolean plain = true;
    for (int i = 0; i < cell.length(); i++) {
      char sign = cell.charAt(i);
      plain &= sign != ',' && sign != '"' && sign != '\n' && sign != '\r';
    }
    return plain ? cell : '"' + cell.replace("\"", "\"\"") + '"';
  }
}
