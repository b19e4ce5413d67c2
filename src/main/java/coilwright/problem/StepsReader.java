package coilwright.problem;

import coilwright.spring.Kind;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Reads tables of steps.
 *
 * @param path the path of one step, such as "own_materials[].shear_modulus[]"
 * @param upTo the key of a step's greatest diameter
 * @param step the key of its value
 */
record StepsReader(String path, ProblemKey<Double> upTo, ProblemKey<Double> step)
    implements ValueReader<Steps> {

  @Override
  public Optional<Steps> read(Node node, Spot spot) {
    long before = spot.faults().count();
    List<Section> rows = new SectionListReader(path).read(node, spot).orElse(List.of());
    List<Double> diameters = new ArrayList<>();
    List<Double> values = new ArrayList<>();
    for (Section row : rows) {
      row.require(upTo).ifPresent(diameter -> addRising(diameter, diameters, row));
      row.require(step).ifPresent(values::add);
    }
    return spot.faults().count() > before
        ? Optional.empty()
        : Optional.of(new Steps(diameters, values));
  }

  private void addRising(double diameter, List<Double> diameters, Section row) {
    double last = diameters.isEmpty() ? 0 : diameters.get(diameters.size() - 1);
    if (!(diameter > last)) {
      row.spot(upTo)
          .fault(row.shown(upTo), "must be above the step before, " + Range.number(last) + " mm");
    }
    diameters.add(diameter);
  }

  @Override
  public String accepted() {
    return "a list of steps {" + upTo.name() + ", " + step.name() + "}";
  }

  @Override
  public Form form(Kind kind) {
    return new SectionListReader(path).form(kind);
  }
}
