package coilwright.spring;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** How a spring answers when its lengths, its wire, its coil or its count change. */
class ScalingTest {

  private static final double EXACT = 1e-12;

  @ParameterizedTest
  @EnumSource
  void twiceAsLargeInEveryLength(EndType ends) {
    CompressionSpring small = spring(1.4, 12.2, 8, 38.7, ends);
    CompressionSpring large = spring(2.8, 24.4, 8, 77.4, ends);
    assertRatio(large.rate(), small.rate(), 2);
    assertRatio(large.mass(), small.mass(), 8);
    assertRatio(stress(large, 10), stress(small, 10), 0.25);
    assertRatio(large.surgeFrequency(), small.surgeFrequency(), 0.5);
    assertRatio(ends.solidLength(8, 2.8), ends.solidLength(8, 1.4), 2);
    assertRatio(large.pitch(), small.pitch(), 2);
    assertRatio(large.wireLength(), small.wireLength(), 2);
    assertRatio(atSolid(large), atSolid(small), 2);
    assertRatio(critical(large), critical(small), 2);
    assertRatio(large.pitchAngle(), small.pitchAngle(), 1);
    assertRatio(large.springIndex(), small.springIndex(), 1);
  }

  @Test
  void rateGoesWithThePowersOfItsTerms() {
    double rate = Rate.of(80_000, 1.5, 12, 7);
    assertRatio(Rate.of(80_000, 3, 12, 7), rate, 16);
    assertRatio(Rate.of(80_000, 1.5, 24, 7), rate, 1.0 / 8);
    assertRatio(Rate.of(80_000, 1.5, 12, 21), rate, 1.0 / 3);
    assertRatio(Rate.of(40_000, 1.5, 12, 7), rate, 0.5);
  }

  @Test
  void theRateSolvedForCoilOrCountGivesTheRateBack() {
    double rate = Rate.of(80_000, 1.5, 12, 7);
    assertThat(Rate.meanDiameter(80_000, 1.5, rate, 7)).isCloseTo(12, within(EXACT * 12));
    assertThat(Rate.activeCoils(80_000, 1.5, rate, 12)).isCloseTo(7, within(EXACT * 7));
  }

  @Test
  void stressGoesWithForceCoilAndWire() {
    double stress = ShearStress.uncorrected(20, 12, 1.5);
    assertRatio(ShearStress.uncorrected(60, 12, 1.5), stress, 3);
    assertRatio(ShearStress.uncorrected(-20, 12, 1.5), stress, -1);
    assertRatio(ShearStress.uncorrected(20, 24, 1.5), stress, 2);
    assertRatio(ShearStress.uncorrected(20, 12, 3), stress, 1.0 / 8);
  }

  @Test
  void frequencyGoesWithThePowersOfItsTerms() {
    double frequency = Surge.firstFrequency(1.5, 12, 7, 80_000, 7850);
    assertRatio(Surge.firstFrequency(3, 12, 7, 80_000, 7850), frequency, 2);
    assertRatio(Surge.firstFrequency(1.5, 24, 7, 80_000, 7850), frequency, 0.25);
    assertRatio(Surge.firstFrequency(1.5, 12, 14, 80_000, 7850), frequency, 0.5);
    assertRatio(Surge.firstFrequency(1.5, 12, 7, 320_000, 7850), frequency, 2);
    assertRatio(Surge.firstFrequency(1.5, 12, 7, 80_000, 4 * 7850), frequency, 0.5);
  }

  /** The law knows a seating only by nu L0, and gives the deflection as a share of L0. */
  @ParameterizedTest
  @EnumSource
  void aSeatingIsALongerOrShorterSpring(Seating seating) {
    double pivoted = critical(60, Seating.PINNED_PINNED) / 60;
    double length = 60 / seating.factor();
    assertRatio(critical(length, seating) / length, pivoted, 1);
  }

  private static void assertRatio(double value, double to, double ratio) {
    assertThat(value / to).isCloseTo(ratio, within(EXACT * Math.abs(ratio)));
  }

  private static double stress(CompressionSpring spring, double force) {
    return ShearStress.uncorrected(force, spring.meanDiameter(), spring.wireDiameter());
  }

  private static double critical(CompressionSpring spring) {
    return spring.criticalDeflection(Seating.PINNED_PINNED);
  }

  private static double critical(double freeLength, Seating seating) {
    return Buckling.criticalDeflection(10, freeLength, seating.factor(), 80_000, 200_000);
  }

  private static CompressionSpring spring(
      double wire, double coil, double coils, double freeLength, EndType ends) {
    return new CompressionSpring(SampleWire.of(wire), coil, coils, freeLength, ends);
  }

  private static double atSolid(CompressionSpring spring) {
    return Method.HANDBOOK.outsideDiameterAtSolid(
        spring.meanDiameter(), spring.pitch(), spring.wireDiameter(), 0);
  }
}
