package coilwright.docs;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Which lines of an output README.md shows: "all", or parts such as "3 from Nearest; 2 from What
 * rules", each so many lines from the next line that holds the words. A line "..." stands for
 * whatever is left out.
 */
final class Cut {

  private static final String LEFT_OUT = "...";
  private static final Pattern PART = Pattern.compile("(\\d+) from (.+)");

  private final List<String> lines;
  private final List<String> kept = new ArrayList<>();
  private int next;

  private Cut(List<String> lines) {
    this.lines = lines;
  }

  /**
   * Cuts an output.
   *
   * @param output the whole output
   * @param parts what to keep
   * @return the lines kept
   */
  static List<String> of(String output, String parts) {
    List<String> lines = output.lines().toList();
    if (parts.equals("all")) {
      return lines;
    }
    Cut cut = new Cut(lines);
    for (String part : parts.split("; ")) {
      cut.keep(part);
    }
    cut.skipTo(lines.size());
    return cut.kept;
  }

  private void keep(String part) {
    Matcher matcher = PART.matcher(part);
    if (!matcher.matches()) {
      throw new IllegalArgumentException("README.md: cut \"" + part + "\"; accepted: N from WORDS");
    }
    skipTo(lineWith(matcher.group(2)));
    int end = next + Integer.parseInt(matcher.group(1));
    if (end > lines.size()) {
      throw new IllegalArgumentException("README.md: cut \"" + part + "\" runs past the output");
    }
    kept.addAll(lines.subList(next, end));
    next = end;
  }

  private int lineWith(String words) {
    for (int i = next; i < lines.size(); i++) {
      if (lines.get(i).contains(words)) {
        return i;
      }
    }
    throw new IllegalArgumentException("README.md: no further output line with \"" + words + "\"");
  }

  private void skipTo(int line) {
    if (line > next) {
      kept.add(LEFT_OUT);
    }
    next = line;
  }
}
