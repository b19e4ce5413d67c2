package coilwright.spring;

import static coilwright.published.Published.Column.ELASTIC_MODULUS;
import static coilwright.published.Published.Column.FREE_LENGTH;
import static coilwright.published.Published.Column.MEAN_DIAMETER;
import static coilwright.published.Published.Column.SEATING;
import static coilwright.published.Published.Column.SHEAR_MODULUS;
import static org.assertj.core.api.Assertions.assertThat;

import coilwright.published.Published;
import coilwright.unit.Dimension;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The slenderness below which a spring cannot buckle, against published values. */
class PublishedBucklingTest {

  static Stream<Published> slendernesses() {
    return Published.ofGroup("buckling", SEATING);
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("slendernesses")
  void theCoilThatCannotBuckleIsAsPublished(Published row) {
    double computed =
        Buckling.alwaysStableMeanDiameter(
            row.inner(FREE_LENGTH, Dimension.LENGTH), factor(row), modulus(row), elastic(row));
    assertThat(computed).isCloseTo(row.inner(MEAN_DIAMETER, Dimension.LENGTH), row.closeness());
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("slendernesses")
  void theCriticalDeflectionBeginsThere(Published row) {
    assertThat(critical(row, 1 - row.tolerance())).isInfinite();
    assertThat(critical(row, 1 + row.tolerance())).isFinite();
  }

  private static double critical(Published row, double longer) {
    return Buckling.criticalDeflection(
        row.inner(MEAN_DIAMETER, Dimension.LENGTH),
        longer * row.inner(FREE_LENGTH, Dimension.LENGTH),
        factor(row),
        modulus(row),
        elastic(row));
  }

  private static double factor(Published row) {
    return Seating.of(row.text(SEATING)).orElseThrow().factor();
  }

  private static double modulus(Published row) {
    return row.inner(SHEAR_MODULUS, Dimension.STRESS);
  }

  private static double elastic(Published row) {
    return row.inner(ELASTIC_MODULUS, Dimension.STRESS);
  }
}
