package coilwright.published;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * How many published values hold the laws and the data: counted from the headers of the files, and
 * only where a header says "seen". One row counts once, the rows of one printed cell count once
 * together, and of one printed table no more than twenty, in however many files and groups its rows
 * stand.
 *
 * <p>Every file of the groups of mechanics and of wire tables is read by the test of its group, so
 * that a row counted here is a row tested there.
 */
class PublishedCountTest {

  private static final int OF_EACH_GROUP = 5;
  private static final int ALTOGETHER = 120;
  private static final int OF_THE_MECHANICS = 30;
  private static final int OF_TORSION_SPRINGS = 28;
  private static final int OF_ONE_TABLE = 20;
  private static final int PUBLICATIONS = 10;

  /** What stands for a page whose publication was not noted down. */
  private static final String UNNAMED = "unnamed";

  private static final String COIL_TOLERANCE = "torsion coil tolerance";

  private static final List<String> MECHANICS =
      List.of("rate", "stress factors", "stress", "solid length and pitch", "buckling");

  /**
   * Torsion springs. Twenty of their values are tolerances that the assumed clearance only has to
   * cover; eight are left for the laws. No printed inner or outer factor was seen, no rate with its
   * modulus and constant, no coils of legs: these rest on values from memory and second methods.
   */
  private static final List<String> TORSION =
      List.of(
          "angular rate", "torsion body", "bending stress", "bending allowables", COIL_TOLERANCE);

  private static final List<String> OF_EXTENSION =
      List.of("extension allowables", "extension geometry");

  /** Groups of coils as such: extension springs are held to their rows too. */
  private static final List<String> OF_ANY_COIL = List.of("rate", "stress", "stress factors");

  private static final List<String> GROUPS =
      Stream.of(List.of("strength", "moduli", "wire tables", "extension allowables"), MECHANICS)
          .flatMap(List::stream)
          .toList();

  static List<String> groups() {
    return GROUPS;
  }

  @ParameterizedTest
  @MethodSource("groups")
  void eachGroupRestsOnSeveralSeenValues(String group) {
    assertThat(seenOf(group)).isGreaterThanOrEqualTo(OF_EACH_GROUP);
  }

  @Test
  void altogetherThereAreManySeenValues() {
    assertThat(counted(seen().filter(file -> GROUPS.contains(file.group()))))
        .isGreaterThanOrEqualTo(ALTOGETHER);
  }

  @Test
  void torsionSpringsHaveTheirOwn() {
    int all = TORSION.stream().mapToInt(PublishedCountTest::seenOf).sum();
    assertThat(all).isEqualTo(OF_TORSION_SPRINGS);
    assertThat(all - seenOf(COIL_TOLERANCE)).isEqualTo(8);
    assertThat(TORSION).allSatisfy(group -> assertThat(seenOf(group)).isPositive());
  }

  @Test
  void theSeenValuesComeFromSeveralPublications() {
    assertThat(
            seen()
                .map(file -> file.entry("source"))
                .filter(source -> !source.startsWith(UNNAMED))
                .distinct())
        .hasSizeGreaterThanOrEqualTo(PUBLICATIONS);
  }

  @Test
  void theMechanicsDoNotLeanOnTheMaterialTables() {
    assertThat(MECHANICS.stream().mapToInt(PublishedCountTest::seenOf).sum())
        .isGreaterThanOrEqualTo(OF_THE_MECHANICS);
  }

  /**
   * Few are of extension springs alone: eight allowables, of which six are one printed table, and
   * three of the geometry. No initial tension was seen with its index, no factor of a hook and no
   * stress of one, no share of active coils that is not in conflict with another: these rest on
   * values from memory and second methods.
   *
   * <p>Of the rows of any coil {@code PublishedExtensionTest} reads all but one, which is of a
   * spring at solid. They hold the body, not the hooks.
   */
  @Test
  void extensionSpringsRestOnFewSeenValuesOfTheirOwn() {
    int own = OF_EXTENSION.stream().mapToInt(PublishedCountTest::seenOf).sum();
    int shared = OF_ANY_COIL.stream().mapToInt(PublishedCountTest::seenOf).sum() - 1;
    assertThat(own).isEqualTo(11);
    assertThat(shared).isEqualTo(14);
  }

  @Test
  void theRowsOfOnePrintedCellCountOnce() {
    PublishedFile shares = PublishedFile.at("standard-handbook/extension-allowables.csv");
    assertThat(shares.rows()).hasSize(16);
    assertThat(shares.printed()).isEqualTo(7);
    PublishedFile cubics = PublishedFile.at("norton/initial-tension.csv");
    assertThat(cubics.printed()).isEqualTo(cubics.rows().size());
  }

  @Test
  void aLongTableCountsNoMoreThanTwentyRows() {
    PublishedFile gauge = PublishedFile.at("trade-tables/music-wire-gauge-mm.csv");
    PublishedFile sm = PublishedFile.at("en-10270-1/minimum-strength-sm.csv");
    assertThat(gauge.rows()).hasSizeGreaterThan(OF_ONE_TABLE);
    assertThat(counted(Stream.of(gauge))).isEqualTo(OF_ONE_TABLE);
    assertThat(counted(Stream.of(gauge, gauge))).isEqualTo(OF_ONE_TABLE);
    assertThat(counted(Stream.of(gauge, sm))).isEqualTo(2 * OF_ONE_TABLE);
    PublishedFile handbook = PublishedFile.at("machinerys-handbook/moduli.csv");
    PublishedFile conflicts = PublishedFile.at("machinerys-handbook/moduli-conflicts.csv");
    assertThat(counted(Stream.of(handbook, conflicts))).isEqualTo(OF_ONE_TABLE);
  }

  /**
   * No printed frequency, weight, initial tension or hook was seen with its inputs: their laws rest
   * on values from memory and on a second method. When one is seen, its group moves to a list
   * above.
   */
  @ParameterizedTest
  @ValueSource(strings = {"surge", "mass", "initial tension", "extension example"})
  void someGroupsHaveNoSeenValue(String group) {
    assertThat(seenOf(group)).isZero();
  }

  private static Stream<PublishedFile> seen() {
    return PublishedFile.all().stream().filter(PublishedFile::seen);
  }

  private static int seenOf(String group) {
    return counted(seen().filter(file -> file.group().equals(group)));
  }

  /** The rows of some files, those of one table together and at most twenty of them. */
  private static int counted(Stream<PublishedFile> files) {
    Map<String, Integer> rows = new HashMap<>();
    files.forEach(file -> rows.merge(file.table(), file.printed(), Integer::sum));
    return rows.values().stream().mapToInt(count -> Math.min(count, OF_ONE_TABLE)).sum();
  }
}
