package coilwright.report;

import coilwright.problem.Design;
import coilwright.problem.ExtensionDesign;
import coilwright.problem.Problem;
import coilwright.spring.ExtensionState;
import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/** The values of an extension spring in the order of JSON and CSV. */
final class ExtensionFields {

  /** What is left to say of one whose grade has no data for its wire. */
  static final List<Field<Design>> DESIGN =
      List.of(
          Word.users("material", Design::material),
          Word.users("wire_size", design -> design.wireSize().label()),
          Word.ours("hooks", design -> extension(design).hooks().types().get(0).id()),
          length("wire_diameter", design -> design.wireSize().diameter()),
          length("mean_diameter", Design::meanDiameter),
          Quantities.number("body_coils", "", 2, Design::coils));

  private ExtensionFields() {}

  /** All of them. */
  static List<SpringPart<ExtensionState>> parts(Problem problem) {
    List<SpringPart<ExtensionState>> parts = new ArrayList<>();
    parts.add(SpringPart.of(List.of(Word.ours("hooks", ExtensionState::endForm))));
    parts.add(SpringPart.of(ExtensionQuantities.SPRING));
    parts.add(preferred("preferred_initial_tension", ExtensionQuantities.PREFERRED));
    parts.add(preferred("preferred_initial_tension_norton", ExtensionQuantities.ALSO_PREFERRED));
    parts.add(SpringPart.of(SpringFields.group(problem)));
    parts.add(
        SpringPart.of(
            List.of(
                SpringFields.data(),
                new Flag<>("stress_assessed", ExtensionState::stressAssessed))));
    parts.add(
        SpringPart.list(
            "loads",
            "load",
            problem.facts().loads().size(),
            ExtensionQuantities.LOAD,
            ExtensionState::loads));
    if (problem.overtravel().isPresent()) {
      parts.add(
          SpringPart.object("overtravel", ExtensionQuantities.LOAD, ExtensionState::overtravel));
    }
    return parts;
  }

  private static SpringPart<ExtensionState> preferred(
      String stem, List<Quantity<ExtensionState>> ends) {
    return new UnitObject<>(stem, Dimension.FORCE, ends, Optional::of);
  }

  private static ExtensionDesign extension(Design design) {
    return (ExtensionDesign) design;
  }

  private static Quantity<Design> length(String stem, ToDoubleFunction<Design> of) {
    return Quantities.of(stem, "", Dimension.LENGTH, 3, of);
  }
}
