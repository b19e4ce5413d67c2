package coilwright.report;

import coilwright.problem.BucklingRule;
import coilwright.problem.CompressionDesign;
import coilwright.problem.Design;
import coilwright.problem.Problem;
import coilwright.spring.CompressionState;
import coilwright.spring.LoadState;
import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/** The values of a compression spring in the order of JSON and CSV. */
final class CompressionFields {

  /** What is known of it pressed solid. */
  private static final List<Field<LoadState>> SOLID =
      List.of(
          Quantities.in(CompressionQuantities.LOAD, "force"),
          Quantities.in(CompressionQuantities.LOAD, "shear_stress"),
          Quantities.in(CompressionQuantities.LOAD, "corrected_shear_stress"));

  /** What is left to say of one whose grade has no data for its wire. */
  static final List<Field<Design>> DESIGN =
      List.of(
          Word.users("material", Design::material),
          Word.users("wire_size", design -> design.wireSize().label()),
          Word.ours("ends", design -> compression(design).ends().id()),
          length("wire_diameter", design -> design.wireSize().diameter()),
          length("mean_diameter", Design::meanDiameter),
          Quantities.number("active_coils", "", 2, Design::coils),
          length("free_length", design -> compression(design).freeLength()));

  private CompressionFields() {}

  /** All of them. */
  static List<SpringPart<CompressionState>> parts(Problem problem) {
    List<SpringPart<CompressionState>> parts = new ArrayList<>();
    parts.add(SpringPart.of(CompressionQuantities.SPRING));
    parts.add(SpringPart.of(SpringFields.group(problem)));
    parts.add(
        SpringPart.of(List.of(SpringFields.data(), Word.ours("seats", CompressionFields::seats))));
    parts.add(
        SpringPart.list(
            "loads",
            "load",
            problem.facts().loads().size(),
            CompressionQuantities.LOAD,
            CompressionState::loads));
    if (problem.overtravel().isPresent()) {
      parts.add(
          SpringPart.object(
              "overtravel", CompressionQuantities.LOAD, CompressionState::overtravel));
    }
    parts.add(SpringPart.object("solid", SOLID, state -> Optional.of(state.solid())));
    parts.add(SpringPart.of(List.of(CompressionQuantities.OUTSIDE_DIAMETER_AT_SOLID)));
    parts.add(SpringPart.object("buckling", buckling(problem), Optional::of));
    return parts;
  }

  /** Null says that it can never buckle. */
  private static List<Field<CompressionState>> buckling(Problem problem) {
    boolean atSolid = problem.limits().buckling() == BucklingRule.AT_SOLID;
    return List.of(
        new Boundless<>(CompressionQuantities.CRITICAL_DEFLECTION),
        new Flag<>("stable", state -> state.stableAt(atSolid ? state.solid() : state.extreme())));
  }

  private static String seats(CompressionState state) {
    return state.seating().id();
  }

  private static CompressionDesign compression(Design design) {
    return (CompressionDesign) design;
  }

  private static Quantity<Design> length(String stem, ToDoubleFunction<Design> of) {
    return Quantities.of(stem, "", Dimension.LENGTH, 3, of);
  }
}
