package coilwright.problem;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.spring.Kind;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.nio.file.Path;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The schema of problem files against the reader: never stricter, and blind only where it says. */
class SchemaTest {

  @Test
  void isASchemaByTheRulesOfItsDraft() throws IOException {
    JsonNode itself = new ObjectMapper().readTree(Schema.TEXT);
    assertThat(itself.get("$schema").asText())
        .isEqualTo("https://json-schema.org/draft/2020-12/schema");
    assertThat(
            SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
                .getSchema(com.networknt.schema.SchemaLocation.of(itself.get("$schema").asText()))
                .validate(itself))
        .isEmpty();
    assertThat(Schema.TEXT).matches("(?s)[\\x20-\\x7E\\n]*").endsWith("}\n");
  }

  @ParameterizedTest
  @MethodSource("demos")
  void takesEveryDemoProblem(Path file) throws IOException {
    assertThat(Schema.complaints(java.nio.file.Files.readString(file))).isEmpty();
  }

  static List<Path> demos() throws IOException {
    try (Stream<Path> files = java.nio.file.Files.walk(Path.of("problems"))) {
      return files.filter(file -> file.toString().endsWith(".yaml")).sorted().toList();
    }
  }

  @Test
  void takesGoodFiles() {
    for (String text :
        List.of(
            Files.LOADS,
            Files.DESIGN,
            FullFileTest.FULL,
            ExtensionFileTest.FULL,
            TorsionFileTest.FULL,
            Files.EXTENSION,
            Files.TORSION,
            Starter.of(Kind.COMPRESSION),
            Starter.of(Kind.EXTENSION),
            Starter.of(Kind.TORSION))) {
      assertThat(Schema.complaints(text)).isEmpty();
    }
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("coilwright.problem.BadFilesTest#cases")
  void refusesBadFilesUnlessTheirFaultsAreBeyondIt(BadFilesTest.BadFile file) {
    List<String> seen = file.messages().stream().filter(fault -> kinds(fault).isEmpty()).toList();
    if (!seen.isEmpty()) {
      String why = "the schema should see, or a kind of BeyondSchema should name: " + seen;
      Schema.typed(file.text())
          .ifPresent(document -> assertThat(Schema.complaints(document)).as(why).isNotEmpty());
      Schema.plain(file.text())
          .ifPresent(document -> assertThat(Schema.complaints(document)).as(why).isNotEmpty());
    }
  }

  @Test
  void everyKindOfFaultThatIsBeyondItIsSeenToBe() throws IOException {
    Set<BeyondSchema> unseen = EnumSet.allOf(BeyondSchema.class);
    for (BadFilesTest.BadFile file : BadFilesTest.cases().toList()) {
      boolean taken =
          Schema.typed(file.text()).filter(text -> Schema.complaints(text).isEmpty()).isPresent();
      if (taken) {
        file.messages().forEach(message -> unseen.removeAll(kinds(message)));
      }
    }
    assertThat(unseen).isEmpty();
  }

  private static Set<BeyondSchema> kinds(String message) {
    Set<BeyondSchema> kinds = EnumSet.noneOf(BeyondSchema.class);
    for (BeyondSchema kind : BeyondSchema.values()) {
      if (kind.says(message)) {
        kinds.add(kind);
      }
    }
    return kinds;
  }
}
