package coilwright.material;

import static coilwright.published.Published.Column.DIAMETER;
import static coilwright.published.Published.Column.GRADE;
import static coilwright.published.Published.Column.MAXIMUM;
import static coilwright.published.Published.Column.STRENGTH;
import static coilwright.published.Published.Column.TOLERANCE;
import static coilwright.published.Published.Column.WIDTH;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import coilwright.published.Published;
import coilwright.unit.Dimension;
import java.util.stream.Stream;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * The shipped wire tables against other tables of the same wire: in other units, of the other end
 * of the band, before ageing, and as a span.
 */
class PublishedWireTablesTest {

  private static final Catalogue CATALOGUE = Catalogue.load();

  /** What is left of a printed number after conversion, as a share and in MPa. */
  private static final double ROUNDING = 1e-9;

  static Stream<Published> apart() {
    return Published.ofGroup("wire tables", WIDTH);
  }

  static Stream<Published> otherUnits() {
    return Published.ofGroup("wire tables", STRENGTH)
        .filter(row -> row.has(DIAMETER) && !row.has(WIDTH));
  }

  static Stream<Published> spans() {
    return Published.ofGroup("wire tables", STRENGTH).filter(row -> !row.has(DIAMETER));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("apart")
  void strengthIsApartFromTheOtherColumnByItsWidth(Published row) {
    double width = row.inner(WIDTH, Dimension.STRESS);
    double shipped =
        row.has(MAXIMUM)
            ? row.inner(MAXIMUM, Dimension.STRESS) - width
            : row.inner(STRENGTH, Dimension.STRESS) + width;
    double tolerance = row.inner(TOLERANCE, Dimension.STRESS) + 1000 * ROUNDING;
    assertThat(strength(row)).isCloseTo(shipped, within(tolerance));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("otherUnits")
  void strengthIsAsInTheTableOfOtherUnits(Published row) {
    assertThat(strength(row))
        .isCloseTo(
            row.inner(STRENGTH, Dimension.STRESS),
            Percentage.withPercentage(100 * row.tolerance() + ROUNDING));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("spans")
  void everyStrengthLiesInThePublishedSpan(Published row) {
    WireGrade grade = CATALOGUE.grade(row.text(GRADE));
    double least = row.inner(STRENGTH, Dimension.STRESS) - 1000 * ROUNDING;
    double greatest = row.inner(MAXIMUM, Dimension.STRESS) + 1000 * ROUNDING;
    int tried = 0;
    for (WireSize size : CATALOGUE.sizes(grade.usualSeries().get(0))) {
      if (grade.diameters().contains(size.diameter())) {
        double mpa = grade.strength().at(size.diameter());
        assertThat(mpa).as(size.label()).isBetween(least, greatest);
        tried++;
      }
    }
    assertThat(tried).isGreaterThan(20);
    assertThat(grade.strength().at(grade.diameters().max())).isBetween(least, greatest);
  }

  private static double strength(Published row) {
    WireGrade grade = CATALOGUE.grade(row.text(GRADE));
    return grade.strength().at(row.inner(DIAMETER, Dimension.LENGTH));
  }
}
