package coilwright.material;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import coilwright.source.Evidence;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** What a wire may differ from its nominal diameter by. */
class DiameterToleranceTest {

  private static final Catalogue CATALOGUE = Catalogue.load();

  /** What rounds class T4 to the table: 3 um up to 0.1 mm, a fifth of the figure above. */
  private static final double ROUNDING_OF_T4 = 0.2;

  static Stream<String> grades() {
    return CATALOGUE.gradeIds().stream();
  }

  @ParameterizedTest
  @CsvSource({
    "music-wire, 0.010, 0.0002",
    "music-wire, 0.011, 0.0003",
    "music-wire, 0.063, 0.0004",
    "music-wire, 0.064, 0.0005",
    "music-wire, 0.250, 0.001",
    "hard-drawn, 0.075, 0.001",
    "oil-tempered, 0.0751, 0.002",
    "oil-tempered, 0.625, 0.003"
  })
  void stepsHoldUpToAndIncludingTheirBound(String id, double inches, double tolerance) {
    Wire wire = wire(id, inches * 25.4);
    assertThat(wire.diameterTolerance()).isCloseTo(tolerance * 25.4, within(1e-12));
    assertThat(wire.diameterToleranceEvidence()).isEqualTo(Evidence.SEEN);
  }

  @Test
  void aSizeBetweenTwoBandsTakesTheBandOfTheThickerWire() {
    assertThat(wire("en-10270-1-sm", 1.70).diameterTolerance()).isEqualTo(0.020);
    assertThat(wire("en-10270-1-sm", 1.75).diameterTolerance()).isEqualTo(0.025);
  }

  /** The classes of the standard are 0.015 and 0.021 times the root of the diameter. */
  @ParameterizedTest
  @CsvSource({"0.30, 0.015", "1, 0.015", "2, 0.015", "5, 0.015", "9, 0.015", "11, 0.015"})
  void theTableFollowsTheRootOfTheDiameter(double d, double factor) {
    double byClass = factor * Math.sqrt(d);
    double tabulated = CATALOGUE.grade("en-10270-1-sm").diameterTolerance().at(d);
    assertThat(tabulated).isCloseTo(byClass, within(ROUNDING_OF_T4 * byClass));
  }

  @Test
  void aboveElevenMillimetresTheWiderClassHolds() {
    double tabulated = CATALOGUE.grade("en-10270-1-sm").diameterTolerance().at(16);
    assertThat(tabulated).isCloseTo(0.021 * Math.sqrt(16), within(0.1 * 0.084));
  }

  @Test
  void outsideItsTableAToleranceIsTheSameShareAndFromMemory() {
    ToleranceLaw law = CATALOGUE.grade("music-wire").diameterTolerance();
    assertThat(law.at(12.7)).isCloseTo(0.0254 * 2, within(1e-12));
    assertThat(law.at(0.0508)).isCloseTo(0.00508 / 2, within(1e-12));
    assertThat(law.evidenceAt(12.7)).isEqualTo(Evidence.MEMORY);
    assertThat(law.evidenceAt(0.0508)).isEqualTo(Evidence.MEMORY);
    assertThatIllegalArgumentException().isThrownBy(() -> law.at(Double.NaN));
    assertThatIllegalArgumentException().isThrownBy(() -> law.at(0));
  }

  @Test
  void aTakenToleranceIsFromMemoryAndMakesNoWireOneFromMemory() {
    Wire wire = wire("stainless-302", 1);
    assertThat(wire.diameterToleranceEvidence()).isEqualTo(Evidence.MEMORY);
    assertThat(wire.evidence()).isEqualTo(Evidence.SEEN);
  }

  @ParameterizedTest
  @MethodSource("grades")
  void everySizeHasAToleranceWellUnderItsDiameter(String id) {
    WireGrade grade = CATALOGUE.grade(id);
    for (WireSeries series : WireSeries.values()) {
      for (WireSize size : CATALOGUE.sizes(series)) {
        if (grade.diameters().contains(size.diameter())) {
          double tolerance = grade.drawnTo(size).diameterTolerance();
          assertThat(tolerance / size.diameter()).as(size.label()).isBetween(0.002, 0.06);
        }
      }
    }
  }

  private static Wire wire(String id, double diameter) {
    return CATALOGUE.grade(id).drawnTo(WireSize.explicit("any", diameter));
  }
}
