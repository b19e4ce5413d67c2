package coilwright.problem;

import coilwright.spring.AngularRate;
import coilwright.spring.Method;
import coilwright.spring.TorquePoint;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Reads what of a file is for torsion springs.
 *
 * @param blocks the file
 * @param ids the grades that may be named
 * @param method whose formulas apply
 */
record TorsionReader(Blocks blocks, MaterialIds ids, Method method) {

  /**
   * Reads it.
   *
   * @return what was read; incomplete where there are faults
   */
  KindPart read() {
    Section root = blocks.root();
    boolean closing = root.read(TorqueKeys.LOADING).orElse(true);
    LineForm form = closing ? LineForm.CLOSING : LineForm.OPENING;
    LineRead line = LineRead.of(root, form, LineKeys.TORSION, blocks.purpose());
    int parallel = LineRead.parallel(root);
    int count = line.loads().size();
    LegsAsked legs = LegsReader.read(blocks.make(), LegKeys.MAKE, count);
    CoilStepRule.besideLegs(blocks.make(), legs);
    Optional<TorsionDesign> design =
        blocks.design().flatMap(section -> new TorsionDesignReader(ids, section, count).read());
    return new KindPart(
        facts(parallel),
        Optional.empty(),
        OptionalDouble.empty(),
        Optional.empty(),
        design.map(Design.class::cast),
        Optional.empty(),
        Optional.of(
            new TorsionAsked(
                closing,
                line.loads().stream().map(TorsionReader::asked).toList(),
                new TorqueFacts(line.facts().rate(), line.facts().zero(), line.facts().stroke()),
                line.fixed().map(fixed -> perSpring(fixed, line.loads(), parallel)),
                design.map(TorsionDesign::legs).orElse(legs),
                blocks
                    .envelope()
                    .map(section -> section.number(EnvelopeKeys.MAX_BODY_LENGTH))
                    .orElse(OptionalDouble.empty()),
                LimitKeys.BENDING_STRESS_AT_LOAD.read(blocks.limits()),
                rateConstant())));
  }

  private static LoadFacts facts(int parallel) {
    OptionalDouble none = OptionalDouble.empty();
    return new LoadFacts(List.of(), none, none, none, parallel);
  }

  private double rateConstant() {
    double usual = method == Method.EN_13906 ? AngularRate.FRICTIONLESS : AngularRate.HANDBOOK;
    return blocks.limits().flatMap(section -> section.read(LimitKeys.RATE_CONSTANT)).orElse(usual);
  }

  private static TorqueAsked asked(LoadEntry load) {
    return new TorqueAsked(new TorquePoint(load.at(), load.carries()), load.tolerance());
  }

  private static TorqueLine perSpring(FixedLine fixed, List<LoadEntry> asked, int parallel) {
    List<TorquePoint> loads = new ArrayList<>();
    for (LoadEntry load : asked) {
      OptionalDouble angle = load.at();
      if (angle.isEmpty() && fixed.zero().isPresent()) {
        angle = OptionalDouble.of(fixed.placeUnder(load.load()));
      }
      double torque = load.carries().isPresent() ? load.load() : fixed.loadAt(angle.getAsDouble());
      loads.add(new TorquePoint(angle, OptionalDouble.of(torque / parallel)));
    }
    return new TorqueLine(fixed.rate() / parallel, fixed.zero(), fixed.rule(), loads);
  }
}
