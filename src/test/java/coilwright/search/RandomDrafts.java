package coilwright.search;

import coilwright.limit.Finding;
import coilwright.material.StrengthLaws;
import coilwright.material.WireGrade;
import coilwright.problem.BucklingRule;
import coilwright.spring.EndType;
import coilwright.spring.LoadLine;
import coilwright.spring.Method;
import coilwright.spring.Rate;
import coilwright.spring.Rounding;
import coilwright.spring.Seating;
import coilwright.spring.ShearStress;
import coilwright.spring.StressCorrection;
import coilwright.spring.Surge;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import java.util.stream.Stream;

/**
 * Problems drawn at random around a spring that exists: its load line is asked, and limits close to
 * its own numbers, so that some wires fit, some just fail and some are far off. The same seed gives
 * the same problems.
 */
public final class RandomDrafts {

  private static final double SHEAR_MODULUS = 80_000;
  private static final List<String> GRADES =
      List.of("music-wire", "hard-drawn", "stainless-302", "en-10270-1-sm", "en-10270-1-sh");

  private final Random random;
  private double wire;
  private double index;
  private double coils;
  private EndType ends;
  private LoadLine line;
  private double travel;
  private double stress;
  private double deepest;
  private boolean tight;

  private RandomDrafts(long seed) {
    this.random = new Random(seed);
  }

  /** As many drafts as asked, by the handbooks' method, for bare wire. */
  public static Stream<ProblemDraft> of(long seed, int count) {
    RandomDrafts drafts = new RandomDrafts(seed);
    return IntStream.range(0, count).mapToObj(i -> drafts.next());
  }

  /** Drafts by either method, with coatings, set removal, overtravel and assumed clearances. */
  public static Stream<ProblemDraft> ofAllKinds(long seed, int count) {
    RandomDrafts drafts = new RandomDrafts(seed);
    return IntStream.range(0, count).mapToObj(i -> drafts.varied(drafts.next()));
  }

  /**
   * The same with the lengths left open. Their coils are tight and few and their steps coarse,
   * since no length ends a scan of their counts.
   */
  public static Stream<ProblemDraft> ofOpenLengths(long seed, int count) {
    RandomDrafts drafts = new RandomDrafts(seed);
    drafts.tight = true;
    return IntStream.range(0, count)
        .mapToObj(i -> drafts.varied(drafts.next()).lengthsOpen().coilStep(drafts.pick(2.0, 3.0)));
  }

  private ProblemDraft varied(ProblemDraft draft) {
    if (chance(0.5)) {
      draft.method(Method.EN_13906).ends(EndType.SQUARED, EndType.SQUARED_GROUND);
    }
    if (chance(0.3)) {
      draft.setRemoved();
    }
    if (chance(0.4)) {
      draft.coating(wire * between(0.001, 0.05));
    }
    if (chance(0.4)) {
      double solid = ends.solidLength(coils, wire);
      double shortest = line.freeLength() - deepest;
      draft.overtravel(solid + (shortest - solid) * between(0.2, 0.99));
    }
    if (chance(0.5)) {
      draft.without(Bound.CLEARANCE);
    }
    return draft;
  }

  private ProblemDraft next() {
    spring();
    ProblemDraft draft = new ProblemDraft().loads(line, lengths());
    wires(draft);
    steps(draft);
    proportions(draft);
    space(draft);
    stress(draft);
    stability(draft);
    return draft;
  }

  /** The spring that exists; it reaches solid at or beyond the stress of an ordinary steel. */
  private void spring() {
    wire = 0.3 * StrictMath.pow(20, random.nextDouble());
    index = chance(0.2) ? between(1.25, 4) : between(4, tight ? 6 : 14);
    coils = 0.25 * (6 + random.nextInt(tight ? 30 : 100));
    ends = pick(EndType.values());
    double meanDiameter = index * wire;
    double rate = Rate.of(SHEAR_MODULUS, wire, meanDiameter, coils);
    double solid = ends.solidLength(coils, wire);
    double share =
        StressCorrection.WAHL.at(index) * ShearStress.uncorrected(rate, meanDiameter, wire);
    travel = Math.min(between(0.2, 3) * solid, between(400, 1100) / share);
    stress = share * travel;
    double free = solid + travel;
    line = new LoadLine(rate, chance(0.3) ? Rounding.toStep(free, 0.1) : free);
  }

  private double[] lengths() {
    deepest = travel / between(1.01, 1.6);
    double length = line.freeLength() - deepest;
    return switch (random.nextInt(4)) {
      case 0 -> new double[] {length};
      case 1 ->
          new double[] {length, length + between(0.02, 0.5) * deepest, length + 0.9 * deepest};
      default -> new double[] {length + between(0.1, 0.9) * deepest, length};
    };
  }

  private void wires(ProblemDraft draft) {
    List<String> ids = new ArrayList<>(GRADES);
    ids.removeIf(id -> chance(0.75));
    WireGrade[] own =
        IntStream.rangeClosed(1, ids.isEmpty() || chance(0.6) ? 1 + random.nextInt(2) : 0)
            .mapToObj(this::own)
            .toArray(WireGrade[]::new);
    EndType[] tried = chance(0.5) ? new EndType[] {ends} : EndType.values();
    int least = (int) Math.ceil(5.0 / ((ids.size() + own.length) * tried.length));
    double[] sizes =
        random
            .doubles(Math.max(least, 1 + random.nextInt(5)), 0.75 * wire, 1.35 * wire)
            .map(size -> Rounding.toStep(size, 0.01))
            .sorted()
            .toArray();
    draft.materials(ids).own(own).sizes(sizes).ends(tried);
  }

  private WireGrade own(int number) {
    double strength = stress / 0.45 * between(0.85, 1.5);
    GradeDraft grade =
        GradeDraft.of("own-" + number, strength)
            .moduli(SHEAR_MODULUS * between(0.8, 1.1), 210_000 * between(0.8, 1.1))
            .weight(between(4000, 9000), between(0.5, 10));
    if (chance(0.3)) {
      grade = grade.strength(StrengthLaws.power(strength, between(0, 0.3)));
    } else if (chance(0.3)) {
      double[] upTo = {wire, 1.1 * wire, 10 * wire};
      grade =
          grade.strength(
              StrengthLaws.steps(upTo, new double[] {strength, 0.5 * strength, 2 * strength}));
    }
    if (chance(0.3)) {
      grade = grade.shares(between(0.3, 0.6), between(0.3, 0.7));
    }
    return (chance(0.2) ? grade.diameters(0.9 * wire, 1.2 * wire) : grade).grade();
  }

  private void steps(ProblemDraft draft) {
    double diameter = pick(0.0, 0.01, 0.1, 0.5);
    double length = pick(0.0, 0.01, 0.1, 0.5);
    double finer = pick(1.0, 0.1);
    draft
        .coilStep(pick(0.25, 0.5, 1.0, 0.1, 0.3))
        .rounding(new Rounding(diameter, length, finer * diameter, finer * length));
  }

  private void proportions(ProblemDraft draft) {
    if (chance(0.5)) {
      draft.with(Bound.LEAST_INDEX, pick(1.2, 0.9 * index, index));
      draft.with(Bound.GREATEST_INDEX, index * between(1, 1.3));
    }
    if (chance(0.4)) {
      draft.with(Bound.FEWEST_COILS, coils * between(0.7, 1));
      draft.with(Bound.MOST_COILS, coils * between(1, 1.4));
    }
    if (chance(0.5)) {
      draft.with(Bound.PITCH_ANGLE, between(0.03, 0.3));
    }
    if (chance(0.5)) {
      draft.with(Bound.CLASH_ALLOWANCE, between(0.001, 0.3));
    }
    for (Bound bound : Bound.values()) {
      if (bound.compareTo(Bound.LEAST_INDEX) >= 0 && chance(0.15)) {
        draft.without(bound);
      }
    }
  }

  private void space(ProblemDraft draft) {
    double meanDiameter = index * wire;
    maybe(draft, Bound.BORE, (meanDiameter + wire) * between(1, 1.2));
    maybe(draft, Bound.ROD, (meanDiameter - wire) * between(0.8, 1));
    if (draft.bound(Bound.BORE).isPresent() || draft.bound(Bound.ROD).isPresent()) {
      draft.with(Bound.CLEARANCE, meanDiameter * between(0.001, 0.05));
    }
    maybe(draft, Bound.OUTSIDE_DIAMETER, (meanDiameter + wire) * between(0.98, 1.2));
    maybe(draft, Bound.INSIDE_DIAMETER, (meanDiameter - wire) * between(0.8, 1.02));
    maybe(draft, Bound.FREE_LENGTH, line.freeLength() * between(0.998, 1.1));
    maybe(draft, Bound.SOLID_LENGTH, ends.solidLength(coils, wire) * between(0.95, 1.2));
  }

  private void stress(ProblemDraft draft) {
    draft.correction(pick(StressCorrection.values()));
    for (Bound bound : new Bound[] {Bound.STRESS_AT_LOAD, Bound.STRESS_AT_SOLID}) {
      if (chance(0.4)) {
        draft.with(bound, between(0.3, 0.65));
      } else if (chance(0.3)) {
        draft.without(bound);
      }
    }
  }

  private void stability(ProblemDraft draft) {
    draft.buckling(pick(BucklingRule.values()));
    if (chance(0.7)) {
      draft.seats(pick(Seating.values()));
    }
    double own = Surge.firstFrequency(wire, index * wire, coils, SHEAR_MODULUS, 7850);
    maybe(draft, Bound.SURGE_FREQUENCY, own * between(0.7, 1.1));
  }

  private void maybe(ProblemDraft draft, Bound bound, double value) {
    if (chance(0.3) && value > Finding.TOLERANCE) {
      draft.with(bound, value);
    }
  }

  private boolean chance(double share) {
    return random.nextDouble() < share;
  }

  private double between(double least, double most) {
    return least + random.nextDouble() * (most - least);
  }

  @SafeVarargs
  private <T> T pick(T... from) {
    return from[random.nextInt(from.length)];
  }
}
