package coilwright.report;

import coilwright.problem.Form;
import java.io.IOException;
import java.util.List;

/**
 * Writes which keys of a block must be given, and which stand instead of one another.
 *
 * @param json where it goes
 * @param block the block
 */
record SchemaPresence(Json json, Form.Block block) {

  /**
   * Writes it.
   *
   * @param mayBeEmpty whether an empty block counts as left out, and so need hold nothing
   */
  void write(boolean mayBeEmpty) throws IOException {
    List<String> needed =
        block.keys().stream().filter(Form.Key::needed).map(Form.Key::name).toList();
    if (needed.isEmpty() && block.choices().isEmpty()) {
      return;
    }
    if (mayBeEmpty) {
      json.object("if", SchemaPresence::filled);
      json.object("then", full -> new SchemaPresence(full, block).keys(needed));
    } else {
      keys(needed);
    }
  }

  private static void filled(Json json) throws IOException {
    json.string("type", "object");
    json.count("minProperties", 1);
  }

  private void keys(List<String> needed) throws IOException {
    if (!needed.isEmpty()) {
      json.strings("required", needed);
    }
    if (!block.choices().isEmpty()) {
      json.array(
          "allOf",
          list -> {
            for (Form.Choice choice : block.choices()) {
              list.braces(item -> choice(item, choice));
            }
          });
    }
  }

  private static void choice(Json json, Form.Choice choice) throws IOException {
    if (choice.needed()) {
      json.array(
          choice.exclusive() ? "oneOf" : "anyOf",
          list -> {
            for (String name : choice.names()) {
              list.braces(item -> item.strings("required", List.of(name)));
            }
          });
    } else {
      json.object("not", two -> two.array("anyOf", pairs -> pairs(pairs, choice.names())));
    }
  }

  private static void pairs(Json json, List<String> names) throws IOException {
    for (int i = 0; i < names.size(); i++) {
      for (String other : names.subList(i + 1, names.size())) {
        List<String> pair = List.of(names.get(i), other);
        json.braces(item -> item.strings("required", pair));
      }
    }
  }
}
