package coilwright.spring;

import static coilwright.published.Published.Column.ACTIVE_COILS;
import static coilwright.published.Published.Column.BASIS;
import static coilwright.published.Published.Column.BODY_COILS;
import static coilwright.published.Published.Column.CONSTANT;
import static coilwright.published.Published.Column.ELASTIC_MODULUS;
import static coilwright.published.Published.Column.INDEX;
import static coilwright.published.Published.Column.LEGS;
import static coilwright.published.Published.Column.MEAN_DIAMETER;
import static coilwright.published.Published.Column.QUANTITY;
import static coilwright.published.Published.Column.RATE;
import static coilwright.published.Published.Column.STRESS;
import static coilwright.published.Published.Column.TORQUE;
import static coilwright.published.Published.Column.TURNS;
import static coilwright.published.Published.Column.VALUE;
import static coilwright.published.Published.Column.WIRE_DIAMETER;
import static org.assertj.core.api.Assertions.assertThat;

import coilwright.published.Published;
import coilwright.unit.Dimension;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Rate, deflection, body and stress of torsion springs against published ones. */
class PublishedTorsionTest {

  static Stream<Published> rates() {
    return Published.ofGroup("angular rate", RATE);
  }

  static Stream<Published> deflections() {
    return Published.ofGroup("angular rate", TURNS);
  }

  static Stream<Published> constants() {
    return Published.ofGroup("angular rate", BASIS);
  }

  static Stream<Published> bodies() {
    return Published.ofGroup("torsion body", TURNS);
  }

  static Stream<Published> legs() {
    return Published.ofGroup("torsion body", LEGS);
  }

  static Stream<Published> scopes() {
    return Published.rows("unnamed-pages/en-13906-3-scope.csv");
  }

  static Stream<Published> stresses() {
    return Published.ofGroup("bending stress", STRESS);
  }

  static Stream<Published> stressConstants() {
    return Published.ofGroup("bending stress", QUANTITY);
  }

  static Stream<Published> tolerances() {
    return Published.ofGroup("torsion coil tolerance", VALUE);
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("rates")
  void rateIsAsPublished(Published row) {
    assertThat(rate(row)).isCloseTo(row.inner(RATE, Dimension.ANGULAR_RATE), row.closeness());
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("rates")
  void diameterTimesCoilsIsAsPublished(Published row) {
    double computed =
        AngularRate.diameterTimesCoils(
            row.inner(ELASTIC_MODULUS, Dimension.STRESS),
            wire(row),
            row.inner(RATE, Dimension.ANGULAR_RATE),
            row.number(CONSTANT));
    assertThat(computed).isCloseTo(coil(row) * row.number(ACTIVE_COILS), row.closeness());
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("deflections")
  void turnsAreAsPublished(Published row) {
    double turns = row.inner(TORQUE, Dimension.TORQUE) / rate(row) / (2 * Math.PI);
    assertThat(turns).isCloseTo(row.number(TURNS), row.closeness());
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("constants")
  void constantIsAsPublished(Published row) {
    double constant =
        row.text(BASIS).equals("handbook") ? AngularRate.HANDBOOK : AngularRate.FRICTIONLESS;
    double asked = row.text(QUANTITY).equals("per degree") ? 360 * constant : constant;
    assertThat(asked).isCloseTo(row.number(VALUE), row.closeness());
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("bodies")
  void bodyUnderLoadIsAsPublished(Published row) {
    double coils = row.number(BODY_COILS);
    double turns = row.number(TURNS);
    double mean = WoundBody.meanDiameter(coil(row), coils, turns);
    double computed =
        switch (row.text(QUANTITY)) {
          case "mean diameter" -> mean;
          case "inside diameter" -> mean - wire(row);
          default -> WoundBody.length(wire(row), coils, turns);
        };
    assertThat(computed).isCloseTo(row.inner(VALUE, Dimension.LENGTH), row.closeness());
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("legs")
  void activeCoilsAreAsPublished(Published row) {
    double both = row.inner(LEGS, Dimension.LENGTH);
    TorsionSpring spring =
        new TorsionSpring(
            SampleWire.of(1), coil(row), row.number(BODY_COILS), new Legs(both / 2, both / 2));
    assertThat(spring.activeCoils()).isCloseTo(row.number(ACTIVE_COILS), row.closeness());
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("scopes")
  void fewCoilsAreFewerThanTheStandardCovers(Published row) {
    assertThat(TorsionState.FEW_COILS).isEqualTo(row.number(VALUE));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("stresses")
  void innerStressAndFactorAreAsPublished(Published row) {
    double factor = BendingFactor.INNER.at(row.number(INDEX));
    double stress = BendingStress.uncorrected(row.inner(TORQUE, Dimension.TORQUE), wire(row));
    assertThat(factor).isCloseTo(row.number(VALUE), row.closeness());
    assertThat(factor * stress).isCloseTo(row.inner(STRESS, Dimension.STRESS), row.closeness());
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("stressConstants")
  void stressOfAStraightBarIsAsPublished(Published row) {
    assertThat(BendingStress.uncorrected(1, 1)).isCloseTo(row.number(VALUE), row.closeness());
  }

  /**
   * Where a file gives no clearance, the tolerance of another standard, for compression springs,
   * stands in. It covers what handbooks print for torsion springs.
   */
  @ParameterizedTest(name = "{0}")
  @MethodSource("tolerances")
  void theAssumedClearanceCoversThePublishedTolerance(Published row) {
    double assumed = CoilTolerance.of(row.number(INDEX) * wire(row), wire(row));
    assertThat(assumed).isGreaterThan(row.inner(VALUE, Dimension.LENGTH));
  }

  private static double rate(Published row) {
    return AngularRate.of(
        row.inner(ELASTIC_MODULUS, Dimension.STRESS),
        wire(row),
        coil(row),
        row.number(ACTIVE_COILS),
        row.number(CONSTANT));
  }

  private static double wire(Published row) {
    return row.inner(WIRE_DIAMETER, Dimension.LENGTH);
  }

  private static double coil(Published row) {
    return row.inner(MEAN_DIAMETER, Dimension.LENGTH);
  }
}
