package coilwright.material;

import coilwright.source.Citation;
import coilwright.source.Evidence;
import coilwright.source.Source;
import coilwright.unit.Dimension;
import coilwright.unit.Unit;
import java.util.Arrays;
import java.util.List;
import java.util.function.Function;

/**
 * One row of a catalogue file. Every reader of a cell throws {@link IllegalStateException}, naming
 * file, line and column, if the cell does not hold what is asked for.
 *
 * @param header the header of its file
 * @param line its line in the file, from 1
 * @param columns the names of the columns
 * @param cells one for each column
 */
record TableRow(TableHeader header, int line, List<String> columns, List<String> cells) {

  /** Keeps its own copies. */
  TableRow {
    columns = List.copyOf(columns);
    cells = List.copyOf(cells);
  }

  /** Whether the file has a column. */
  boolean has(String column) {
    return columns.contains(column);
  }

  /** The text of a cell, which must not be empty. */
  String text(String column) {
    int index = columns.indexOf(column);
    if (index < 0) {
      throw fault(column, "the file has no such column");
    }
    if (cells.get(index).isEmpty()) {
      throw fault(column, "the cell is empty");
    }
    return cells.get(index);
  }

  /** A positive decimal number without sign or exponent. */
  double number(String column) {
    String text = text(column);
    double value = decimal(text);
    if (value > 0 && value < Double.POSITIVE_INFINITY) {
      return value;
    }
    throw fault(column, "found \"" + text + "\", accepted: a positive decimal number");
  }

  /** A positive quantity in the unit that the header names for the column, made inner [inner]. */
  double quantity(String column, Dimension dimension) {
    return unit(column, header.unitOf(column), dimension).toInner(number(column));
  }

  /**
   * A unit of a dimension.
   *
   * @param column the column that a message is to name
   * @param symbol the unit's symbol
   * @param dimension what it must be a unit of
   * @return the unit
   */
  Unit unit(String column, String symbol, Dimension dimension) {
    return dimension
        .unit(symbol)
        .orElseThrow(
            () -> fault(column, "found unit \"" + symbol + "\" for " + dimension.phrase()));
  }

  /**
   * One of a list of values, by the word for it.
   *
   * @param column the column
   * @param values what is accepted
   * @param word the word for each
   * @return the value whose word stands in the cell
   */
  <T> T oneOf(String column, T[] values, Function<T, String> word) {
    return match(column, text(column), values, word);
  }

  /** Seen or memory: every row says which. */
  Evidence evidence() {
    return oneOf("evidence", Evidence.values(), Evidence::word);
  }

  /** Where the row comes from: its own source and locator where it has them, else the file's. */
  Citation citation() {
    String title = has("source") ? text("source") : header.entry("source");
    Source source = match("source", title, Source.values(), Source::shortTitle);
    String locator = has("locator") ? text("locator") : header.entry("locator");
    return new Citation(source, locator, evidence());
  }

  /** The citation in one line and, for a row seen elsewhere, on what page; reports print it. */
  String place() {
    Citation citation = citation();
    String page = header.entries().get("seen");
    boolean elsewhere = citation.evidence() == Evidence.SEEN && page != null;
    return elsewhere ? citation.place() + ", seen " + page : citation.place();
  }

  /** The exception for a cell of this row. */
  IllegalStateException fault(String column, String why) {
    return TableFault.at(header.file(), line, column, why);
  }

  private <T> T match(String column, String text, T[] values, Function<T, String> word) {
    for (T value : values) {
      if (word.apply(value).equals(text)) {
        return value;
      }
    }
    List<String> accepted = Arrays.stream(values).map(word).toList();
    throw fault(column, "found \"" + text + "\", accepted: " + String.join(" | ", accepted));
  }

  /** A decimal number without sign or exponent, or NaN where the text is none. */
  static double decimal(String text) {
    return isDecimal(text) ? Double.parseDouble(text) : Double.NaN;
  }

  private static boolean isDecimal(String text) {
    int digits = 0;
    for (int i = 0; i < text.length(); i++) {
      char sign = text.charAt(i);
      boolean digit = sign >= '0' && sign <= '9';
      if (!digit && (sign != '.' || i != text.indexOf('.'))) {
        return false;
      }
      digits += digit ? 1 : 0;
    }
    return digits > 0;
  }
}
