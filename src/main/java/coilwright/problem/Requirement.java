package coilwright.problem;

import coilwright.spring.LoadLine;
import coilwright.spring.LoadPoint;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What one spring must do: the rate that the facts fix, the free length where they fix it too, and
 * the loads.
 *
 * @param rate R of one spring [N/mm]
 * @param freeLength L0 [mm]; empty where the lengths are left open
 * @param rule which facts fixed them, in words: "two loads at lengths"
 * @param loads the loads of one spring in file order, as asked: a length, a force or both; or,
 *     where the lengths are left open, a force at a deflection
 */
public record Requirement(
    double rate, OptionalDouble freeLength, String rule, List<LoadPoint> loads) {

  /** Copies the list. */
  public Requirement {
    loads = List.copyOf(loads);
  }

  /** The load line; empty where the lengths are left open. */
  public Optional<LoadLine> line() {
    return freeLength.isPresent()
        ? Optional.of(new LoadLine(rate, freeLength.getAsDouble()))
        : Optional.empty();
  }

  /** The loads, each with both length and force where the line is fixed. */
  public List<LoadPoint> completed() {
    return freeLength.isPresent()
        ? loads.stream().map(load -> load.on(line().orElseThrow())).toList()
        : loads;
  }

  /** The greatest deflection asked [mm], where the lengths are left open. */
  public OptionalDouble greatestDeflection() {
    return freeLength.isPresent()
        ? OptionalDouble.empty()
        : loads.stream().mapToDouble(load -> load.deflection().orElseThrow()).max();
  }
}
