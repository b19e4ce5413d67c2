package coilwright.problem;

import coilwright.spring.LoadPoint;
import coilwright.spring.Method;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Reads what of a file is for compression springs.
 *
 * @param blocks the file
 * @param ids the grades that may be named
 * @param method whose formulas apply
 */
record CompressionReader(Blocks blocks, MaterialIds ids, Method method) {

  /**
   * Reads it.
   *
   * @return what was read; incomplete where there are faults
   */
  KindPart read() {
    Section root = blocks.root();
    LineRead line = LineRead.of(root, LineForm.COMPRESSION, LineKeys.COMPRESSION, blocks.purpose());
    LoadFacts facts = facts(line, root);
    Optional<Requirement> required = line.fixed().map(fixed -> perSpring(fixed, facts));
    Optional<CompressionDesign> design =
        blocks.design().flatMap(section -> new DesignReader(ids, section, method).read());
    design.ifPresent(spring -> checkAgainst(spring, line, required));
    return new KindPart(
        facts,
        required,
        new OvertravelReader(root, line.form())
            .read(facts.loads(), required.map(Requirement::completed).orElse(List.of())),
        root.read(EnvelopeKeys.SEATS),
        design.map(Design.class::cast),
        Optional.empty(),
        Optional.empty());
  }

  /**
   * The facts of a line of force against length.
   *
   * @param line the line
   * @param root the file
   * @return the facts, for the whole group of springs
   */
  static LoadFacts facts(LineRead line, Section root) {
    return new LoadFacts(
        line.loads().stream().map(LoadEntry::asked).toList(),
        line.facts().rate(),
        line.facts().zero(),
        line.facts().stroke(),
        LineRead.parallel(root));
  }

  /** Reports lengths for which no force is asked and at which the spring carries nothing. */
  private static void checkAgainst(
      CompressionDesign design, LineRead line, Optional<Requirement> required) {
    double reported =
        required
            .map(Requirement::freeLength)
            .orElse(line.facts().zero())
            .orElse(Double.POSITIVE_INFINITY);
    List<LoadEntry> lengths =
        line.loads().stream()
            .filter(load -> load.section().lacks(LoadKeys.FORCE))
            .filter(load -> load.at().orElse(reported) < reported)
            .toList();
    Unloaded.check(line.form(), lengths, OptionalDouble.of(design.freeLength()));
  }

  private static Requirement perSpring(FixedLine fixed, LoadFacts facts) {
    int n = facts.springsInParallel();
    double rate = fixed.rate() / n;
    if (fixed.zero().isEmpty()) {
      List<LoadPoint> deflected =
          facts.loads().stream()
              .map(load -> load.force().orElseThrow() / n)
              .map(force -> LoadPoint.deflected(force / rate, force))
              .toList();
      return new Requirement(rate, fixed.zero(), fixed.rule(), deflected);
    }
    List<LoadPoint> loads =
        facts.loads().stream()
            .map(load -> new LoadPoint(load.length(), divided(load.force(), n)))
            .toList();
    return new Requirement(rate, fixed.zero(), fixed.rule(), loads);
  }

  private static OptionalDouble divided(OptionalDouble force, int n) {
    return force.isPresent() ? OptionalDouble.of(force.getAsDouble() / n) : force;
  }
}
