package coilwright.spring;

import static coilwright.published.Published.Column.A;
import static coilwright.published.Published.Column.B;
import static coilwright.published.Published.Column.C;
import static coilwright.published.Published.Column.CORRECTION;
import static coilwright.published.Published.Column.E;
import static coilwright.published.Published.Column.F;
import static coilwright.published.Published.Column.INDEX;
import static coilwright.published.Published.Column.QUANTITY;
import static coilwright.published.Published.Column.VALUE;
import static org.assertj.core.api.Assertions.assertThat;

import coilwright.published.Published;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The stress correction factors against published values, differences and expressions. */
class PublishedStressFactorTest {

  static Stream<Published> values() {
    return Published.ofGroup("stress factors", INDEX).filter(row -> row.has(CORRECTION));
  }

  static Stream<Published> differences() {
    return Published.ofGroup("stress factors", QUANTITY);
  }

  static Stream<Published> expressions() {
    return Published.ofGroup("stress factors", A);
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("values")
  void factorIsAsPublished(Published row) {
    assertThat(correction(row).at(row.number(INDEX))).isCloseTo(row.number(VALUE), row.closeness());
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("differences")
  void theFactorsDifferAsPublished(Published row) {
    double wahl = StressCorrection.WAHL.at(row.number(INDEX));
    double bergstraesser = StressCorrection.BERGSTRAESSER.at(row.number(INDEX));
    assertThat(100 * (wahl - bergstraesser) / wahl).isCloseTo(row.number(VALUE), row.closeness());
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("expressions")
  void factorFollowsThePublishedExpression(Published row) {
    for (double index = 1.5; index <= 20; index += 0.5) {
      double published =
          (row.number(A) * index - row.number(B)) / (row.number(A) * index - row.number(C))
              + row.number(E) / (row.number(F) * index);
      assertThat(correction(row).at(index))
          .as("at index " + index)
          .isCloseTo(published, row.closeness());
    }
  }

  private static StressCorrection correction(Published row) {
    return Stream.of(StressCorrection.values())
        .filter(each -> each.id().equals(row.text(CORRECTION)))
        .findFirst()
        .orElseThrow();
  }
}
