package coilwright.spring;

import static coilwright.published.Published.Column.QUANTITY;
import static coilwright.published.Published.Column.VALUE;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import coilwright.material.Wire;
import coilwright.material.WireSize;
import coilwright.published.Published;
import coilwright.source.Evidence;
import coilwright.unit.Dimension;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** A worked extension spring from a textbook, built by hand and found again along its family. */
class ShigleyExtensionTest {

  private static final double INCH = 25.4;
  private static final double LBF = Dimension.FORCE.unit("lbf").orElseThrow().toInner(1);
  private static final double KSI = Dimension.STRESS.unit("ksi").orElseThrow().toInner(1);
  private static final Wire WIRE =
      new Wire(
          SampleWire.of(1).grade(),
          WireSize.explicit(".035 in", .035 * INCH),
          264.7 * KSI,
          11_500 * KSI,
          28_700 * KSI,
          Evidence.MEMORY);
  private static final Hooks HOOKS =
      new Hooks(
          HookType.FULL_LOOP, .106 / .213, .089 / .213, HookType.FULL_LOOP.activeCoils(11.5, 28.7));
  private static final OptionalDouble NONE = OptionalDouble.empty();

  static Stream<Published> numbers() {
    return Published.ofGroup("extension example", VALUE);
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("numbers")
  void aNumberOfTheExample(Published row) {
    assertThat(number(byHand(), row.text(QUANTITY))).isCloseTo(row.number(VALUE), row.closeness());
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("numbers")
  void theFamilyHasTheSpring(Published row) {
    ExtensionState found = alongItsFamily(byHand());
    assertThat(number(found, row.text(QUANTITY))).isCloseTo(row.number(VALUE), row.closeness());
  }

  private static double number(ExtensionState state, String quantity) {
    ExtensionSpring spring = state.spring();
    ExtensionLoad load = state.loads().get(0);
    InitialTension relation = InitialTension.SHIGLEY;
    return switch (quantity) {
      case "spring index" -> spring.springIndex();
      case "body factor" -> load.correctedShearStress() / load.shearStress();
      case "active coils" -> spring.activeCoils();
      case "rate lbf/in" -> state.rate() / LBF * INCH;
      case "free length in" -> state.freeLength() / INCH;
      case "deflection in" -> load.deflection() / INCH;
      case "initial stress ksi" -> state.initialTensionStress() / KSI;
      case "least preferred ksi" -> relation.least(spring.springIndex()) / KSI;
      case "middle preferred ksi" -> relation.middle(spring.springIndex()) / KSI;
      case "greatest preferred ksi" -> relation.greatest(spring.springIndex()) / KSI;
      case "body stress ksi" -> load.correctedShearStress() / KSI;
      case "loop index" -> spring.bendIndex();
      case "loop factor" -> HookStress.bendingFactor(spring.bendIndex());
      case "loop stress ksi" -> load.hookBendingStress() / KSI;
      case "side index" -> spring.sideIndex();
      case "side factor" -> HookStress.torsionFactor(spring.sideIndex());
      case "side stress ksi" -> load.hookTorsionStress() / KSI;
      default -> throw new IllegalArgumentException(quantity);
    };
  }

  @Test
  void itsInitialTensionLiesInItsRange() {
    ExtensionState state = byHand();
    assertThat(state.initialTension())
        .isBetween(
            state.leastPreferred(InitialTension.SHIGLEY),
            state.greatestPreferred(InitialTension.SHIGLEY));
  }

  private static ExtensionState byHand() {
    double mean = .213 * INCH;
    double wire = .035 * INCH;
    return new ExtensionState(
        new ExtensionSpring(WIRE, mean, 12.17, HOOKS, mean - wire, 0),
        1.19 * LBF,
        duty(List.of(new LoadPoint(NONE, OptionalDouble.of(5.25 * LBF)))));
  }

  private static ExtensionDuty duty(List<LoadPoint> loads) {
    return new ExtensionDuty(loads, StressCorrection.BERGSTRAESSER, NONE);
  }

  /** Its greatest load and the one just as its coils part, asked at their lengths. */
  private static ExtensionState alongItsFamily(ExtensionState known) {
    double longest = known.loads().get(0).length();
    double zero = longest - 5.25 * LBF / known.rate();
    ExtensionCurve curve =
        new ExtensionCurve(
            WIRE, HOOKS, HookFit.natural(), known.rate(), OptionalDouble.of(zero), 0);
    ExtensionFamily family =
        new ExtensionFamily(curve, duty(List.of(LoadPoint.at(longest, 5.25 * LBF))), Rounding.NONE);
    ExtensionState found = family.at(12.17);
    assertThat(found.initialTension()).isCloseTo(1.19 * LBF, within(1e-9));
    assertThat(found.spring().meanDiameter()).isCloseTo(.213 * INCH, within(1e-9));
    return found;
  }
}
