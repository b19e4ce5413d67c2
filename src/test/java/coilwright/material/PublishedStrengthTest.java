package coilwright.material;

import static coilwright.published.Published.Column.A;
import static coilwright.published.Published.Column.B;
import static coilwright.published.Published.Column.C;
import static coilwright.published.Published.Column.DIAMETER;
import static coilwright.published.Published.Column.DIAMETER_MAX;
import static coilwright.published.Published.Column.DIAMETER_MIN;
import static coilwright.published.Published.Column.E;
import static coilwright.published.Published.Column.F;
import static coilwright.published.Published.Column.GRADE;
import static coilwright.published.Published.Column.M;
import static coilwright.published.Published.Column.MAXIMUM;
import static coilwright.published.Published.Column.STRENGTH;
import static org.assertj.core.api.Assertions.assertThat;

import coilwright.published.Published;
import coilwright.unit.Dimension;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.Stream;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The shipped strengths against tables, examples and fits of other publications. */
class PublishedStrengthTest {

  private static final Catalogue CATALOGUE = Catalogue.load();

  /** A double carries a converted, printed number no better than this [%]. */
  private static final double ROUNDING = 1e-9;

  /** What the page's maxima are of its minima, within half a percent [-]. */
  private static final double MAXIMUM_OVER_MINIMUM = 1.105;

  static Stream<Published> points() {
    return Stream.of(
            "en-10270-1/minimum-strength-sm.csv",
            "en-10270-1/minimum-strength-dh.csv",
            "en-10270-1/minimum-strength-sh.csv",
            "astm-a313/minimum-strength-302-si.csv",
            "shigley/worked-examples-strength.csv",
            "shigley/problem-10-3-strength.csv")
        .flatMap(Published::rows);
  }

  static Stream<Published> maxima() {
    return Published.rows("astm-a228/maximum-strength.csv");
  }

  static Stream<Published> powerLaws() {
    return Stream.of(
            "shigley/power-laws.csv",
            "shigley/power-laws-memory.csv",
            "norton/power-laws.csv",
            "norton/power-laws-memory.csv")
        .flatMap(Published::rows);
  }

  static Stream<Published> rationalFits() {
    return Published.rows("university-text/rational-fits.csv");
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("points")
  void strengthIsAsPublished(Published row) {
    double d = row.inner(DIAMETER, Dimension.LENGTH);
    double mpa = row.inner(STRENGTH, Dimension.STRESS);
    assertStrength(row, d, mpa);
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("powerLaws")
  void strengthIsNearThePowerLaw(Published row) {
    assertAlong(row, d -> row.number(A) / Math.pow(d, row.number(M)));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("rationalFits")
  void strengthIsNearTheRationalFit(Published row) {
    assertAlong(
        row,
        d ->
            (row.number(A) + d * (row.number(B) + d * row.number(C)))
                / (1 + d * (row.number(E) + d * row.number(F))));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("maxima")
  void theBandIsAsWideAsPublished(Published row) {
    double d = row.inner(DIAMETER, Dimension.LENGTH);
    double mpa = row.inner(MAXIMUM, Dimension.STRESS);
    assertStrength(row, d, mpa / MAXIMUM_OVER_MINIMUM);
  }

  private static void assertAlong(Published row, DoubleUnaryOperator published) {
    double from = row.number(DIAMETER_MIN);
    double to = row.number(DIAMETER_MAX);
    for (int i = 0; i <= 40; i++) {
      double d = from + (to - from) * i / 40;
      double shipped = CATALOGUE.grade(row.text(GRADE)).strength().at(d);
      assertThat(published.applyAsDouble(d))
          .as("at " + d + " mm")
          .isCloseTo(shipped, Percentage.withPercentage(100 * row.tolerance()));
    }
  }

  private static void assertStrength(Published row, double diameter, double published) {
    assertThat(CATALOGUE.grade(row.text(GRADE)).strength().at(diameter))
        .as("at " + diameter + " mm")
        .isCloseTo(published, Percentage.withPercentage(100 * row.tolerance() + ROUNDING));
  }
}
