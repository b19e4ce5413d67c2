package coilwright.search;

import coilwright.problem.BucklingRule;
import coilwright.problem.Problem;
import coilwright.spring.CompressionFamily;
import coilwright.spring.CompressionState;
import coilwright.spring.EndType;
import coilwright.spring.LoadLine;
import coilwright.spring.Rate;
import coilwright.spring.Rounding;
import coilwright.spring.Seating;
import coilwright.spring.StressCorrection;
import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.stream.Stream;

/**
 * A problem whose bounds are the very numbers of one rounded spring: it holds them all with nothing
 * to spare, while the unrounded springs around it may fail any of them.
 *
 * @param draft the problem
 * @param coils the spring's coil count [-]
 * @param spring the spring
 */
record OwnNumbers(ProblemDraft draft, double coils, CompressionState spring) {

  private static final double STRENGTH = 1000;
  private static final double[] DIAMETER_STEPS = {0, 0.01, 0.1, 0.5};
  private static final double[] COIL_STEPS = {0.1, 0.25, 0.3, 0.5, 1};

  /** As many as asked; the same seed gives the same. */
  static Stream<OwnNumbers> drafts(long seed, int count) {
    Random random = new Random(seed);
    return Stream.generate(() -> next(random)).flatMap(Optional::stream).limit(count);
  }

  /** Of three kinds: any; of a diameter where the steps change; too tight for stress to fall. */
  private static Optional<OwnNumbers> next(Random random) {
    double d = 0.3 * StrictMath.pow(20, random.nextDouble());
    double index = 1.25 + 12 * random.nextDouble();
    int kind = random.nextInt(3);
    if (kind == 1) {
      index = 3 + 8 * random.nextDouble();
      d = Rounding.SMALL_BELOW / index * (1 + 0.002 * (random.nextDouble() - 0.5));
    } else if (kind == 2) {
      index = 1.3 + 0.8 * random.nextDouble();
    }
    return around(random, d, index, 2 + 58 * random.nextDouble());
  }

  private static Optional<OwnNumbers> around(Random random, double d, double index, double coils) {
    double step = COIL_STEPS[random.nextInt(COIL_STEPS.length)];
    BigDecimal steps = BigDecimal.valueOf(Math.max(1, Math.round(coils / step)));
    double practical = BigDecimal.valueOf(step).multiply(steps).doubleValue();
    EndType ends = EndType.values()[random.nextInt(EndType.values().length)];
    ProblemDraft draft =
        new ProblemDraft()
            .coilStep(step)
            .rounding(rounding(random))
            .own(GradeDraft.of("steel", STRENGTH).grade())
            .sizes(d)
            .ends(ends)
            .seats(Seating.values()[random.nextInt(Seating.values().length)])
            .correction(StressCorrection.values()[random.nextInt(2)])
            .buckling(BucklingRule.NONE)
            .without(Bound.values());
    loads(random, draft, Rate.of(80_000, d, index * d, coils), ends.solidLength(coils, d));
    return spring(draft.problem(), practical)
        .map(spring -> new OwnNumbers(bound(random, draft, spring), practical, spring));
  }

  private static Rounding rounding(Random random) {
    return random.nextBoolean()
        ? new Rounding(0.01, 0.1, 0.001, 0.01)
        : new Rounding(any(random), any(random), any(random), any(random));
  }

  private static double any(Random random) {
    return DIAMETER_STEPS[random.nextInt(DIAMETER_STEPS.length)];
  }

  private static void loads(Random random, ProblemDraft draft, double rate, double solid) {
    double travel = solid * (0.1 + 2 * random.nextDouble());
    double deflection = travel / (1.001 + random.nextDouble());
    LoadLine line = new LoadLine(rate, solid + travel);
    double shortest = line.freeLength() - deflection;
    if (random.nextBoolean()) {
      draft.loads(line, shortest);
    } else {
      draft.loads(line, shortest + random.nextDouble() * deflection, shortest);
    }
  }

  /** The rounded spring, where it holds what is never switched off. */
  private static Optional<CompressionState> spring(Problem problem, double coils) {
    List<CompressionFamily> families =
        new CompressionSearch()
            .families(problem, WireChoice.of(problem, Searched.CATALOGUE).wires());
    return Optional.of(families.get(0))
        .filter(family -> coils <= family.mostCoils())
        .flatMap(family -> family.rounded(coils))
        .filter(state -> Candidate.judge(state, new CompressionSearch().limits(problem)).holds());
  }

  private static ProblemDraft bound(Random random, ProblemDraft draft, CompressionState spring) {
    draft.with(Bound.CLEARANCE, 0);
    for (Bound bound : Bound.values()) {
      if (bound != Bound.CLEARANCE && random.nextBoolean()) {
        draft.with(bound, bound.valueOf(spring, STRENGTH));
      }
    }
    return draft;
  }

  @Override
  public String toString() {
    return spring.spring().wireDiameter()
        + " mm wire, mean diameter "
        + spring.spring().meanDiameter()
        + " mm, "
        + coils
        + " coils, "
        + spring.endForm()
        + ": "
        + draft;
  }
}
