package coilwright.material;

import static coilwright.published.Published.Column.DIAMETER;
import static coilwright.published.Published.Column.LABEL;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import coilwright.published.Published;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The shipped gauge, in inches, against the same gauge printed in millimetres. */
class PublishedSizesTest {

  private static final List<WireSize> GAUGE = Catalogue.load().sizes(WireSeries.MUSIC_WIRE_GAUGE);

  static Stream<Published> gauge() {
    return Published.rows("trade-tables/music-wire-gauge-mm.csv");
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("gauge")
  void gaugeIsAsPublished(Published row) {
    WireSize size =
        GAUGE.stream()
            .filter(each -> each.label().equals(row.text(LABEL)))
            .findFirst()
            .orElseThrow();
    assertThat(size.diameter()).isCloseTo(row.number(DIAMETER), within(0.0005 + 1e-9));
  }

  @Test
  void noGaugeIsMissing() {
    assertThat(gauge().count()).isEqualTo(GAUGE.size());
  }
}
