package coilwright.problem;

import coilwright.spring.LoadPoint;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Reads what of a file is for extension springs.
 *
 * @param blocks the file
 * @param ids the grades that may be named
 */
record ExtensionReader(Blocks blocks, MaterialIds ids) {

  /**
   * Reads it.
   *
   * @return what was read; incomplete where there are faults
   */
  KindPart read() {
    Section root = blocks.root();
    LineRead line = LineRead.of(root, LineForm.EXTENSION, LineKeys.EXTENSION, blocks.purpose());
    LoadFacts bare = CompressionReader.facts(line, root);
    OptionalDouble freeLength = root.number(LoadKeys.FREE_LENGTH_INSIDE_HOOKS);
    LoadFacts facts =
        new LoadFacts(
            bare.loads(), bare.rate(), freeLength, bare.stroke(), bare.springsInParallel());
    HooksAsked hooks = HooksReader.read(blocks.make());
    new HookRules(blocks, hooks).check(line, freeLength);
    Optional<ExtensionDesign> design =
        blocks.design().flatMap(section -> new ExtensionDesignReader(ids, section).read());
    Optional<TensionLine> one = line.fixed().map(fixed -> perSpring(fixed, facts));
    return new KindPart(
        facts,
        Optional.empty(),
        new OvertravelReader(root, line.form())
            .read(facts.loads(), one.map(TensionLine::loads).orElse(List.of())),
        Optional.empty(),
        design.map(Design.class::cast),
        Optional.of(
            new ExtensionAsked(
                one,
                freeLength,
                design.map(ExtensionDesign::hooks).orElse(hooks),
                blocks
                    .limits()
                    .flatMap(section -> section.read(LimitKeys.INITIAL_TENSION))
                    .orElse(true),
                LimitKeys.STRESS_IN_BODY.read(blocks.limits()),
                LimitKeys.HOOK_BENDING_STRESS.read(blocks.limits()),
                LimitKeys.HOOK_TORSION_STRESS.read(blocks.limits()),
                bound(EnvelopeKeys.MAX_EXTENDED_LENGTH),
                bound(EnvelopeKeys.PIN))),
        Optional.empty());
  }

  private OptionalDouble bound(ProblemKey<Double> key) {
    return blocks.envelope().map(section -> section.number(key)).orElse(OptionalDouble.empty());
  }

  private static TensionLine perSpring(FixedLine fixed, LoadFacts facts) {
    int n = facts.springsInParallel();
    List<LoadPoint> loads = new ArrayList<>();
    for (LoadAsked load : facts.loads()) {
      OptionalDouble none = OptionalDouble.empty();
      if (fixed.zero().isEmpty()) {
        loads.add(new LoadPoint(none, OptionalDouble.of(load.force().orElseThrow() / n)));
      } else {
        double length =
            load.length().isPresent()
                ? load.length().getAsDouble()
                : fixed.placeUnder(load.force().orElseThrow());
        loads.add(LoadPoint.at(length, load.force().orElse(fixed.loadAt(length)) / n));
      }
    }
    return new TensionLine(fixed.rate() / n, fixed.zero(), fixed.rule(), loads);
  }
}
