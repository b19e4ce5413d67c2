package coilwright.report;

import coilwright.problem.Design;
import coilwright.problem.ExtensionDesign;
import coilwright.problem.Problem;
import coilwright.spring.ExtensionState;
import coilwright.unit.Dimension;
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
    return List.of(
        SpringPart.of(List.of(Word.ours("hooks", ExtensionState::endForm))),
        SpringPart.of(ExtensionQuantities.SPRING),
        preferred("preferred_initial_tension", ExtensionQuantities.PREFERRED),
        preferred("preferred_initial_tension_norton", ExtensionQuantities.ALSO_PREFERRED),
        SpringPart.of(SpringFields.group(problem)),
        SpringPart.of(
            List.of(
                SpringFields.data(),
                new Flag<>("stress_assessed", ExtensionState::stressAssessed))),
        SpringPart.list(
            "loads",
            "load",
            problem.facts().loads().size(),
            ExtensionQuantities.LOAD,
            ExtensionState::loads));
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
