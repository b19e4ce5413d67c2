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
            "stainless-302",
            "en-10270-1-sm",
            "en-10270-1-sh");
  }

  @Test
  void supplyAndSeriesGoTogether() {
    for (String id : catalogue.gradeIds()) {
      boolean european = id.startsWith("en-");
      WireGrade grade = catalogue.grade(id);
      assertThat(grade.common()).as(id).isTrue();
      assertThat(grade.supply()).as(id).isEqualTo(european ? Supply.EN : Supply.US);
      assertThat(grade.usualSeries())
          .as(id)
          .containsExactly(european ? WireSeries.METRIC : WireSeries.MUSIC_WIRE_GAUGE);
    }
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
