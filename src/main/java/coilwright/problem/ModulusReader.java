package coilwright.problem;

import coilwright.material.ModulusLaw;
import coilwright.material.ModulusLaws;
import coilwright.spring.Kind;
import java.util.List;
import java.util.Optional;

/**
 * Reads a modulus: a constant or a table of steps.
 *
 * @param steps reads the table
 */
record ModulusReader(StepsReader steps) implements ValueReader<LawGiven<ModulusLaw>> {

  @Override
  public Optional<LawGiven<ModulusLaw>> read(Node node, Spot spot) {
    if (node instanceof Node.Sequence) {
      return steps
          .read(node, spot)
          .map(
              table ->
                  new LawGiven<>(
                      ModulusLaws.steps(table.diameters(), table.heights()), table.end()));
    }
    if (node instanceof Node.Mapping) {
      spot.fault(node.shown(), "must be " + accepted());
      return Optional.empty();
    }
    return steps
        .step()
        .reader()
        .read(node, spot)
        .map(ModulusLaws::constant)
        .map(LawGiven::everywhere);
  }

  @Override
  public String accepted() {
    return steps.step().reader().accepted() + ", or " + steps.accepted();
  }

  @Override
  public Form form(Kind kind) {
    return new Form.Either(List.of(steps.step().reader().form(kind), steps.form(kind)));
  }
}
