package coilwright.material;

import static coilwright.published.Published.Column.DENSITY;
import static coilwright.published.Published.Column.DIAMETER;
import static coilwright.published.Published.Column.ELASTIC_MODULUS;
import static coilwright.published.Published.Column.GRADE;
import static coilwright.published.Published.Column.MODULUS;
import static coilwright.published.Published.Column.SHEAR_MODULUS;
import static coilwright.published.Published.Column.VALUE;
import static org.assertj.core.api.Assertions.assertThat;

import coilwright.published.Published;
import coilwright.unit.Dimension;
import java.util.stream.Stream;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The shipped moduli and densities against tables and examples of other publications. */
class PublishedModuliTest {

  private static final Catalogue CATALOGUE = Catalogue.load();

  /** A double carries a converted, printed number no better than this [%]. */
  private static final double ROUNDING = 1e-9;

  static Stream<Published> tables() {
    return Stream.of("machinerys-handbook/moduli.csv", "shigley/moduli-si.csv")
        .flatMap(Published::rows);
  }

  static Stream<Published> examples() {
    return Stream.of(
            "machinerys-handbook/moduli-conflicts.csv",
            "trade-tables/moduli.csv",
            "shigley/worked-examples-moduli.csv",
            "shigley/problem-10-3-moduli.csv",
            "mott/worked-examples-moduli.csv",
            "bhandari/concentric-springs-modulus.csv")
        .flatMap(Published::rows);
  }

  static Stream<Published> densities() {
    return Published.rows("trade-tables/densities.csv");
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("tables")
  void moduliAreAsTabulated(Published row) {
    WireGrade grade = CATALOGUE.grade(row.text(GRADE));
    double d = row.inner(DIAMETER, Dimension.LENGTH);
    assertClose(row, grade.elasticModulus().at(d), row.inner(ELASTIC_MODULUS, Dimension.STRESS));
    assertClose(row, grade.shearModulus().at(d), row.inner(SHEAR_MODULUS, Dimension.STRESS));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("examples")
  void modulusIsAsInTheExample(Published row) {
    WireGrade grade = CATALOGUE.grade(row.text(GRADE));
    ModulusLaw law = row.text(MODULUS).equals("G") ? grade.shearModulus() : grade.elasticModulus();
    double d = row.inner(DIAMETER, Dimension.LENGTH);
    assertClose(row, law.at(d), row.inner(VALUE, Dimension.STRESS));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("densities")
  void densityIsAsPublished(Published row) {
    double density = CATALOGUE.grade(row.text(GRADE)).density();
    assertClose(row, density, row.inner(DENSITY, Dimension.DENSITY));
  }

  private static void assertClose(Published row, double shipped, double published) {
    assertThat(shipped)
        .isCloseTo(published, Percentage.withPercentage(100 * row.tolerance() + ROUNDING));
  }
}
