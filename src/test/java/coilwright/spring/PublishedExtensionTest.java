package coilwright.spring;

import static coilwright.published.Published.Column.A;
import static coilwright.published.Published.Column.ACTIVE_COILS;
import static coilwright.published.Published.Column.B;
import static coilwright.published.Published.Column.C;
import static coilwright.published.Published.Column.CORRECTION;
import static coilwright.published.Published.Column.DEFLECTION;
import static coilwright.published.Published.Column.FORCE;
import static coilwright.published.Published.Column.INDEX;
import static coilwright.published.Published.Column.MEAN_DIAMETER;
import static coilwright.published.Published.Column.QUANTITY;
import static coilwright.published.Published.Column.SHEAR_MODULUS;
import static coilwright.published.Published.Column.STRESS;
import static coilwright.published.Published.Column.VALUE;
import static coilwright.published.Published.Column.WIRE_DIAMETER;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Offset.offset;

import coilwright.material.Wire;
import coilwright.published.Published;
import coilwright.unit.Dimension;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Extension springs against what publications print: their geometry, and the coils of other springs
 * with hooks that add nothing, since a coil does not know which way it is pulled.
 */
class PublishedExtensionTest {

  private static final OptionalDouble NONE = OptionalDouble.empty();
  private static final Hooks STIFF = new Hooks(HookType.FULL_LOOP, 0.5, 0.25, 0);

  static Stream<Published> geometry() {
    return Published.ofGroup("extension geometry", VALUE);
  }

  static Stream<Published> rates() {
    return Published.ofGroup("rate", FORCE);
  }

  static Stream<Published> stresses() {
    return Published.ofGroup("stress", FORCE);
  }

  static Stream<Published> expressions() {
    return Published.ofGroup("stress factors", A)
        .filter(row -> row.text(CORRECTION).equals(StressCorrection.WAHL.id()));
  }

  static Stream<Published> factors() {
    return Published.ofGroup("stress factors", INDEX).filter(row -> row.has(CORRECTION));
  }

  static Stream<Published> differences() {
    return Published.ofGroup("stress factors", QUANTITY);
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("geometry")
  void geometryIsAsPublished(Published row) {
    double value = row.number(VALUE);
    ExtensionSpring spring = spring(SampleWire.of(2), 16, 20, STIFF);
    switch (row.text(QUANTITY)) {
      case "wires beyond the coils" -> assertThat(spring.bodyLength() / 2 - 20).isEqualTo(value);
      case "shortest loop" ->
          assertThat(spring.leastHookLength()).isEqualTo(value * spring.insideDiameter());
      case "usual loop" ->
          assertThat(value * spring.insideDiameter())
              .isBetween(spring.leastHookLength(), STIFF.naturalLength(16, 2));
      default -> throw new IllegalArgumentException(row.toString());
    }
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("rates")
  void rateIsAsPublished(Published row) {
    double d = row.inner(WIRE_DIAMETER, Dimension.LENGTH);
    double mean = row.inner(MEAN_DIAMETER, Dimension.LENGTH);
    double rate = row.inner(FORCE, Dimension.FORCE) / row.inner(DEFLECTION, Dimension.LENGTH);
    ExtensionCurve curve =
        new ExtensionCurve(
            SampleWire.of(d, row.inner(SHEAR_MODULUS, Dimension.STRESS)),
            STIFF,
            HookFit.natural(),
            rate,
            OptionalDouble.of(1),
            0);
    assertThat(curve.meanDiameterAt(row.number(ACTIVE_COILS))).isCloseTo(mean, row.closeness());
    if (mean > 2 * d) { // the benchmark's own unit coil is no coil
      assertThat(spring(curve.wire(), mean, row.number(ACTIVE_COILS), STIFF).rate())
          .isCloseTo(rate, row.closeness());
    }
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("stresses")
  void bodyStressAndTheForceItStandsForAreAsPublished(Published row) {
    double d = row.inner(WIRE_DIAMETER, Dimension.LENGTH);
    double mean = row.inner(MEAN_DIAMETER, Dimension.LENGTH);
    double force = row.inner(FORCE, Dimension.FORCE);
    double stress = row.inner(STRESS, Dimension.STRESS);
    double factor = 1;
    for (StressCorrection each : StressCorrection.values()) {
      factor = each.id().equals(row.text(CORRECTION)) ? each.at(mean / d) : factor;
    }
    assertThat(InitialTension.force(stress / factor, mean, d)).isCloseTo(force, row.closeness());
    if (mean > 2 * d) { // one printed formula has a coil no wider than its wire
      ExtensionState state =
          new ExtensionState(
              spring(SampleWire.of(d), mean, 10, STIFF),
              0,
              new ExtensionDuty(
                  List.of(new LoadPoint(NONE, OptionalDouble.of(force))),
                  row.text(CORRECTION).equals("bergstraesser")
                      ? StressCorrection.BERGSTRAESSER
                      : StressCorrection.WAHL,
                  NONE));
      ExtensionLoad load = state.loads().get(0);
      assertThat(factor == 1 ? load.shearStress() : load.correctedShearStress())
          .isCloseTo(stress, row.closeness());
    }
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("factors")
  void theBodysFactorIsAsPublished(Published row) {
    for (StressCorrection each : StressCorrection.values()) {
      if (each.id().equals(row.text(CORRECTION))) {
        assertThat(factor(row.number(INDEX), each)).isCloseTo(row.number(VALUE), row.closeness());
      }
    }
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("differences")
  void theBodysFactorsDifferAsPublished(Published row) {
    double wahl = factor(row.number(INDEX), StressCorrection.WAHL);
    double bergstraesser = factor(row.number(INDEX), StressCorrection.BERGSTRAESSER);
    assertThat(100 * (wahl - bergstraesser) / wahl).isCloseTo(row.number(VALUE), row.closeness());
  }

  private static double factor(double index, StressCorrection correction) {
    ExtensionState state =
        new ExtensionState(
            spring(SampleWire.of(2), 2 * index, 10, STIFF),
            0,
            new ExtensionDuty(
                List.of(new LoadPoint(NONE, OptionalDouble.of(100))), correction, NONE));
    ExtensionLoad load = state.loads().get(0);
    return load.correctedShearStress() / load.shearStress();
  }

  /** The first part of the printed shear expressions is the curvature of the side bend. */
  @ParameterizedTest(name = "{0}")
  @MethodSource("expressions")
  void theFactorOfTheSideBendIsThePublishedCurvaturePart(Published row) {
    for (double index = 1.5; index <= 20; index += 0.5) {
      double published =
          (row.number(A) * index - row.number(B)) / (row.number(A) * index - row.number(C));
      assertThat(HookStress.torsionFactor(index)).isCloseTo(published, offset(1e-12));
    }
  }

  private static ExtensionSpring spring(Wire wire, double mean, double coils, Hooks hooks) {
    return new ExtensionSpring(
        wire, mean, coils, hooks, hooks.naturalLength(mean, wire.diameter()), 0);
  }
}
