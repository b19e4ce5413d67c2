package coilwright.material;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.List;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

/** What the catalogue offers, and that it opens no more files than it needs. */
class CatalogueTest {

  private static final double EXACT = 1e-10;

  private final Catalogue catalogue = Catalogue.load();

  @Test
  void offersTheGradesInItsOrder() {
    assertThat(catalogue.gradeIds())
        .containsExactly(
            "music-wire",
            "hard-drawn",
            "oil-tempered",
            "chrome-vanadium",
            "chrome-silicon",
            "stainless-302",
            "stainless-316",
            "stainless-17-7ph",
            "phosphor-bronze",
            "beryllium-copper",
            "monel-400",
            "monel-k500",
            "inconel-600",
            "inconel-x750",
            "en-10270-1-sl",
            "en-10270-1-sm",
            "en-10270-1-dm",
            "en-10270-1-sh",
            "en-10270-1-dh",
            "en-10270-2-fdc",
            "en-10270-2-fdcrv",
            "en-10270-2-fdsicr",
            "en-10270-2-vdsicr",
            "en-10270-3-1.4310-ns",
            "en-10270-3-1.4310-hs",
            "en-10270-3-1.4401",
            "en-10270-3-1.4568");
  }

  @Test
  void supplyAndSeriesGoTogether() {
    for (String id : catalogue.gradeIds()) {
      WireGrade grade = catalogue.grade(id);
      if (id.startsWith("en-")) {
        supplied(grade, Supply.EN, WireSeries.METRIC);
      } else if (id.equals("music-wire")) {
        supplied(grade, Supply.US, WireSeries.MUSIC_WIRE_GAUGE);
      } else if (grade.allowableClass() == AllowableClass.NON_FERROUS) {
        supplied(grade, Supply.ANY, WireSeries.BROWN_SHARPE);
      } else {
        supplied(grade, Supply.US, WireSeries.STEEL_WIRE_GAUGE);
      }
    }
  }

  private static void supplied(WireGrade grade, Supply supply, WireSeries series) {
    assertThat(grade.supply()).as(grade.id()).isEqualTo(supply);
    assertThat(grade.usualSeries()).as(grade.id()).containsExactly(series);
  }

  @Test
  void withoutANameTheCommonGradesOfTheSupplyAreTried() {
    String[] european = {"en-10270-1-sm", "en-10270-1-sh", "en-10270-3-1.4310-ns"};
    String[] american = {
      "music-wire", "hard-drawn", "oil-tempered", "chrome-vanadium", "stainless-302"
    };
    assertThat(catalogue.commonIds(Supply.EN)).containsExactly(european);
    assertThat(catalogue.commonIds(Supply.US)).containsExactly(american);
    assertThat(catalogue.commonIds(Supply.ANY)).contains(european).contains(american).hasSize(8);
    for (String id : catalogue.gradeIds()) {
      boolean common = catalogue.commonIds(Supply.ANY).contains(id);
      assertThat(catalogue.grade(id).common()).as(id).isEqualTo(common);
    }
  }

  @Test
  void theChoiceOfCommonGradesReadsNoFileOfAGrade() {
    List<String> opened = new ArrayList<>();
    Catalogue watched =
        new Catalogue(
            file -> {
              opened.add(file);
              return Catalogue.shipped(file);
            });
    watched.commonIds(Supply.EN);
    watched.gradeIds();
    assertThat(opened).containsExactly("grades.csv");
  }

  @Test
  void refusesAnUnknownGradeAndNamesTheKnownOnes() {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> catalogue.grade("music-wier"))
        .withMessageContaining("music-wier")
        .withMessageContaining("hard-drawn, oil-tempered");
  }

  @Test
  void oneGradeOpensOnlyItsOwnFiles() {
    List<String> opened = new ArrayList<>();
    Catalogue watched =
        new Catalogue(
            file -> {
              opened.add(file);
              return Catalogue.shipped(file);
            });
    assertThat(opened).isEmpty();
    WireGrade first = watched.grade("music-wire");
    assertThat(watched.grade("music-wire")).isSameAs(first);
    assertThat(opened)
        .containsExactly(
            "grades.csv",
            "strength-astm-a228.csv",
            "moduli-shigley.csv",
            "tolerance-astm-a228.csv",
            "properties.csv");
  }

  @Test
  void tabulatedPointsAreHitAndPointsBetweenInterpolated() {
    assertMusicWire(0.080, 282);
    assertMusicWire(0.081, 282 - 3 * 1.0 / 5);
    assertMusicWire(0.250, 230);
    assertMusicWire(0.004, 439);
  }

  @Test
  void aStepHoldsUpToAndIncludingItsBound() {
    assertStainless(0.0631, 252);
    assertStainless(0.063, 258);
    assertStainless(0.0001, 325);
    assertThat(catalogue.grade("music-wire").shearModulus().at(0.063 * 25.4))
        .isGreaterThan(catalogue.grade("music-wire").shearModulus().at(0.0631 * 25.4));
  }

  @Test
  void aGradeIsNotDrawnOutsideItsDiameters() {
    WireGrade music = catalogue.grade("music-wire");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> music.drawnTo(WireSize.explicit("7 mm", 7)))
        .withMessageContaining("music-wire");
    assertThatIllegalArgumentException().isThrownBy(() -> music.strength().at(0.1));
    assertThatIllegalArgumentException().isThrownBy(() -> music.strength().at(Double.NaN));
  }

  private void assertMusicWire(double inches, double ksi) {
    assertStrength("music-wire", inches, ksi);
  }

  private void assertStainless(double inches, double ksi) {
    assertStrength("stainless-302", inches, ksi);
  }

  private void assertStrength(String id, double inches, double ksi) {
    double mpa = Dimension.STRESS.unit("ksi").orElseThrow().toInner(ksi);
    assertThat(catalogue.grade(id).strength().at(inches * 25.4))
        .isCloseTo(mpa, Percentage.withPercentage(EXACT));
  }
}
