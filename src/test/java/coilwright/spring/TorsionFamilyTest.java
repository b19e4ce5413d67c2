package coilwright.spring;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The torsion springs of one wire: on the line when unrounded, as near to it as can be after. */
class TorsionFamilyTest {

  private static final double RATE = 300;
  private static final double FREE = 0.4;
  private static final double[] DEFLECTIONS = {0.5, 1.1, 2.3};
  private static final Rounding COARSE = new Rounding(0.5, 0, 0.5, 0);

  @ParameterizedTest
  @ValueSource(doubles = {0.5, 3, 4.25, 12, 30})
  void everyUnroundedSpringMeetsTheLoads(double coils) {
    for (boolean closing : new boolean[] {true, false}) {
      TorsionState state = family(closing, false, COARSE).at(coils);
      assertThat(state.rate()).isCloseTo(RATE, within(1e-9 * RATE));
      for (int i = 0; i < DEFLECTIONS.length; i++) {
        TorqueState load = state.loads().get(i);
        assertThat(load.torque()).isCloseTo(RATE * DEFLECTIONS[i], within(1e-9 * RATE));
        assertThat(load.deflection()).isCloseTo(DEFLECTIONS[i], within(1e-12));
      }
      assertThat(state.greatest().torque()).isCloseTo(RATE * 2.3, within(1e-9 * RATE));
      assertThat(state.freeAngle()).hasValue(FREE);
    }
  }

  @Test
  void meanDiameterTimesBodyCoilsIsTheSameForAll() {
    TorsionFamily family = family(true, false, COARSE);
    for (double coils : new double[] {1, 4.25, 30}) {
      assertThat(family.at(coils).spring().meanDiameter() * coils)
          .isCloseTo(family.diameterTimesBodyCoils(), within(1e-9));
    }
    assertThat(family.at(family.mostCoils()).spring().springIndex()).isCloseTo(1, within(1e-5));
  }

  /** The springs of a family weigh alike, but for the slope of their coils. */
  @Test
  void massHardlyVaries() {
    TorsionFamily family = family(true, false, COARSE);
    assertThat(family.at(4).spring().springIndex()).isCloseTo(7.9, within(0.1));
    assertThat(family.at(6).mass() / family.at(4).mass()).isBetween(1.0, 1.001);
    assertThat(family.at(4).massHardlyVaries()).isTrue();
  }

  /**
   * No other free angle of the rounded spring comes nearer: turned a little either way, the load
   * that misses most misses more.
   */
  @ParameterizedTest
  @CsvSource({"true, 5", "true, 7.25", "false, 6.5", "false, 11"})
  void aRoundedSpringIsSetToItsLeastGreatestError(boolean closing, double coils) {
    TorsionState rounded = family(closing, false, COARSE).rounded(coils).orElseThrow();
    double setting = rounded.freeAngle().orElseThrow();
    double worst = worst(rounded);
    assertThat(rounded.spring().meanDiameter() % 0.5).isZero();
    assertThat(worst).isPositive();
    for (double turned : new double[] {-1e-4, 1e-4}) {
      TorsionState other = new TorsionState(rounded.spring(), rounded.duty(), setting + turned);
      assertThat(worst(other)).isGreaterThan(worst);
    }
  }

  private static double worst(TorsionState state) {
    double worst = 0;
    for (int i = 0; i < DEFLECTIONS.length; i++) {
      double asked = RATE * DEFLECTIONS[i];
      worst = Math.max(worst, Math.abs(state.loads().get(i).torque() - asked));
    }
    return worst;
  }

  @Test
  void aSingleLoadIsMetByTheSetting() {
    TorsionFamily family = family(true, false, COARSE, 1.5);
    TorsionState rounded = family.rounded(5).orElseThrow();
    assertThat(rounded.rate()).isNotCloseTo(RATE, within(1e-3));
    assertThat(rounded.loads().get(0).torque()).isCloseTo(1.5 * RATE, within(1e-9 * RATE));
  }

  /** Where the legs are asked to stand at an angle the body's fraction of a coil is the setting. */
  @Test
  void legsThatAreAskedLeaveNothingToAdjust() {
    TorsionState rounded = family(true, true, COARSE).rounded(5).orElseThrow();
    assertThat(rounded.freeAngle()).hasValue(FREE);
    assertThat(rounded.loads().get(2).torque())
        .isCloseTo(rounded.rate() * 2.3, within(1e-9 * RATE));
  }

  @Test
  void roundingLeavesNoSpringWhereTheCoilIsNoWiderThanItsWire() {
    TorsionFamily family = family(true, false, new Rounding(5, 0, 5, 0));
    assertThat(family.rounded(0.9 * family.mostCoils())).isEmpty();
  }

  /** Half a step of the diameter moves no stress and no torque by more than the family says. */
  @ParameterizedTest
  @ValueSource(doubles = {3, 6, 9, 12, 16, 25})
  void roundingMovesNoMoreThanSaid(double coils) {
    TorsionFamily family = family(true, false, new Rounding(0.2, 0, 0.2, 0));
    TorqueState exact = family.at(coils).greatest();
    TorqueState rounded = family.rounded(coils).orElseThrow().greatest();
    double share = family.roundingShare(coils);
    assertThat(share).isLessThan(coils < 20 ? 0.3 : 1);
    assertThat(rounded.torque() / exact.torque()).isBetween(1 - share, 1 + share);
    assertThat(rounded.correctedBendingStress() / exact.correctedBendingStress())
        .isBetween(1 - share, 1 + share);
  }

  @Test
  void aWireWhoseLegsAloneAreSofterHasNoFamily() {
    Legs legs = new Legs(40, 40);
    double legsAlone =
        AngularRate.of(SampleWire.ELASTIC_MODULUS, 1.5, 1, legs.diameterTimesCoils(), 10.8);
    assertThat(TorsionFamily.leavesABody(SampleWire.of(1.5), legs, 0.999 * legsAlone, 10.8))
        .isTrue();
    assertThat(TorsionFamily.leavesABody(SampleWire.of(1.5), legs, 1.001 * legsAlone, 10.8))
        .isFalse();
    assertThatIllegalArgumentException()
        .isThrownBy(
            () ->
                new TorsionFamily(
                    SampleWire.of(1.5),
                    legs,
                    1.001 * legsAlone,
                    0,
                    false,
                    duty(true, List.of(point(1, 1))),
                    COARSE));
  }

  private static TorsionFamily family(
      boolean closing, boolean legAngleFixed, Rounding rounding, double... deflections) {
    double[] asked = deflections.length > 0 ? deflections : DEFLECTIONS;
    List<TorquePoint> points = new ArrayList<>();
    for (double deflection : asked) {
      points.add(point(FREE + (closing ? deflection : -deflection), RATE * deflection));
    }
    return new TorsionFamily(
        SampleWire.of(1.5),
        new Legs(20, 15),
        RATE,
        FREE,
        legAngleFixed,
        duty(closing, points),
        rounding);
  }

  private static TorquePoint point(double angle, double torque) {
    return new TorquePoint(OptionalDouble.of(angle), OptionalDouble.of(torque));
  }

  private static TorsionDuty duty(boolean closing, List<TorquePoint> points) {
    return new TorsionDuty(closing, points, true, 10.8, BendingFactor.INNER, 0);
  }
}
