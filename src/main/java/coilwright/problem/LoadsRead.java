package coilwright.problem;

import coilwright.spring.LoadPoint;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What a file says about the load line, as read.
 *
 * @param loads the loads with their places
 * @param facts the facts, for the whole group of springs
 * @param required what one spring must do, where the facts fix the line
 */
record LoadsRead(List<LoadEntry> loads, LoadFacts facts, Optional<Requirement> required) {

  private static final List<ProblemKey<?>> FACTS =
      List.of(LoadKeys.RATE, LoadKeys.FREE_LENGTH, LoadKeys.STROKE);

  /**
   * Reads the loads and the other facts and reports those that contradict each other.
   *
   * @param root the file
   * @param purpose a shortlist needs the line
   * @return what was read; incomplete where there are faults
   */
  static LoadsRead of(Section root, Purpose purpose) {
    long before = root.spot().faults().count();
    List<LoadEntry> loads =
        root.require(LoadKeys.LOADS).orElse(List.of()).stream().map(LoadEntry::read).toList();
    LoadFacts facts =
        new LoadFacts(
            loads.stream().map(LoadEntry::asked).toList(),
            root.number(LoadKeys.RATE),
            root.number(LoadKeys.FREE_LENGTH),
            root.number(LoadKeys.STROKE),
            root.read(LoadKeys.SPRINGS_IN_PARALLEL).orElse(1));
    if (root.spot().faults().count() == before) {
      LoadOrder.check(loads);
      Agreement.strokeBetween(root, loads);
    }
    if (root.spot().faults().count() > before) {
      return new LoadsRead(loads, facts, Optional.empty());
    }
    return new LoadsRead(loads, facts, fixed(root, loads, facts, purpose));
  }

  private static Optional<Requirement> fixed(
      Section root, List<LoadEntry> loads, LoadFacts facts, Purpose purpose) {
    long before = root.spot().faults().count();
    Optional<FixedLine> fixed = FixedLine.by(loads, facts);
    if (fixed.isPresent()) {
      new Agreement(root, fixed.get()).check(loads, facts);
      return Optional.of(perSpring(fixed.get(), facts));
    }
    Agreement.belowFreeLength(loads, facts.freeLength());
    boolean asked = purpose == Purpose.SHORTLIST && FACTS.stream().noneMatch(root::misspells);
    if (asked && root.spot().faults().count() == before) {
      root.spot(LoadKeys.LOADS)
          .fault(
              "the facts do not fix the load line",
              "must be two loads at lengths; or one, and rate, free_length or a second force and"
                  + " stroke; or rate and free_length; or no length at all, and rate or stroke");
    }
    return Optional.empty();
  }

  /**
   * Reports lengths for which no force is asked and at which the spring to check carries nothing.
   *
   * @param design the spring
   */
  void checkAgainst(CompressionDesign design) {
    double reported =
        required
            .map(Requirement::freeLength)
            .orElse(facts.freeLength())
            .orElse(Double.POSITIVE_INFINITY);
    List<LoadEntry> lengths =
        loads.stream()
            .filter(load -> load.section().lacks(LoadKeys.FORCE))
            .filter(load -> load.asked().length().orElse(reported) < reported)
            .toList();
    Agreement.belowFreeLength(lengths, OptionalDouble.of(design.freeLength()));
  }

  private static Requirement perSpring(FixedLine fixed, LoadFacts facts) {
    int n = facts.springsInParallel();
    double rate = fixed.rate() / n;
    if (fixed.freeLength().isEmpty()) {
      List<LoadPoint> deflected =
          facts.loads().stream()
              .map(load -> load.force().orElseThrow() / n)
              .map(force -> LoadPoint.deflected(force / rate, force))
              .toList();
      return new Requirement(rate, fixed.freeLength(), fixed.rule(), deflected);
    }
    List<LoadPoint> loads =
        facts.loads().stream()
            .map(load -> new LoadPoint(load.length(), divided(load.force(), n)))
            .toList();
    return new Requirement(rate, fixed.freeLength(), fixed.rule(), loads);
  }

  private static OptionalDouble divided(OptionalDouble force, int n) {
    return force.isPresent() ? OptionalDouble.of(force.getAsDouble() / n) : force;
  }
}
