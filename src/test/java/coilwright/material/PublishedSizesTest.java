package coilwright.material;

import static coilwright.published.Published.Column.DIAMETER;
import static coilwright.published.Published.Column.LABEL;
import static coilwright.published.Published.Column.SERIES;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import coilwright.published.Published;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The shipped gauges, in inches, against the same gauges in millimetres and against their law. */
class PublishedSizesTest {

  private static final Catalogue CATALOGUE = Catalogue.load();

  /** Half a unit of the last digit printed in millimetres, and of the inches behind it [mm]. */
  private static final double LAST_DIGITS = 0.0005 + 0.000_05 * 25.4 / 2;

  static Stream<Published> gauges() {
    return Published.ofGroup("wire tables", SERIES);
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("gauges")
  void gaugeIsAsPublished(Published row) {
    WireSize size =
        CATALOGUE.sizes(WireSeries.of(row.text(SERIES)).orElseThrow()).stream()
            .filter(each -> each.label().equals(row.text(LABEL)))
            .findFirst()
            .orElseThrow();
    assertThat(size.diameter()).isCloseTo(row.number(DIAMETER), within(LAST_DIGITS));
  }

  @Test
  void noMusicWireGaugeIsMissing() {
    Stream<Published> printed =
        gauges().filter(row -> row.text(SERIES).equals(WireSeries.MUSIC_WIRE_GAUGE.id()));
    List<WireSize> numbers =
        CATALOGUE.sizes(WireSeries.MUSIC_WIRE_GAUGE).stream()
            .filter(size -> !size.label().startsWith("0."))
            .toList();
    assertThat(printed.count()).isEqualTo(numbers.size());
  }

  /** No. 36 is .005 in, no. 4/0 .46 in, and 39 equal ratios lie between them. */
  @Test
  void brownAndSharpeIsAGeometricSeries() {
    for (WireSize size : CATALOGUE.sizes(WireSeries.BROWN_SHARPE)) {
      double inches = 0.005 * Math.pow(92, (36 - number(size.label())) / 39.0);
      assertThat(size.diameter() / 25.4).as(size.label()).isCloseTo(inches, within(0.000_051));
    }
    assertThat(CATALOGUE.sizes(WireSeries.BROWN_SHARPE)).hasSize(46);
  }

  @Test
  void steelWireGaugeHasEveryNumberAndSteadySteps() {
    List<WireSize> sizes = CATALOGUE.sizes(WireSeries.STEEL_WIRE_GAUGE);
    assertThat(sizes).hasSize(57);
    for (int i = 0; i < sizes.size(); i++) {
      assertThat(number(sizes.get(i).label())).isEqualTo(50 - i);
      double step = i == 0 ? 1.04 : sizes.get(i).diameter() / sizes.get(i - 1).diameter();
      assertThat(step).as(sizes.get(i).label()).isBetween(1.01, 1.19);
    }
  }

  @Test
  void decimalSizesOfMusicWireAreNamedByTheirInches() {
    List<WireSize> decimal =
        CATALOGUE.sizes(WireSeries.MUSIC_WIRE_GAUGE).stream()
            .filter(size -> size.label().startsWith("0."))
            .toList();
    assertThat(decimal).hasSize(25);
    for (WireSize size : decimal) {
      assertThat(Double.parseDouble(size.label()) * 25.4).isEqualTo(size.diameter());
    }
  }

  /** The number of a gauge label; 1/0 counts as 0, 2/0 as -1 and so on. */
  private static int number(String label) {
    int slash = label.indexOf('/');
    return slash < 0 ? Integer.parseInt(label) : 1 - Integer.parseInt(label.substring(0, slash));
  }
}
