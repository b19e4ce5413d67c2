package coilwright.report;

import java.util.List;

/** Lines of text, each ended by a line feed, and the end that every report has. */
final class Lines {

  private final StringBuilder text = new StringBuilder();

  /** Adds a line. */
  void line(String words) {
    text.append(words).append('\n');
  }

  /** Adds a table, indented. */
  void table(TextTable table) {
    block(table.text("  "));
  }

  /** Adds lines that already end with line feeds. */
  void block(String lines) {
    text.append(lines);
  }

  /** Adds what to take note of, and the cautions. */
  void foot(List<Warning> warnings) {
    if (!warnings.isEmpty()) {
      line("Take note");
      warnings.forEach(warning -> line("  " + warning.text()));
      line("");
    }
    Cautions.LINES.forEach(this::line);
  }

  /** The whole text. */
  String text() {
    return text.toString();
  }
}
