package coilwright.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** CSV read back by the grammar of RFC 4180, with LF line ends: apart from what writes it. */
record CsvRows(List<String> header, List<Map<String, String>> rows) {

  /** Reads a table; every line must have as many cells as the first. */
  static CsvRows of(String text) {
    List<List<String>> lines = lines(text);
    List<String> header = lines.get(0);
    assertThat(header).isNotEmpty().doesNotHaveDuplicates().doesNotContain("");
    List<Map<String, String>> rows = new ArrayList<>();
    for (List<String> line : lines.subList(1, lines.size())) {
      assertThat(line).hasSameSizeAs(header);
      Map<String, String> row = new LinkedHashMap<>();
      for (int i = 0; i < header.size(); i++) {
        row.put(header.get(i), line.get(i));
      }
      rows.add(row);
    }
    return new CsvRows(header, rows);
  }

  static List<List<String>> lines(String text) {
    List<List<String>> lines = new ArrayList<>();
    int at = 0;
    while (at < text.length()) {
      List<String> line = new ArrayList<>();
      do {
        StringBuilder cell = new StringBuilder();
        at = text.charAt(at) == '"' ? escaped(text, at + 1, cell) : plain(text, at, cell);
        line.add(cell.toString());
      } while (text.charAt(at++) == ',');
      assertThat(text.charAt(at - 1)).isEqualTo('\n');
      lines.add(line);
    }
    return lines;
  }

  private static int plain(String text, int from, StringBuilder cell) {
    int at = from;
    while (text.charAt(at) != ',' && text.charAt(at) != '\n') {
      assertThat(text.charAt(at)).isNotIn('"', '\r');
      cell.append(text.charAt(at++));
    }
    return at;
  }

  private static int escaped(String text, int from, StringBuilder cell) {
    int at = from;
    while (text.charAt(at) != '"' || text.charAt(at + 1) == '"') {
      at += text.charAt(at) == '"' ? 1 : 0;
      cell.append(text.charAt(at++));
    }
    return at + 1;
  }
}
