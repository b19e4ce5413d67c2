package coilwright.report;

import coilwright.problem.Form;
import coilwright.problem.Range;
import coilwright.spring.Kind;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/**
 * Writes forms as JSON Schema, draft 2020-12, for editors. It says what one value shows by itself,
 * and which keys the kind of spring has; what else only two values together show is left to reading
 * the file.
 */
public final class SchemaJson {

  private static final String DIALECT = "https://json-schema.org/draft/2020-12/schema";

  /** The key that says which kind of spring a file is for. */
  private static final String KIND = "spring";

  private final Json json;

  private SchemaJson(Json json) {
    this.json = json;
  }

  /**
   * The schema of problem files.
   *
   * @param files the form of the file for each kind of spring
   * @return a JSON document, ended by a line feed
   */
  public static String of(Map<Kind, Form.Block> files) {
    return Json.document(
        json -> {
          json.string("$schema", DIALECT);
          json.string("title", "Problem file of coilwright");
          json.string("type", "object");
          json.strings("required", List.of(KIND));
          List<String> words = files.keySet().stream().map(Kind::id).toList();
          json.object("properties", keys -> keys.object(KIND, key -> key.strings("enum", words)));
          json.array(
              "allOf",
              list -> {
                for (Map.Entry<Kind, Form.Block> file : files.entrySet()) {
                  list.braces(item -> new SchemaJson(item).file(file.getKey(), file.getValue()));
                }
              });
        });
  }

  /** What holds for the files of one kind of spring. */
  private void file(Kind kind, Form.Block form) throws IOException {
    json.object(
        "if",
        one -> {
          one.object(
              "properties", keys -> keys.object(KIND, key -> key.string("const", kind.id())));
          one.strings("required", List.of(KIND));
        });
    json.object("then", one -> new SchemaJson(one).form(form, false));
  }

  private void form(Form form, boolean mayBeEmpty) throws IOException {
    if (form instanceof Form.Block block) {
      block(block, mayBeEmpty);
    } else if (form instanceof Form.Many many) {
      many(many, mayBeEmpty);
    } else if (form instanceof Form.Either either) {
      either(either, mayBeEmpty);
    } else {
      scalar(form);
    }
  }

  private void scalar(Form form) throws IOException {
    if (form instanceof Form.Word word) {
      word(word.words());
    } else if (form instanceof Form.Number number) {
      json.strings("type", List.of(number.whole() ? "integer" : "number", "string"));
      range(number.range());
      json.string("pattern", number.pattern());
    } else if (form instanceof Form.Measure measure) {
      json.string("type", "string");
      json.string("pattern", measure.pattern());
    } else if (form instanceof Form.Text text) {
      text(text.pattern());
    }
  }

  /** Words are strings; where a word is true or false, an editor sees a truth value. */
  private void word(List<String> words) throws IOException {
    List<String> truths =
        words.stream().filter(w -> w.equals("true") || w.equals("false")).toList();
    if (truths.isEmpty()) {
      json.strings("enum", words);
      return;
    }
    json.array(
        "anyOf",
        list -> {
          for (String truth : truths) {
            list.braces(item -> item.flag("const", truth.equals("true")));
          }
          list.braces(item -> item.strings("enum", words));
        });
  }

  private void range(Range range) throws IOException {
    json.number(range.lowIncluded() ? "minimum" : "exclusiveMinimum", range.low());
    json.number(range.highIncluded() ? "maximum" : "exclusiveMaximum", range.high());
  }

  private void text(String pattern) throws IOException {
    json.strings("type", List.of("string", "number", "boolean"));
    json.string("pattern", pattern.isEmpty() ? "[^ \\t\\r\\n]" : pattern);
  }

  private void either(Form.Either either, boolean mayBeEmpty) throws IOException {
    json.array(
        "anyOf",
        list -> {
          for (Form one : flat(either)) {
            list.braces(item -> new SchemaJson(item).form(one, mayBeEmpty));
          }
        });
  }

  private static List<Form> flat(Form.Either either) {
    List<Form> forms = new ArrayList<>();
    for (Form form : either.forms()) {
      if (form instanceof Form.Either inner) {
        forms.addAll(flat(inner));
      } else {
        forms.add(form);
      }
    }
    return forms;
  }

  private void many(Form.Many many, boolean mayBeEmpty) throws IOException {
    type("array", mayBeEmpty);
    json.count("minItems", 1);
    if (many.distinct()) {
      json.flag("uniqueItems", true);
    }
    json.object("items", item -> new SchemaJson(item).form(many.item(), false));
  }

  private void block(Form.Block block, boolean mayBeEmpty) throws IOException {
    type("object", mayBeEmpty);
    json.object(
        "properties",
        list -> {
          for (Form.Key key : block.keys()) {
            list.object(key.name(), item -> new SchemaJson(item).key(key));
          }
        });
    json.flag("additionalProperties", false);
    new SchemaPresence(json, block).write(mayBeEmpty);
  }

  private void type(String type, boolean mayBeEmpty) throws IOException {
    if (mayBeEmpty) {
      json.strings("type", List.of(type, "null"));
    } else {
      json.string("type", type);
    }
  }

  private void key(Form.Key key) throws IOException {
    json.string("description", description(key));
    form(key.form(), key.mayBeEmpty());
    if (key.form() instanceof Form.Measure) {
      json.strings("examples", key.examples());
    }
  }

  private static String description(Form.Key key) {
    String omitted =
        key.omitted().isEmpty() ? "Must be given." : "Left out: " + key.omitted() + ".";
    return key.help() + ". Written as " + key.written() + ". " + omitted;
  }
}
