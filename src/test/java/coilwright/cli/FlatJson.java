package coilwright.cli;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** JSON flattened as README.md says that CSV names its columns: apart from what writes it. */
final class FlatJson {

  /** A range with its unit, which stands behind "min" and "max" in CSV. */
  private static final Pattern RANGE = Pattern.compile("(preferred_.*)(_n)");

  private FlatJson() {}

  /** The cells of one spring. */
  static Map<String, String> of(JsonNode spring) {
    Map<String, String> cells = new LinkedHashMap<>();
    spring.properties().forEach(entry -> add(cells, entry.getKey(), entry.getValue()));
    return cells;
  }

  private static void add(Map<String, String> cells, String key, JsonNode node) {
    switch (key) {
      case "loads" -> {
        for (int i = 0; i < node.size(); i++) {
          nested(cells, "load_" + (i + 1), node.get(i));
        }
      }
      case "checks" ->
          node.forEach(
              check -> named(cells, "check", check, check.path("limit"), check.path("side")));
      case "cost_terms" -> node.forEach(term -> named(cells, "cost_term", term, term.path("term")));
      default -> leaf(cells, key, node);
    }
  }

  private static void leaf(Map<String, String> cells, String key, JsonNode node) {
    if (node.isObject()) {
      Matcher range = RANGE.matcher(key);
      String prefix = range.matches() ? range.group(1) : key;
      String unit = range.matches() ? range.group(2) : "";
      node.properties()
          .forEach(entry -> leaf(cells, prefix + "_" + entry.getKey() + unit, entry.getValue()));
    } else {
      cells.put(key, node.isNull() ? "" : node.asText());
    }
  }

  private static void nested(Map<String, String> cells, String prefix, JsonNode node) {
    node.properties()
        .forEach(entry -> leaf(cells, prefix + "_" + entry.getKey(), entry.getValue()));
  }

  /** What names an element becomes part of its columns' names. */
  private static void named(
      Map<String, String> cells, String kind, JsonNode element, JsonNode... names) {
    StringBuilder prefix = new StringBuilder(kind);
    for (JsonNode name : names) {
      prefix.append('_').append(name.asText().replace(' ', '_'));
    }
    if (cells.containsKey(prefix + "_value")) { // a second bound of one limit and side
      prefix.append("_2");
    }
    element
        .properties()
        .forEach(
            entry -> {
              boolean isName = false;
              for (JsonNode name : names) {
                isName |= name == entry.getValue();
              }
              if (!isName) {
                leaf(cells, prefix + "_" + entry.getKey(), entry.getValue());
              }
            });
  }
}
