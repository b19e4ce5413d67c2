package coilwright.problem;

import coilwright.spring.Kind;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;

/** Writes the table of keys in Markdown; rows that differ in their kinds only stand as one. */
final class KeyMarkdown {

  private KeyMarkdown() {}

  /**
   * The table.
   *
   * @param rows the rows
   * @return a line for each, under a head of two lines
   */
  static String of(List<ProblemKey<?>> rows) {
    Map<String, Set<Kind>> lines = new LinkedHashMap<>();
    for (ProblemKey<?> key : rows) {
      lines.computeIfAbsent(line(key), line -> new TreeSet<>()).addAll(key.kinds());
    }
    StringBuilder text = new StringBuilder("| key | springs | written as | left out | meaning |\n");
    text.append("|---|---|---|---|---|\n");
    lines.forEach((line, kinds) -> text.append(line.replaceFirst("%", words(kinds))));
    return text.toString();
  }

  /** A line with a percent sign in the place of the kinds. */
  private static String line(ProblemKey<?> key) {
    String omitted = key.omitted().isEmpty() ? "must be given" : key.omitted();
    return "| `"
        + key.path()
        + "` | % | "
        + String.join(" | ", cell(key.reader().accepted()), cell(omitted), cell(key.help()))
        + " |\n";
  }

  private static String words(Set<Kind> kinds) {
    return kinds.size() == Kind.values().length
        ? "all"
        : String.join(", ", kinds.stream().map(Kind::id).toList());
  }

  private static String cell(String text) {
    return text.replace("|", "\\|");
  }
}
