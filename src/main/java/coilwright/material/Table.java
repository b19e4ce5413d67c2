package coilwright.material;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/**
 * A catalogue file: comment lines that cite its source, one line of column names, then the rows of
 * one published table in the publication's own units and order.
 *
 * @param header the comment lines
 * @param rows the rows, each with a source and its evidence
 */
record Table(TableHeader header, List<TableRow> rows) {

  /**
   * Refuses a table without rows, without a line on its units or its rule, and one in which a row
   * has no source or no evidence.
   */
  Table {
    header.entry("units");
    header.entry("rule");
    rows = List.copyOf(rows);
    if (rows.isEmpty()) {
      throw TableFault.at(header.file(), header.lines() + 1, "the file has no rows");
    }
    rows.forEach(TableRow::citation);
  }

  /**
   * Reads a file.
   *
   * @param file its name, for messages
   * @param text its contents
   * @return the table
   * @throws IllegalStateException naming file, line and column if it is not a table
   */
  static Table of(String file, String text) {
    TableHeader header = TableHeader.of(file, text);
    List<String> lines = text.lines().toList();
    int first = header.lines();
    if (first >= lines.size()) {
      throw TableFault.at(file, first + 1, "the file has no line of column names");
    }
    List<String> columns = distinct(header, cells(header, first + 1, lines.get(first)));
    List<TableRow> rows = new ArrayList<>();
    for (int i = first + 1; i < lines.size(); i++) {
      List<String> cells = cells(header, i + 1, lines.get(i));
      rows.add(row(header, i + 1, columns, cells));
    }
    return new Table(header, rows);
  }

  /** The file's name. */
  String file() {
    return header.file();
  }

  /**
   * The rows that hold a word in a column.
   *
   * @param column the column
   * @param word the word
   * @return those rows, in order
   * @throws IllegalStateException if there are none
   */
  List<TableRow> rowsOf(String column, String word) {
    List<TableRow> found = new ArrayList<>();
    for (TableRow row : rows) {
      if (row.text(column).equals(word)) {
        found.add(row);
      }
    }
    if (found.isEmpty()) {
      TableRow last = rows.get(rows.size() - 1);
      throw last.fault(column, "the file ends here without a row for \"" + word + "\"");
    }
    return found;
  }

  private static List<String> cells(TableHeader header, int line, String text) {
    try {
      return CsvLine.cells(text);
    } catch (IllegalArgumentException e) {
      throw TableFault.at(header.file(), line, e.getMessage());
    }
  }

  private static TableRow row(
      TableHeader header, int line, List<String> columns, List<String> cells) {
    if (cells.size() != columns.size()) {
      String column = columns.get(Math.min(cells.size(), columns.size()) - 1);
      String counts = "found " + cells.size() + " cells, accepted: " + columns.size();
      throw TableFault.at(header.file(), line, column, "the last to match; " + counts);
    }
    return new TableRow(header, line, columns, cells);
  }

  private static List<String> distinct(TableHeader header, List<String> columns) {
    Set<String> seen = new HashSet<>();
    for (String column : columns) {
      if (column.isEmpty() || !seen.add(column)) {
        throw TableFault.at(
            header.file(), header.lines() + 1, column, "a column needs a name of its own");
      }
    }
    return columns;
  }
}
