package coilwright.cli;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.LinkedHashMap;
import java.util.Map;

/** JSON flattened as README.md says that CSV names its columns: apart from what writes it. */
final class FlatJson {

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
      nested(cells, key, node);
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
