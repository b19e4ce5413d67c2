package coilwright.spring;

import static coilwright.published.Published.Column.ACTIVE_COILS;
import static coilwright.published.Published.Column.DEFLECTION;
import static coilwright.published.Published.Column.FORCE;
import static coilwright.published.Published.Column.MEAN_DIAMETER;
import static coilwright.published.Published.Column.SHEAR_MODULUS;
import static coilwright.published.Published.Column.WIRE_DIAMETER;
import static org.assertj.core.api.Assertions.assertThat;

import coilwright.published.Published;
import coilwright.unit.Dimension;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The rate, and the two quantities it is solved for, against published springs. */
class PublishedRateTest {

  static Stream<Published> springs() {
    return Published.ofGroup("rate", FORCE);
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("springs")
  void rateIsAsPublished(Published row) {
    double computed = Rate.of(modulus(row), wire(row), coil(row), row.number(ACTIVE_COILS));
    assertThat(computed).isCloseTo(rate(row), row.closeness());
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("springs")
  void activeCoilsAreAsPublished(Published row) {
    double computed = Rate.activeCoils(modulus(row), wire(row), rate(row), coil(row));
    assertThat(computed).isCloseTo(row.number(ACTIVE_COILS), row.closeness());
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("springs")
  void meanDiameterIsAsPublished(Published row) {
    double computed =
        Rate.meanDiameter(modulus(row), wire(row), rate(row), row.number(ACTIVE_COILS));
    assertThat(computed).isCloseTo(coil(row), row.closeness());
  }

  private static double modulus(Published row) {
    return row.inner(SHEAR_MODULUS, Dimension.STRESS);
  }

  private static double wire(Published row) {
    return row.inner(WIRE_DIAMETER, Dimension.LENGTH);
  }

  private static double coil(Published row) {
    return row.inner(MEAN_DIAMETER, Dimension.LENGTH);
  }

  private static double rate(Published row) {
    return row.inner(FORCE, Dimension.FORCE) / row.inner(DEFLECTION, Dimension.LENGTH);
  }
}
