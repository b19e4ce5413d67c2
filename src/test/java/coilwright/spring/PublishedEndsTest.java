package coilwright.spring;

import static coilwright.published.Published.Column.ACTIVE_COILS;
import static coilwright.published.Published.Column.COILS_BEYOND;
import static coilwright.published.Published.Column.ENDS;
import static coilwright.published.Published.Column.FREE_LENGTH;
import static coilwright.published.Published.Column.QUANTITY;
import static coilwright.published.Published.Column.VALUE;
import static coilwright.published.Published.Column.WIRES;
import static coilwright.published.Published.Column.WIRE_DIAMETER;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import coilwright.published.Published;
import coilwright.unit.Dimension;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Coils, solid length and pitch of the four end types against published rules and springs. */
class PublishedEndsTest {

  private static final double ROUNDING = 1e-12;

  static Stream<Published> rules() {
    return Published.ofGroup("solid length and pitch", WIRES);
  }

  static Stream<Published> springs() {
    return Published.ofGroup("solid length and pitch", VALUE);
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("rules")
  void theRuleHolds(Published row) {
    EndType ends = ends(row);
    for (double n : new double[] {3, 7.25, 20}) {
      for (double d : new double[] {0.5, 2}) {
        double pitch = 3.7 * d;
        double coils = n + row.number(COILS_BEYOND);
        double wires = row.number(WIRES) * d;
        double free = pitch * coils + wires;
        switch (row.text(QUANTITY)) {
          case "solid length" ->
              assertThat(ends.solidLength(n, d))
                  .isCloseTo(d * (n + ends.deadCoils()) + wires, within(ROUNDING));
          case "pitch" -> assertThat(ends.pitch(free, d, n)).isCloseTo(pitch, within(ROUNDING));
          default ->
              assertThat(ends.pitch(free, d, n) * coils + wires).isCloseTo(free, within(ROUNDING));
        }
      }
    }
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("springs")
  void theSpringIsAsPublished(Published row) {
    double d = row.inner(WIRE_DIAMETER, Dimension.LENGTH);
    double n = row.number(ACTIVE_COILS);
    double computed =
        switch (row.text(QUANTITY)) {
          case "total coils" -> n + ends(row).deadCoils();
          case "solid length" -> ends(row).solidLength(n, d);
          default -> ends(row).pitch(row.inner(FREE_LENGTH, Dimension.LENGTH), d, n);
        };
    double published =
        row.text(QUANTITY).equals("total coils")
            ? row.number(VALUE)
            : row.inner(VALUE, Dimension.LENGTH);
    assertThat(computed).isCloseTo(published, row.closeness());
  }

  private static EndType ends(Published row) {
    return EndType.of(row.text(ENDS)).orElseThrow();
  }
}
