package coilwright.report;

import static coilwright.unit.Dimension.FORCE;
import static coilwright.unit.Dimension.FREQUENCY;
import static coilwright.unit.Dimension.LENGTH;
import static coilwright.unit.Dimension.RATE;
import static coilwright.unit.Dimension.STRESS;

import coilwright.spring.ExtensionLoad;
import coilwright.spring.ExtensionState;
import coilwright.spring.InitialTension;
import java.util.List;
import java.util.function.ToDoubleFunction;

/** The numbers of an extension spring, each declared once for every output. */
final class ExtensionQuantities {

  /** Dimensions and properties, in the order of the output. */
  static final List<Quantity<ExtensionState>> SPRING =
      List.of(
          SpringFields.wireDiameter(),
          length("mean_diameter", "mean diameter D", 3, s -> s.spring().meanDiameter()),
          length("outside_diameter", "outside diameter De", 3, s -> s.spring().outsideDiameter()),
          length("inside_diameter", "inside diameter Di", 3, s -> s.spring().insideDiameter()),
          Quantities.number("spring_index", "spring index w", 2, s -> s.spring().springIndex()),
          Quantities.number("body_coils", "body coils nb", 2, ExtensionState::coils),
          Quantities.number("active_coils", "active coils n", 3, s -> s.spring().activeCoils()),
          length("body_length", "body length", 2, s -> s.spring().bodyLength()),
          length("hook_length", "hook length, each", 2, s -> s.spring().hookLength()),
          length("free_length", "free length L0 inside hooks", 2, ExtensionState::freeLength),
          Quantities.of("rate", "rate R", RATE, 4, ExtensionState::rate),
          Quantities.of(
              "initial_tension", "initial tension F0", FORCE, 2, ExtensionState::initialTension),
          Quantities.of(
              "initial_tension_stress",
              "its uncorrected stress",
              STRESS,
              1,
              ExtensionState::initialTensionStress),
          SpringFields.mass(),
          SpringFields.wireLength(),
          SpringFields.cost(),
          Quantities.of(
              "surge_frequency", "surge frequency", FREQUENCY, 0, s -> s.spring().surgeFrequency()),
          SpringFields.tensileStrength(),
          SpringFields.shearModulus(),
          SpringFields.elasticModulus(),
          Quantities.number(
              "stress_correction",
              "stress correction K",
              4,
              s -> s.duty().correction().at(s.spring().springIndex())),
          Quantities.number(
              "hook_bend_index", "index of the loop C1", 2, s -> s.spring().bendIndex()),
          Quantities.number(
              "hook_side_index", "index of the side bend C2", 2, s -> s.spring().sideIndex()));

  /** The initial tension usual for the index, by the relation that decides. */
  static final List<Quantity<ExtensionState>> PREFERRED = preferred(InitialTension.USUAL);

  /** The same by the other published relation. */
  static final List<Quantity<ExtensionState>> ALSO_PREFERRED = preferred(InitialTension.NORTON);

  /** What is known at each load. */
  static final List<Quantity<ExtensionLoad>> LOAD =
      List.of(
          Quantities.of("length", "length", LENGTH, 2, ExtensionLoad::length),
          Quantities.of("force", "force", FORCE, 2, ExtensionLoad::force),
          Quantities.of("deflection", "deflection", LENGTH, 2, ExtensionLoad::deflection),
          Quantities.of(
              "shear_stress", "uncorrected stress", STRESS, 1, ExtensionLoad::shearStress),
          Quantities.of(
              "corrected_shear_stress",
              "corrected stress",
              STRESS,
              1,
              ExtensionLoad::correctedShearStress),
          Quantities.of(
              "hook_bending_stress", "hook bending", STRESS, 1, ExtensionLoad::hookBendingStress),
          Quantities.of(
              "hook_torsion_stress", "hook torsion", STRESS, 1, ExtensionLoad::hookTorsionStress));

  private ExtensionQuantities() {}

  private static Quantity<ExtensionState> length(
      String stem, String label, int decimals, ToDoubleFunction<ExtensionState> value) {
    return Quantities.of(stem, label, LENGTH, decimals, value);
  }

  private static List<Quantity<ExtensionState>> preferred(InitialTension relation) {
    return List.of(
        Quantities.of(
            "min",
            "preferred from (" + relation.author() + ")",
            FORCE,
            2,
            s -> s.leastPreferred(relation)),
        Quantities.of(
            "max",
            "preferred up to (" + relation.author() + ")",
            FORCE,
            2,
            s -> s.greatestPreferred(relation)));
  }
}
