package coilwright.spring;

import static coilwright.published.Published.Column.ACTIVE_COILS;
import static coilwright.published.Published.Column.DENSITY;
import static coilwright.published.Published.Column.FREQUENCY;
import static coilwright.published.Published.Column.MEAN_DIAMETER;
import static coilwright.published.Published.Column.SHEAR_MODULUS;
import static coilwright.published.Published.Column.WIRE_DIAMETER;
import static org.assertj.core.api.Assertions.assertThat;

import coilwright.published.Published;
import coilwright.unit.Dimension;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The first natural frequency against published springs; all are from memory. */
class PublishedSurgeTest {

  static Stream<Published> springs() {
    return Published.ofGroup("surge", FREQUENCY);
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("springs")
  void frequencyIsAsPublished(Published row) {
    double computed =
        Surge.firstFrequency(
            row.inner(WIRE_DIAMETER, Dimension.LENGTH),
            row.inner(MEAN_DIAMETER, Dimension.LENGTH),
            row.number(ACTIVE_COILS),
            row.inner(SHEAR_MODULUS, Dimension.STRESS),
            row.inner(DENSITY, Dimension.DENSITY));
    assertThat(computed).isCloseTo(row.inner(FREQUENCY, Dimension.FREQUENCY), row.closeness());
  }
}
