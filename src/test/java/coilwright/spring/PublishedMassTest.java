package coilwright.spring;

import static coilwright.published.Published.Column.ACTIVE_COILS;
import static coilwright.published.Published.Column.DEAD_COILS;
import static coilwright.published.Published.Column.DENSITY;
import static coilwright.published.Published.Column.MASS;
import static coilwright.published.Published.Column.MEAN_DIAMETER;
import static coilwright.published.Published.Column.WIRE_DIAMETER;
import static org.assertj.core.api.Assertions.assertThat;

import coilwright.published.Published;
import coilwright.unit.Dimension;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Wire length and mass against published springs, whose books take every coil for flat. */
class PublishedMassTest {

  static Stream<Published> springs() {
    return Published.ofGroup("mass", MASS);
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("springs")
  void massIsAsPublished(Published row) {
    double length =
        Coil.wireLength(
            row.inner(MEAN_DIAMETER, Dimension.LENGTH),
            0,
            row.number(ACTIVE_COILS),
            row.number(DEAD_COILS));
    double computed =
        Mass.ofWire(
            row.inner(DENSITY, Dimension.DENSITY),
            row.inner(WIRE_DIAMETER, Dimension.LENGTH),
            length);
    assertThat(computed).isCloseTo(row.inner(MASS, Dimension.MASS), row.closeness());
  }
}
