package coilwright.problem;

import coilwright.material.StrengthLaw;
import coilwright.material.StrengthLaws;
import coilwright.spring.Kind;
import java.util.List;
import java.util.Optional;

/** Reads a tensile strength: a constant, a power law or a table of steps. */
final class StrengthReader implements ValueReader<LawGiven<StrengthLaw>> {

  @Override
  public Optional<LawGiven<StrengthLaw>> read(Node node, Spot spot) {
    if (node instanceof Node.Sequence) {
      return steps()
          .read(node, spot)
          .map(
              table ->
                  new LawGiven<>(
                      StrengthLaws.steps(table.diameters(), table.heights()), table.end()));
    }
    if (node instanceof Node.Mapping) {
      return Section.open(node, spot).flatMap(StrengthReader::power);
    }
    return Values.strength().read(node, spot).map(StrengthLaws::constant).map(LawGiven::everywhere);
  }

  private static Optional<LawGiven<StrengthLaw>> power(Section section) {
    Optional<Double> a = section.require(MaterialKeys.STRENGTH_A);
    Optional<Double> m = section.require(MaterialKeys.STRENGTH_M);
    return a.isPresent() && m.isPresent()
        ? Optional.of(LawGiven.everywhere(StrengthLaws.power(a.get(), m.get())))
        : Optional.empty();
  }

  private static StepsReader steps() {
    return new StepsReader(
        "own_materials[].tensile_strength[]",
        MaterialKeys.STRENGTH_UP_TO,
        MaterialKeys.STRENGTH_STEP);
  }

  @Override
  public String accepted() {
    return Values.strength().accepted() + ", {a, m}, or " + steps().accepted();
  }

  @Override
  public Form form(Kind kind) {
    return new Form.Either(
        List.of(
            Values.strength().form(kind),
            Forms.block(kind, "own_materials[].tensile_strength"),
            steps().form(kind)));
  }
}
