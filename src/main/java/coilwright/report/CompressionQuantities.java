package coilwright.report;

import coilwright.spring.CompressionState;
import coilwright.spring.LoadState;
import coilwright.unit.Dimension;
import java.util.List;
import java.util.function.ToDoubleFunction;

/** The numbers of a compression spring, each declared once for every output. */
final class CompressionQuantities {

  /** Dimensions and properties, in the order of the output. */
  static final List<Quantity<CompressionState>> SPRING =
      List.of(
          SpringFields.wireDiameter(),
          length("mean_diameter", "mean diameter D", 3, s -> s.spring().meanDiameter()),
          length("outside_diameter", "outside diameter De", 3, s -> s.spring().outsideDiameter()),
          length("inside_diameter", "inside diameter Di", 3, s -> s.spring().insideDiameter()),
          Quantities.number("spring_index", "spring index w", 2, s -> s.spring().springIndex()),
          Quantities.number("active_coils", "active coils n", 2, CompressionState::coils),
          Quantities.number("total_coils", "total coils nt", 2, s -> s.spring().totalCoils()),
          length("free_length", "free length L0", 2, s -> s.spring().freeLength()),
          length("solid_length", "solid length Ls", 2, CompressionState::solidLength),
          length("pitch", "pitch p", 3, s -> s.spring().pitch()),
          Quantities.of(
              "pitch_angle", "pitch angle", Dimension.ANGLE, 2, s -> s.spring().pitchAngle()),
          Quantities.of("rate", "rate R", Dimension.RATE, 4, CompressionState::rate),
          SpringFields.mass(),
          SpringFields.wireLength(),
          SpringFields.cost(),
          Quantities.of(
              "surge_frequency",
              "surge frequency",
              Dimension.FREQUENCY,
              0,
              s -> s.spring().surgeFrequency()),
          SpringFields.tensileStrength(),
          SpringFields.shearModulus(),
          SpringFields.elasticModulus(),
          Quantities.number(
              "stress_correction", "stress correction K", 4, CompressionState::correctionFactor));

  /** What is known at each load. */
  static final List<Quantity<LoadState>> LOAD =
      List.of(
          new Quantity<>("length", "length", Dimension.LENGTH, 2, LoadState::length),
          new Quantity<>("force", "force", Dimension.FORCE, 2, LoadState::force),
          new Quantity<>("deflection", "deflection", Dimension.LENGTH, 2, LoadState::deflection),
          new Quantity<>(
              "shear_stress", "uncorrected stress", Dimension.STRESS, 1, LoadState::shearStress),
          new Quantity<>(
              "corrected_shear_stress",
              "corrected stress",
              Dimension.STRESS,
              1,
              LoadState::correctedShearStress));

  /** The outside diameter grown by compression. */
  static final Quantity<CompressionState> OUTSIDE_DIAMETER_AT_SOLID =
      length(
          "outside_diameter_at_solid",
          "outside diameter at solid",
          3,
          CompressionState::outsideDiameterAtSolid);

  /** The deflection at which it would buckle; infinite where it cannot. */
  static final Quantity<CompressionState> CRITICAL_DEFLECTION =
      length("critical_deflection", "critical deflection", 2, CompressionState::criticalDeflection);

  private CompressionQuantities() {}

  private static Quantity<CompressionState> length(
      String stem, String label, int decimals, ToDoubleFunction<CompressionState> value) {
    return Quantities.of(stem, label, Dimension.LENGTH, decimals, value);
  }
}
