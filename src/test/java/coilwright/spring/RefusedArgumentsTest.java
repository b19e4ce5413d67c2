package coilwright.spring;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatCode;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import java.util.Arrays;
import java.util.List;
import java.util.function.Function;
import java.util.stream.DoubleStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** No formula takes an argument that is not a number, and none a size that is not above zero. */
class RefusedArgumentsTest {

  private static final double[] NOT_FINITE = {
    Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY
  };

  /**
   * A formula with arguments it accepts.
   *
   * @param name of the formula
   * @param rule for each argument: + above zero, 0 zero or above, . finite
   * @param accepted one number for each sign of the rule
   * @param formula takes the arguments and returns anything
   */
  record Formula(String name, String rule, double[] accepted, Function<double[], Object> formula) {

    @Override
    public String toString() {
      return name;
    }

    private double[] with(int argument, double value) {
      double[] changed = accepted.clone();
      changed[argument] = value;
      return changed;
    }

    private double[] refused(int argument) {
      return switch (rule.charAt(argument)) {
        case '+' ->
            DoubleStream.concat(Arrays.stream(NOT_FINITE), DoubleStream.of(0, -1)).toArray();
        case '0' -> DoubleStream.concat(Arrays.stream(NOT_FINITE), DoubleStream.of(-1)).toArray();
        default -> NOT_FINITE;
      };
    }
  }

  static Stream<Formula> formulas() {
    return Stream.of(
        of("rate", "++++", a -> Rate.of(a[0], a[1], a[2], a[3]), 80_000, 2, 16, 8),
        of("mean diameter", "++++", a -> Rate.meanDiameter(a[0], a[1], a[2], a[3]), 8e4, 2, 5, 8),
        of("active coils", "++++", a -> Rate.activeCoils(a[0], a[1], a[2], a[3]), 8e4, 2, 5, 16),
        of("stress", ".++", a -> ShearStress.uncorrected(a[0], a[1], a[2]), 50, 16, 2),
        of("Wahl", "+", a -> StressCorrection.WAHL.at(a[0]), 8),
        of("Bergstraesser", "+", a -> StressCorrection.BERGSTRAESSER.at(a[0]), 8),
        of("pitch angle", ".+", a -> Coil.pitchAngle(a[0], a[1]), 4, 16),
        of("wire length", "+.+0", a -> Coil.wireLength(a[0], a[1], a[2], a[3]), 16, 4, 8, 2),
        of("growth", "+.+", a -> Coil.meanDiameterAtSolid(a[0], a[1], a[2]), 16, 4, 2),
        of("mass", "+++", a -> Mass.ofWire(a[0], a[1], a[2]), 7850, 2, 500),
        of(
            "surge",
            "+++++",
            a -> Surge.firstFrequency(a[0], a[1], a[2], a[3], a[4]),
            2,
            16,
            8,
            80_000,
            7850),
        of(
            "buckling",
            "+++++",
            a -> Buckling.criticalDeflection(a[0], a[1], a[2], a[3], a[4]),
            16,
            90,
            1,
            80_000,
            200_000),
        of(
            "always stable",
            "++++",
            a -> Buckling.alwaysStableMeanDiameter(a[0], a[1], a[2], a[3]),
            90,
            1,
            80_000,
            200_000),
        of("load line", "++", a -> new LoadLine(a[0], a[1]), 5, 60),
        of(
            "angular rate",
            "+++++",
            a -> AngularRate.of(a[0], a[1], a[2], a[3], a[4]),
            200_000,
            2,
            16,
            6,
            10.8),
        of(
            "diameter times coils",
            "++++",
            a -> AngularRate.diameterTimesCoils(a[0], a[1], a[2], a[3]),
            200_000,
            2,
            300,
            10.8),
        of("bending stress", ".+", a -> BendingStress.uncorrected(a[0], a[1]), 800, 2),
        of("inner factor", "+", a -> BendingFactor.INNER.at(a[0]), 8),
        of("outer factor", "+", a -> BendingFactor.OUTER.at(a[0]), 8),
        of("factor q", "+", a -> BendingFactor.EN_13906.at(a[0]), 8),
        of("wound diameter", "++.", a -> WoundBody.meanDiameter(a[0], a[1], a[2]), 16, 6, 0.3),
        of("wound length", "++.", a -> WoundBody.length(a[0], a[1], a[2]), 2, 6, 0.3),
        of("legs", "00", a -> new Legs(a[0], a[1]), 20, 0),
        of(
            "torsion spring",
            "++",
            a -> new TorsionSpring(SampleWire.of(2), a[0], a[1], new Legs(20, 20)),
            16,
            6),
        of("line of two loads", "....", a -> through(a), 50, 10, 40, 30),
        of("force at a length", ".", a -> new LoadLine(5, 60).forceAt(a[0]), 50),
        of("length under a force", ".", a -> new LoadLine(5, 60).lengthUnder(a[0]), 50),
        of("solid length", "0+", a -> EndType.SQUARED.solidLength(a[0], a[1]), 8, 2),
        of("pitch", "+++", a -> EndType.PLAIN_GROUND.pitch(a[0], a[1], a[2]), 60, 2, 8),
        of("rounding", "0000", a -> new Rounding(a[0], a[1], a[2], a[3]), 0.1, 0.1, 0.01, 0.01),
        of(
            "spring",
            "+++",
            a -> new CompressionSpring(SampleWire.of(2), a[0], a[1], a[2], EndType.SQUARED),
            16,
            8,
            60));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("formulas")
  void badArgumentsAreRefused(Formula formula) {
    assertThatCode(() -> formula.formula.apply(formula.accepted)).doesNotThrowAnyException();
    assertThat(formula.accepted).hasSize(formula.rule.length());
    for (int i = 0; i < formula.accepted.length; i++) {
      for (double value : formula.refused(i)) {
        double[] arguments = formula.with(i, value);
        assertThatIllegalArgumentException()
            .as(formula + " with " + Arrays.toString(arguments))
            .isThrownBy(() -> formula.formula.apply(arguments));
      }
    }
  }

  @Test
  void aCoilNotWiderThanItsWireIsRefused() {
    for (double coil : new double[] {1.9, 2}) {
      assertThatIllegalArgumentException()
          .isThrownBy(() -> new CompressionSpring(SampleWire.of(2), coil, 8, 60, EndType.SQUARED))
          .withMessageContaining("mean diameter");
      assertThatIllegalArgumentException()
          .isThrownBy(() -> Coil.meanDiameterAtSolid(coil, 4, 2))
          .withMessageContaining("mean diameter");
      assertThatIllegalArgumentException()
          .isThrownBy(() -> StressCorrection.WAHL.at(coil / 2))
          .withMessageContaining("spring index");
    }
  }

  @Test
  void aModulusOfShearNotBelowTheElasticOneIsRefused() {
    for (double elastic : new double[] {79_000, 80_000}) {
      assertThatIllegalArgumentException()
          .isThrownBy(() -> Buckling.criticalDeflection(16, 90, 1, 80_000, elastic));
      assertThatIllegalArgumentException()
          .isThrownBy(() -> Buckling.alwaysStableMeanDiameter(90, 1, 80_000, elastic));
    }
  }

  @Test
  void aForceThatFallsWithTheLengthIsRefused() {
    assertThatIllegalArgumentException().isThrownBy(() -> LoadLine.through(50, 30, 40, 10));
    assertThatIllegalArgumentException().isThrownBy(() -> LoadLine.through(50, 10, 50, 30));
  }

  @Test
  void aDutyWithoutLoadsIsRefused() {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new Duty(List.of(), StressCorrection.WAHL, Seating.FIXED_FIXED));
  }

  private static LoadLine through(double[] a) {
    return LoadLine.through(a[0], a[1], a[2], a[3]);
  }

  private static Formula of(
      String name, String rule, Function<double[], Object> formula, double... accepted) {
    return new Formula(name, rule, accepted, formula);
  }
}
