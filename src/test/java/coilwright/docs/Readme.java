package coilwright.docs;

import coilwright.problem.KeyTable;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;

/** README.md with what it quotes of the program brought up to date: outputs and the key table. */
final class Readme {

  /** Where it is. */
  static final Path PATH = Path.of("README.md");

  /** How a command line of the program begins. */
  static final String COMMAND = "java -jar target/coilwright.jar ";

  /** The fence of every code block begins with it. */
  static final String FENCE = "```";

  private static final String SHOWN = "<!-- shown: ";
  private static final String KEYS = "<!-- keys -->";
  private static final String END_OF_KEYS = "<!-- end of keys -->";
  private static final String END_OF_COMMENT = " -->";

  private final Iterator<String> lines;
  private final List<String> written = new ArrayList<>();
  private String command = "";

  private Readme(String text) {
    this.lines = text.lines().iterator();
  }

  /** The file as it is. */
  static String text() throws IOException {
    return Files.readString(PATH);
  }

  /** The text with every quoted output and the key table written afresh. */
  static String refreshed(String text) {
    Readme readme = new Readme(text);
    while (readme.lines.hasNext()) {
      readme.line(readme.lines.next());
    }
    return String.join("\n", readme.written) + "\n";
  }

  private void line(String line) {
    written.add(line);
    if (line.startsWith(COMMAND)) {
      command = line.substring(COMMAND.length());
    } else if (line.equals(KEYS)) {
      skipTo(END_OF_KEYS);
      written.addAll(KeyTable.markdown().lines().toList());
      written.add(END_OF_KEYS);
    } else if (line.startsWith(SHOWN)) {
      written.add(lines.next());
      skipTo(FENCE);
      String cut = line.substring(SHOWN.length(), line.length() - END_OF_COMMENT.length());
      written.addAll(Cut.of(Printed.byLine(command).out(), cut));
      written.add(FENCE);
    }
  }

  private void skipTo(String end) {
    while (!lines.next().equals(end)) {
      // What stood there is written afresh.
    }
  }

  /** Whether the block that a line opens quotes output, and so must be brought up to date. */
  static boolean opensOutput(String line) {
    return line.equals(FENCE + "text") || line.equals(FENCE + "json");
  }

  /** Whether a line marks the block after it as output of the last command. */
  static boolean marksOutput(String line) {
    return line.startsWith(SHOWN) && line.endsWith(END_OF_COMMENT);
  }
}
