package coilwright.material;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Percentage.withPercentage;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * Grades that may be taken for each other: by the table, either way round, and by their strength.
 */
class EquivalentsTest {

  private final Catalogue catalogue = Catalogue.load();

  @Test
  void pairsHoldEitherWayAndDoNotChain() {
    equivalent("music-wire", "en-10270-1-sh", true);
    equivalent("hard-drawn", "en-10270-1-sm", true);
    equivalent("hard-drawn", "en-10270-1-sl", true);
    equivalent("en-10270-1-sl", "en-10270-1-sm", false);
    equivalent("en-10270-1-sm", "en-10270-1-dm", true);
    equivalent("music-wire", "hard-drawn", false);
    equivalent("music-wire", "music-wire", true);
    equivalent("coil-lot-4711", "coil-lot-4711", true);
    equivalent("coil-lot-4711", "music-wire", false);
  }

  /** The trade calls them rough equivalents: their least strengths lie within 17 %. */
  @Test
  void equivalentsAreAboutAsStrong() {
    List<String> compared = new ArrayList<>();
    for (TableRow row : catalogue.table("equivalents").rows()) {
      List<String> pair = List.of(row.text("grade"), row.text("other"));
      if (catalogue.gradeIds().containsAll(pair)) {
        compared.addAll(pair);
        aboutAsStrong(catalogue.grade(pair.get(0)), catalogue.grade(pair.get(1)));
      }
    }
    assertThat(compared)
        .contains("en-10270-1-sm", "hard-drawn", "en-10270-1-sh", "music-wire")
        .hasSizeGreaterThanOrEqualTo(4);
  }

  @Test
  void everyPairCitesItsSourceAndStandsOnce() {
    List<String> pairs = new ArrayList<>();
    for (TableRow row : catalogue.table("equivalents").rows()) {
      assertThat(row.citation().text()).isNotBlank();
      pairs.add(row.text("grade") + " " + row.text("other"));
      pairs.add(row.text("other") + " " + row.text("grade"));
    }
    assertThat(pairs).doesNotHaveDuplicates();
  }

  private void equivalent(String id, String other, boolean wanted) {
    assertThat(catalogue.equivalent(id, other)).as(id + " " + other).isEqualTo(wanted);
    assertThat(catalogue.equivalent(other, id)).as(other + " " + id).isEqualTo(wanted);
  }

  private static void aboutAsStrong(WireGrade grade, WireGrade other) {
    int sizes = 0;
    for (double d = 1; d <= 6; d += 0.5) {
      if (grade.diameters().contains(d) && other.diameters().contains(d)) {
        sizes++;
        assertThat(grade.strength().at(d))
            .as(grade.id() + " and " + other.id() + " at " + d + " mm")
            .isCloseTo(other.strength().at(d), withPercentage(17));
      }
    }
    assertThat(sizes).isGreaterThan(3);
  }
}
