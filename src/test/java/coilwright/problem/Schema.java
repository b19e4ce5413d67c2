package coilwright.problem;

import coilwright.report.SchemaJson;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.NullNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.fasterxml.jackson.databind.node.TextNode;
import com.fasterxml.jackson.dataformat.yaml.YAMLMapper;
import com.fasterxml.jackson.dataformat.yaml.YAMLParser;
import com.networknt.schema.Error;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The schema of problem files in a validator, and files as an editor hands them to it. */
final class Schema {

  static final String TEXT = SchemaJson.of(KeyTable.forms());

  private static final ObjectMapper JSON = new ObjectMapper();
  private static final YAMLMapper YAML =
      YAMLMapper.builder().enable(YAMLParser.Feature.PARSE_BOOLEAN_LIKE_WORDS_AS_STRINGS).build();

  private static final com.networknt.schema.Schema SCHEMA =
      SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12).getSchema(TEXT);

  private Schema() {}

  /** What the schema says against a file, read in both ways. */
  static List<String> complaints(String text) {
    List<String> all = new ArrayList<>();
    typed(text).ifPresent(document -> all.addAll(complaints(document)));
    plain(text).ifPresent(document -> all.addAll(complaints(document)));
    return all;
  }

  static List<String> complaints(JsonNode document) {
    return SCHEMA.validate(document).stream().map(Error::toString).toList();
  }

  /** As most editors read it: numbers, truth values and null have types of their own. */
  static Optional<JsonNode> typed(String text) {
    try {
      boolean json = text.stripLeading().startsWith("{");
      return Optional.of(json ? JSON.readTree(text) : YAML.readTree(text));
    } catch (JsonProcessingException e) {
      return Optional.empty();
    }
  }

  /** As the program reads it: every value is text, without blanks at its ends. */
  static Optional<JsonNode> plain(String text) {
    return Document.read(text, new Faults()).map(Schema::plain);
  }

  static JsonNode plain(Node node) {
    if (node instanceof Node.Mapping mapping) {
      ObjectNode object = JsonNodeFactory.instance.objectNode();
      mapping.entries().forEach(entry -> object.set(entry.key(), plain(entry.value())));
      return object;
    }
    if (node instanceof Node.Sequence list) {
      ArrayNode array = JsonNodeFactory.instance.arrayNode();
      list.items().forEach(item -> array.add(plain(item)));
      return array;
    }
    return node instanceof Node.Scalar scalar && !scalar.isEmpty() && !scalar.isNull()
        ? TextNode.valueOf(scalar.text())
        : NullNode.getInstance();
  }
}
