package coilwright.spring;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** A body that is wound up or unwound keeps its wire: measured along the coil in space. */
class WoundBodyTest {

  /** Each coil lies on the last, so that the pitch is the wire before and after. */
  @ParameterizedTest
  @CsvSource({"8, 4.25, 0.236", "14.4, 6, 1.5", "24, 3, -0.4", "10, 20, 3", "10, 20, -3"})
  void theWireIsAsLongAsBefore(double meanDiameter, double coils, double turns) {
    double wire = 2;
    double before = new Helix(meanDiameter / 2, wire, coils).length();
    double solved =
        new BrentSolver(1e-12, 1e-12)
            .solve(
                200,
                mean -> new Helix(mean / 2, wire, coils + turns).length() - before,
                meanDiameter / 2,
                2 * meanDiameter);
    assertThat(WoundBody.meanDiameter(meanDiameter, coils, turns))
        .isCloseTo(solved, withinPercentage(0.2));
  }

  @ParameterizedTest
  @CsvSource({"8, 4.25, 0.236", "14.4, 6, 1.5", "24, 3, -0.4"})
  void ofAFlatCoilItIsExactlyAsLong(double meanDiameter, double coils, double turns) {
    double mean = WoundBody.meanDiameter(meanDiameter, coils, turns);
    assertThat(new Helix(mean / 2, 0, coils + turns).length())
        .isCloseTo(new Helix(meanDiameter / 2, 0, coils).length(), withinPercentage(1e-6));
  }

  @Test
  void nothingChangesWhereNothingTurns() {
    assertThat(WoundBody.meanDiameter(16, 6, 0)).isEqualTo(16);
    assertThat(WoundBody.length(2, 6, 0)).isEqualTo(14);
  }

  @Test
  void aBodyWoundOffIsNoCoil() {
    assertThat(WoundBody.meanDiameter(16, 6, -6)).isInfinite();
    assertThat(WoundBody.meanDiameter(16, 6, -7)).isInfinite();
    assertThat(WoundBody.length(2, 6, -7)).isEqualTo(2);
  }

  /** Wires lie side by side: those that a cut along the axis meets, at most one more than turns. */
  @ParameterizedTest
  @CsvSource({"4, 0", "4.25, 0.3", "7.5, 1.75", "6, -1.2"})
  void theLengthIsThatOfTheWiresSideBySide(double coils, double turns) {
    double wire = 1.5;
    Helix coil = new Helix(10, wire, coils + turns);
    double reach = coil.at(coils + turns).getZ() - coil.at(0).getZ() + wire;
    assertThat(WoundBody.length(wire, coils, turns)).isCloseTo(reach, within(1e-12));
  }

  /** The handbook's form with the inside diameter in place of D leaves a little more room. */
  @Test
  void theInsideIsTighterThanByTheHandbooksForm() {
    double wire = 1.8288;
    double mean = 13.25245;
    double inside = WoundBody.meanDiameter(mean, 4.25, 0.236) - wire;
    double handbook = 4.25 * (mean - wire) / (4.25 + 0.236);
    assertThat(handbook - inside).isCloseTo(wire * 0.236 / 4.486, within(1e-9)).isPositive();
  }
}
