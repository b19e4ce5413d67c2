package coilwright.material;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.source.Evidence;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;

/** What must hold for every row that the catalogue ships, whatever its figures. */
class CataloguePlausibilityTest {

  private static final Catalogue CATALOGUE = Catalogue.load();

  /** Grades with one strength for all their diameters: no better table was seen. */
  private static final List<String> FLAT =
      List.of("beryllium-copper", "monel-400", "monel-k500", "inconel-600", "inconel-x750");

  static Stream<String> grades() {
    return CATALOGUE.gradeIds().stream();
  }

  @ParameterizedTest
  @MethodSource("grades")
  void strengthIsPositiveAndNeverRisesWithDiameter(String id) {
    WireGrade grade = CATALOGUE.grade(id);
    double last = Double.POSITIVE_INFINITY;
    for (double d : ladder(grade)) {
      double strength = grade.strength().at(d);
      assertThat(strength).as("at " + d + " mm").isPositive().isLessThanOrEqualTo(last);
      last = strength;
    }
    double thinnest = grade.strength().at(ladder(grade).get(0));
    assertThat(last < thinnest || FLAT.contains(id)).as(id).isTrue();
  }

  @ParameterizedTest
  @MethodSource("grades")
  void strengthIsThatOfSpringWire(String id) {
    WireGrade grade = CATALOGUE.grade(id);
    for (double d : ladder(grade)) {
      assertThat(grade.strength().at(d)).as("at " + d + " mm").isBetween(700.0, 3200.0);
    }
  }

  @ParameterizedTest
  @MethodSource("grades")
  void moduliCoverTheStrengthAndStandInTheRatioOfMetals(String id) {
    WireGrade grade = CATALOGUE.grade(id);
    for (double d : ladder(grade)) {
      double ratio = grade.shearModulus().at(d) / grade.elasticModulus().at(d);
      assertThat(ratio).as("G/E at " + d + " mm").isBetween(0.33, 0.42);
      assertThat(grade.shearModulus().at(d)).isBetween(25_000.0, 250_000.0);
      assertThat(grade.elasticModulus().at(d)).isBetween(25_000.0, 250_000.0);
      if (isSteel(grade)) {
        assertThat(grade.elasticModulus().at(d)).isBetween(180_000.0, 210_000.0);
        assertThat(grade.shearModulus().at(d)).isBetween(68_000.0, 83_000.0);
      }
    }
  }

  @ParameterizedTest
  @MethodSource("grades")
  void densityIsThatOfItsMetalAndCostIsRelativeToHardDrawn(String id) {
    WireGrade grade = CATALOGUE.grade(id);
    assertThat(grade.density()).isBetween(4000.0, 9500.0);
    if (isSteel(grade)) {
      assertThat(grade.density()).isBetween(7700.0, 8050.0);
    }
    assertThat(grade.costIndex()).isGreaterThanOrEqualTo(CATALOGUE.grade("hard-drawn").costIndex());
  }

  @ParameterizedTest
  @MethodSource("grades")
  void everyKindOfDataNamesItsSource(String id) {
    WireGrade grade = CATALOGUE.grade(id);
    Set<String> kinds = new HashSet<>();
    for (GradeSource source : grade.sources()) {
      kinds.add(source.what());
      assertThat(source.text()).isNotBlank();
      assertThat(source.evidence()).isNotNull();
    }
    assertThat(kinds).contains("strength", "moduli", "diameter tolerance", "density", "cost index");
    assertThat(kinds.contains("service temperature"))
        .isEqualTo(grade.maxServiceTemperature().isPresent());
  }

  @ParameterizedTest
  @MethodSource("grades")
  void theUsualSeriesHasWireOfTheGrade(String id) {
    WireGrade grade = CATALOGUE.grade(id);
    List<WireSize> drawn =
        CATALOGUE.sizes(grade.usualSeries().get(0)).stream()
            .filter(size -> grade.diameters().contains(size.diameter()))
            .toList();
    assertThat(drawn).hasSizeGreaterThan(20);
    drawn.forEach(size -> assertThat(grade.drawnTo(size).tensileStrength()).isPositive());
  }

  @ParameterizedTest
  @EnumSource(WireSeries.class)
  void sizesRiseWithoutRepeatedLabels(WireSeries series) {
    List<WireSize> sizes = CATALOGUE.sizes(series);
    assertThat(sizes.stream().map(WireSize::label)).doesNotHaveDuplicates();
    for (int i = 1; i < sizes.size(); i++) {
      assertThat(sizes.get(i).diameter()).isGreaterThan(sizes.get(i - 1).diameter());
    }
  }

  @Test
  void metricLabelsAreTheDiametersWithTwoDecimals() {
    for (WireSize size : CATALOGUE.sizes(WireSeries.METRIC)) {
      assertThat(size.label()).matches("\\d+\\.\\d\\d");
      assertThat(Double.parseDouble(size.label())).isEqualTo(size.diameter());
    }
  }

  @Test
  void onlyStrengthsNotSeenMakeAWireOneFromMemory() {
    WireGrade stainless = CATALOGUE.grade("stainless-302");
    assertThat(stainless.strength().evidenceAt(0.080 * 25.4)).isEqualTo(Evidence.SEEN);
    assertThat(stainless.strength().evidenceAt(0.081 * 25.4)).isEqualTo(Evidence.MEMORY);
    WireGrade music = CATALOGUE.grade("music-wire");
    Wire wire = music.drawnTo(WireSize.explicit("2 mm", 2));
    assertThat(wire.evidence()).isEqualTo(Evidence.SEEN);
  }

  @ParameterizedTest
  @MethodSource("grades")
  void aGradeWhollyFromMemoryIsNotCommonAndAllItsWireSaysSo(String id) {
    WireGrade grade = CATALOGUE.grade(id);
    boolean strengthSeen =
        grade.sources().stream()
            .anyMatch(s -> s.what().equals("strength") && s.evidence() == Evidence.SEEN);
    boolean moduliSeen =
        grade.sources().stream()
            .noneMatch(s -> s.what().equals("moduli") && s.evidence() == Evidence.MEMORY);
    boolean anySeen = !isAllFromMemory(id);
    assertThat(anySeen && !(strengthSeen && moduliSeen)).as("seen without a seen source").isFalse();
    assertThat(grade.common() && !anySeen).as("common without a seen size").isFalse();
  }

  @Test
  void theseGradesHaveNoSeenWire() {
    assertThat(grades().filter(CataloguePlausibilityTest::isAllFromMemory))
        .containsExactlyInAnyOrder(
            "chrome-silicon",
            "stainless-17-7ph",
            "phosphor-bronze",
            "beryllium-copper",
            "monel-400",
            "monel-k500",
            "inconel-600",
            "inconel-x750",
            "en-10270-1-sl",
            "en-10270-2-fdc",
            "en-10270-2-fdcrv",
            "en-10270-2-fdsicr",
            "en-10270-2-vdsicr",
            "en-10270-3-1.4310-hs");
  }

  private static boolean isAllFromMemory(String id) {
    WireGrade grade = CATALOGUE.grade(id);
    return CATALOGUE.sizes(grade.usualSeries().get(0)).stream()
        .filter(size -> grade.diameters().contains(size.diameter()))
        .allMatch(size -> grade.drawnTo(size).evidence() == Evidence.MEMORY);
  }

  @Test
  void theHighStrengthGradeIsStrongerThroughout() {
    WireGrade high = CATALOGUE.grade("en-10270-1-sh");
    WireGrade medium = CATALOGUE.grade("en-10270-1-sm");
    for (double d : ladder(medium)) {
      assertThat(high.strength().at(d)).isGreaterThan(medium.strength().at(d));
    }
  }

  private static boolean isSteel(WireGrade grade) {
    return grade.allowableClass() != AllowableClass.NON_FERROUS;
  }

  /** Diameters over the grade's whole range, close enough to meet every row [mm]. */
  private static List<Double> ladder(WireGrade grade) {
    double from = Math.max(grade.diameters().min(), 0.05);
    double to = grade.diameters().max();
    int steps = 4000;
    return Stream.iterate(0, i -> i <= steps, i -> i + 1)
        .map(i -> i == steps ? to : from + (to - from) * i / steps)
        .toList();
  }
}
