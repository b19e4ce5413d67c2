package coilwright.material;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.unit.Dimension;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Loads every row of every table that ships and holds it to what must be true of any such table.
 */
class EveryTableTest {

  private static final Path FOLDER = Path.of("src/main/resources/coilwright/material");
  private static final Catalogue CATALOGUE = Catalogue.load();

  /** What a nominal size may be above the one before it, so that bands between them do not gape. */
  private static final double NEXT_SIZE = 1.15;

  static List<String> files() throws IOException {
    try (Stream<Path> all = Files.list(FOLDER)) {
      return all.map(path -> path.getFileName().toString().replace(".csv", "")).sorted().toList();
    }
  }

  private static Stream<String> kind(String prefix) throws IOException {
    return files().stream().filter(name -> name.startsWith(prefix));
  }

  static Stream<String> strengths() throws IOException {
    return kind("strength-");
  }

  static Stream<String> moduli() throws IOException {
    return kind("moduli-");
  }

  static Stream<String> tolerances() throws IOException {
    return kind("tolerance-");
  }

  static Stream<String> sizes() throws IOException {
    return kind("sizes-");
  }

  @ParameterizedTest
  @MethodSource("files")
  void everyRowHasASourceAPlaceAndItsEvidence(String file) {
    Table table = CATALOGUE.table(file);
    assertThat(table.header().entry("rule")).isNotBlank();
    for (TableRow row : table.rows()) {
      assertThat(row.evidence()).isNotNull();
      assertThat(row.citation().source()).isNotNull();
      assertThat(row.citation().locator()).isNotBlank();
    }
  }

  @ParameterizedTest
  @MethodSource("strengths")
  void strengthsArePositiveAndDoNotRiseAsDiametersDo(String file) {
    Table table = CATALOGUE.table(file);
    if (table.header().entry("rule").equals("formula")) {
      table.rows().forEach(EveryTableTest::formula);
      return;
    }
    String size = table.rows().get(0).has("diameter") ? "diameter" : "diameter_max";
    Map<String, TableRow> last = new HashMap<>();
    for (TableRow row : table.rows()) {
      double mpa = row.quantity("strength", Dimension.STRESS);
      assertThat(mpa).isBetween(700.0, 3200.0);
      TableRow before = last.put(row.has("grade") ? row.text("grade") : "", row);
      if (before != null) {
        assertThat(row.quantity(size, Dimension.LENGTH))
            .isGreaterThan(before.quantity(size, Dimension.LENGTH));
        assertThat(mpa).isLessThanOrEqualTo(before.quantity("strength", Dimension.STRESS));
        assertThat(mpa).isGreaterThan(0.85 * before.quantity("strength", Dimension.STRESS));
      }
    }
  }

  private static void formula(TableRow row) {
    assertThat(row.quantity("diameter_min", Dimension.LENGTH))
        .isLessThan(row.quantity("diameter_max", Dimension.LENGTH));
    assertThat(row.quantity("intercept", Dimension.STRESS)).isBetween(1500.0, 2500.0);
    assertThat(row.quantity("slope", Dimension.STRESS)).isBetween(500.0, 1000.0);
  }

  @ParameterizedTest
  @MethodSource("moduli")
  void moduliFallWithDiameterAndCoverEverySize(String file) {
    Map<String, TableRow> last = new HashMap<>();
    for (TableRow row : CATALOGUE.table(file).rows()) {
      TableRow before = last.put(row.text("grade"), row);
      for (String column : List.of("elastic_modulus", "shear_modulus")) {
        double modulus = row.quantity(column, Dimension.STRESS);
        assertThat(modulus).isBetween(25_000.0, 250_000.0);
        if (before != null) {
          assertThat(modulus).isLessThan(before.quantity(column, Dimension.STRESS));
        }
      }
    }
    last.values().forEach(row -> assertThat(row.text("up_to")).isEqualTo("any"));
  }

  @ParameterizedTest
  @MethodSource("tolerances")
  void tolerancesGrowMoreSlowlyThanTheWireWithoutGapOrOverlap(String file) {
    double end = 0;
    double last = 0;
    for (TableRow row : CATALOGUE.table(file).rows()) {
      double from = row.quantity("from", Dimension.LENGTH);
      double tolerance = row.quantity("tolerance", Dimension.LENGTH);
      assertThat(from).isGreaterThanOrEqualTo(end);
      assertThat(end == 0 || from < NEXT_SIZE * end).as("gap before " + from + " mm").isTrue();
      assertThat(tolerance).isGreaterThan(last).isLessThan(0.061 * from);
      end = row.quantity("up_to", Dimension.LENGTH);
      assertThat(end).isGreaterThan(from);
      last = tolerance;
    }
  }

  @ParameterizedTest
  @MethodSource("sizes")
  void sizesRiseAndNoLabelComesTwice(String file) {
    Set<String> labels = new HashSet<>();
    double last = 0;
    for (TableRow row : CATALOGUE.table(file).rows()) {
      assertThat(labels.add(row.text("label"))).as(row.text("label")).isTrue();
      double d = row.quantity("diameter", Dimension.LENGTH);
      assertThat(d).isGreaterThan(last).isBetween(0.04, 21.0);
      last = d;
    }
  }

  @Test
  void everyGradeHasADensityAServiceTemperatureAndACostIndexOnce() {
    Set<String> pairs = new HashSet<>();
    for (TableRow row : CATALOGUE.table("properties").rows()) {
      assertThat(CATALOGUE.gradeIds()).contains(row.text("grade"));
      assertThat(pairs.add(row.text("grade") + " " + row.text("property"))).isTrue();
    }
    assertThat(pairs).hasSize(3 * CATALOGUE.gradeIds().size());
    for (String id : CATALOGUE.gradeIds()) {
      double temperature = CATALOGUE.grade(id).maxServiceTemperature().orElseThrow();
      assertThat(temperature).as(id).isBetween(100.0, 450.0);
      assertThat(CATALOGUE.grade(id).costIndex()).as(id).isBetween(1.0, 50.0);
    }
  }

  @Test
  void noTableLiesUnused() throws IOException {
    Set<String> used = new HashSet<>(List.of("grades", "properties", "equivalents"));
    for (TableRow row : CATALOGUE.table("grades").rows()) {
      Stream.of("strength", "moduli", "tolerance").map(row::text).forEach(used::add);
    }
    Stream.of(WireSeries.values()).map(WireSeries::files).forEach(used::addAll);
    assertThat(files()).containsExactlyInAnyOrderElementsOf(used);
  }
}
