package coilwright.report;

import static coilwright.unit.Dimension.ANGLE;
import static coilwright.unit.Dimension.ANGULAR_RATE;
import static coilwright.unit.Dimension.LENGTH;
import static coilwright.unit.Dimension.STRESS;
import static coilwright.unit.Dimension.TORQUE;

import coilwright.spring.TorqueState;
import coilwright.spring.TorsionState;
import java.util.List;

/** The numbers of a torsion spring, each declared once for every output. */
final class TorsionQuantities {

  /** Dimensions and properties, in the order of the output. */
  static final List<Quantity<TorsionState>> SPRING =
      List.of(
          SpringFields.wireDiameter(),
          Quantities.of(
              "mean_diameter", "mean diameter D", LENGTH, 3, s -> s.spring().meanDiameter()),
          Quantities.of(
              "outside_diameter",
              "outside diameter De",
              LENGTH,
              3,
              s -> s.spring().outsideDiameter()),
          Quantities.of(
              "inside_diameter", "inside diameter Di", LENGTH, 3, s -> s.spring().insideDiameter()),
          Quantities.number("spring_index", "spring index w", 2, s -> s.spring().springIndex()),
          Quantities.number("body_coils", "body coils nb", 3, TorsionState::coils),
          Quantities.number("active_coils", "active coils n", 3, s -> s.spring().activeCoils()),
          Quantities.of("body_length", "body length", LENGTH, 2, TorsionState::freeBodyLength),
          Quantities.of("first_leg", "first leg", LENGTH, 2, s -> s.spring().legs().first()),
          Quantities.of("second_leg", "second leg", LENGTH, 2, s -> s.spring().legs().second()),
          Quantities.of("rate", "rate R", ANGULAR_RATE, 4, TorsionState::rate),
          Quantities.of(
              "free_angle", "free angle", ANGLE, 2, s -> s.freeAngle().orElse(Double.NaN)),
          Quantities.of("leg_angle", "leg angle, free", ANGLE, 2, TorsionState::freeLegAngle),
          SpringFields.mass(),
          SpringFields.wireLength(),
          SpringFields.cost(),
          SpringFields.tensileStrength(),
          SpringFields.shearModulus(),
          SpringFields.elasticModulus(),
          Quantities.number(
              "stress_correction",
              "stress correction K",
              4,
              s -> s.duty().factor().at(s.spring().springIndex())));

  /** What is known at each load. */
  static final List<Quantity<TorqueState>> LOAD =
      List.of(
          Quantities.of("angle", "angle", ANGLE, 2, load -> load.angle().orElse(Double.NaN)),
          Quantities.of("torque", "torque", TORQUE, 1, TorqueState::torque),
          Quantities.of("deflection", "deflection", ANGLE, 2, TorqueState::deflection),
          Quantities.of(
              "bending_stress", "uncorrected stress", STRESS, 1, TorqueState::bendingStress),
          Quantities.of(
              "corrected_bending_stress",
              "corrected stress",
              STRESS,
              1,
              TorqueState::correctedBendingStress),
          Quantities.of(
              "inside_diameter", "inside diameter", LENGTH, 3, TorqueState::insideDiameter),
          Quantities.of(
              "outside_diameter", "outside diameter", LENGTH, 3, TorqueState::outsideDiameter),
          Quantities.of("body_length", "body length", LENGTH, 2, TorqueState::bodyLength));

  private TorsionQuantities() {}
}
