package coilwright.material;

import java.util.ArrayList;
import java.util.List;

/**
 * Splits one line of a catalogue file into cells: commas between them, double quotes around a cell
 * that holds a comma, a quote inside doubled. A cell does not run over the end of its line.
 *
 * <p>A reader of our own, since the CSV parser at hand does not load without data binding, which
 * the program leaves out.
 */
final class CsvLine {

  private final String line;
  private int at;

  private CsvLine(String line) {
    this.line = line;
  }

  /**
   * The cells of a line.
   *
   * @param line the line, without its end
   * @return its cells, unquoted; one more than there are commas between them
   * @throws IllegalArgumentException if a quote is not closed or stands inside an unquoted cell
   */
  static List<String> cells(String line) {
    CsvLine rest = new CsvLine(line);
    List<String> cells = new ArrayList<>();
    cells.add(rest.cell());
    while (rest.at < line.length()) {
      rest.at++;
      cells.add(rest.cell());
    }
    return cells;
  }

  /** Reads to the next comma between cells or to the end, and stays there. */
  private String cell() {
    String cell = line.startsWith("\"", at) ? quoted() : plain();
    if (at < line.length() && line.charAt(at) != ',') {
      throw new IllegalArgumentException("after a closing quote only a comma may follow");
    }
    return cell;
  }

  private String plain() {
    int comma = line.indexOf(',', at);
    int end = comma < 0 ? line.length() : comma;
    String cell = line.substring(at, end);
    if (cell.contains("\"")) {
      throw new IllegalArgumentException("a quote stands inside an unquoted cell");
    }
    at = end;
    return cell;
  }

  private String quoted() {
    StringBuilder cell = new StringBuilder();
    int from = at + 1;
    while (true) {
      int quote = line.indexOf('"', from);
      if (quote < 0) {
        throw new IllegalArgumentException("a quote is not closed");
      }
      cell.append(line, from, quote);
      if (!line.startsWith("\"", quote + 1)) {
        at = quote + 1;
        return cell.toString();
      }
      cell.append('"');
      from = quote + 2;
    }
  }
}
