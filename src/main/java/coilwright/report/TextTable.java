package coilwright.report;

import java.util.ArrayList;
import java.util.List;

/** Rows of text in aligned columns, two spaces apart; numbers to the right, words to the left. */
final class TextTable {

  private final List<String[]> rows = new ArrayList<>();
  private final boolean[] right;

  /**
   * Begins a table.
   *
   * @param alignment one letter a column: l for left, r for right
   */
  TextTable(String alignment) {
    right = new boolean[alignment.length()];
    for (int i = 0; i < right.length; i++) {
      right[i] = alignment.charAt(i) == 'r';
    }
  }

  /** Adds a row, one text a column. */
  TextTable row(String... cells) {
    rows.add(cells.clone());
    return this;
  }

  /** Adds a line of words across the columns. */
  TextTable words(String words) {
    rows.add(new String[] {words});
    return this;
  }

  /** The rows as lines, each begun by an indent and ended by a line feed. */
  String text(String indent) {
    int[] widths = widths();
    StringBuilder text = new StringBuilder();
    for (String[] row : rows) {
      StringBuilder line = new StringBuilder(indent);
      if (acrossColumns(row)) {
        line.append(row[0]);
      }
      for (int i = 0; i < row.length && !acrossColumns(row); i++) {
        line.append(i == 0 ? "" : "  ").append(cell(row[i], widths[i], right[i]));
      }
      text.append(line.toString().stripTrailing()).append('\n');
    }
    return text.toString();
  }

  private int[] widths() {
    int[] widths = new int[right.length];
    for (String[] row : rows) {
      for (int i = 0; i < row.length && !acrossColumns(row); i++) {
        widths[i] = Math.max(widths[i], row[i].length());
      }
    }
    return widths;
  }

  private boolean acrossColumns(String[] row) {
    return row.length < right.length;
  }

  private static String cell(String text, int width, boolean right) {
    String space = " ".repeat(width - text.length());
    return right ? space + text : text + space;
  }
}
