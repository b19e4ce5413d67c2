package coilwright.problem;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.unit.Dimension;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Value by value: what the reader of a key takes, its part of the schema takes. */
class SchemaByValueTest {

  private static final String[] NUMBERS =
      ("0 -0 +0 0.0 -0.00 1 +1 -1 8 0.25 .5 -.5 +.5 1e0 1E+1 2.5e1 1e-3 10.0 2.5 1. 010 0x1 1_0 45"
              + " 60 1e9 1e10")
          .split(" ");

  private static final List<Probe> PROBES = probes();

  private static final JsonNode ROOT = root();

  static Stream<ProblemKey<?>> keys() {
    return KeyTable.ROWS.stream();
  }

  @ParameterizedTest
  @MethodSource("keys")
  void takesWhatTheReaderTakes(ProblemKey<?> key) {
    com.networknt.schema.Schema schema = of(key);
    int taken = 0;
    for (Probe probe : probes(key)) {
      if (probe.isTakenBy(key)) {
        taken++;
        assertThat(schema.validate(Schema.plain(probe.node()))).as(probe.text()).isEmpty();
        assertThat(schema.validate(probe.typed())).as(probe.text()).isEmpty();
      }
    }
    assertThat(taken).isPositive();
  }

  @ParameterizedTest
  @MethodSource("keys")
  void refusesValuesOfAnotherKind(ProblemKey<?> key) {
    com.networknt.schema.Schema schema = of(key);
    List<String> foreign = new ArrayList<>(List.of("{no_such_key: 1}", "[[metric]]", "[]"));
    if (!key.reader().accepted().matches("(?s).*(text|a grade id|a word without).*")) {
      foreign.addAll(List.of("5 parsecs", "mettric", "true-ish", "0.1.2", "5 mm/N", "5, 6"));
    }
    if (key.reader().form(key.kinds().get(0)) instanceof Form.Number) {
      foreign.addAll(List.of("1e10", "-1", "none"));
    }
    for (String text : foreign) {
      assertThat(schema.validate(Probe.of(text).typed())).as(text).isNotEmpty();
    }
  }

  @Test
  void takesWhatIsLeftOfAFileWithoutALine() {
    int taken = 0;
    for (String text :
        List.of(FullFileTest.FULL, ExtensionFileTest.FULL, TorsionFileTest.FULL, Files.DESIGN)) {
      for (String line : text.lines().toList()) {
        String rest = text.replace(line + "\n", "");
        if (Files.read(rest, purpose(text)).problem().isPresent()) {
          taken++;
          assertThat(Schema.complaints(rest)).as(rest).isEmpty();
        }
      }
    }
    assertThat(taken).isGreaterThan(90);
  }

  private static Purpose purpose(String text) {
    return text.contains("design:") ? Purpose.CHECK : Purpose.SHORTLIST;
  }

  private static List<Probe> probes(ProblemKey<?> key) {
    List<Probe> all = new ArrayList<>(PROBES);
    for (String example : key.examples()) {
      all.add(Probe.of(example));
      all.add(Probe.of("[" + example + "]"));
    }
    if (key.reader().form(key.kinds().get(0)) instanceof Form.Word word) {
      word.words().forEach(known -> all.add(Probe.of(known)));
    }
    return all;
  }

  /** Numbers in many spellings, by themselves and with units; words; nothing; lists; blocks. */
  private static List<Probe> probes() {
    List<String> all = new ArrayList<>();
    for (String number : NUMBERS) {
      all.add(number);
      for (Dimension kind : Dimension.values()) {
        all.add(number + " " + kind.units().get(0).symbol());
      }
    }
    for (Dimension kind : Dimension.values()) {
      kind.units().forEach(unit -> all.add("1.5" + unit.symbol()));
      kind.units().forEach(unit -> all.add("1e3 \t " + unit.symbol()));
    }
    all.addAll(List.of("none", "true", "false", "null", "", "~", "all", "word", "two words"));
    all.addAll(
        List.of("{}", "[]", "[1]", "[metric]", "[1 mm, 2 mm]", "a/b", "4711", "[{length: 1 mm}]"));
    return all.stream().map(Probe::of).toList();
  }

  /** A value as the program and as an editor reads it. */
  private record Probe(String text, Node node, JsonNode typed) {

    static Probe of(String text) {
      String file = "x: " + text;
      Node.Mapping root = (Node.Mapping) Document.read(file, new Faults()).orElseThrow();
      return new Probe(
          text, root.entries().get(0).value(), Schema.typed(file).orElseThrow().get("x"));
    }

    boolean isTakenBy(ProblemKey<?> key) {
      if (key.optional() && key.reader().omits(node)) {
        return true;
      }
      Faults faults = new Faults();
      Spot spot =
          new Spot(Mark.FILE, key.path().replace("[]", "[0]"), faults).of(key.kinds().get(0));
      return key.reader().read(node, spot).isPresent() && faults.count() == 0;
    }
  }

  /** The part of the schema for one key. */
  private static com.networknt.schema.Schema of(ProblemKey<?> key) {
    JsonNode at = ROOT.get("allOf").get(key.kinds().get(0).ordinal()).get("then");
    for (String name : key.path().split("\\.")) {
      at = inside(at, name.replace("[]", ""), name.endsWith("[]"));
    }
    return SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12).getSchema(at);
  }

  private static JsonNode inside(JsonNode schema, String name, boolean list) {
    for (JsonNode part : parts(schema)) {
      JsonNode key = part.path("properties").path(name);
      if (!key.isMissingNode() && !list) {
        return key;
      }
      for (JsonNode inner : parts(key)) {
        if (list && inner.has("items")) {
          return inner.get("items");
        }
      }
    }
    throw new AssertionError(name + " in " + schema);
  }

  private static List<JsonNode> parts(JsonNode schema) {
    List<JsonNode> parts = new ArrayList<>(List.of(schema));
    schema.path("anyOf").forEach(parts::add);
    return parts;
  }

  private static JsonNode root() {
    try {
      return new ObjectMapper().readTree(Schema.TEXT);
    } catch (IOException e) {
      throw new AssertionError(e);
    }
  }
}
