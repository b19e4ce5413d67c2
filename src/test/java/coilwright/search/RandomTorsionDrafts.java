package coilwright.search;

import coilwright.material.WireGrade;
import coilwright.spring.AngularRate;
import coilwright.spring.BendingFactor;
import coilwright.spring.BendingStress;
import coilwright.spring.Method;
import coilwright.spring.Rounding;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import java.util.stream.Stream;

/**
 * Problems of torsion springs drawn at random around a spring that exists: its line is asked, and
 * limits close to its own numbers, so that some wires fit, some just fail and some are far off. The
 * same seed gives the same problems.
 */
final class RandomTorsionDrafts {

  private static final double ELASTIC_MODULUS = 205_000;
  private static final List<String> GRADES =
      List.of("music-wire", "hard-drawn", "oil-tempered", "stainless-302", "en-10270-1-sm");

  private final Random random;
  private double wire;
  private double index;
  private double coils;
  private double legs;
  private double constant;
  private double rate;
  private double deflection;
  private double stress;
  private boolean closing;

  private RandomTorsionDrafts(long seed) {
    this.random = new Random(seed);
  }

  /** As many drafts as asked. */
  static Stream<TorsionDraft> of(long seed, int count) {
    RandomTorsionDrafts drafts = new RandomTorsionDrafts(seed);
    return IntStream.range(0, count).mapToObj(i -> drafts.next());
  }

  private TorsionDraft next() {
    spring();
    TorsionDraft draft = new TorsionDraft().constant(constant);
    if (!closing) {
      draft.opening();
    }
    loads(draft);
    shape(draft);
    wires(draft);
    proportions(draft);
    space(draft);
    stress(draft);
    return draft;
  }

  /** The spring that exists, at an ordinary stress. */
  private void spring() {
    wire = 0.3 * StrictMath.pow(20, random.nextDouble());
    index = chance(0.2) ? between(1.25, 4) : between(4, 12);
    coils = 0.25 * (4 + random.nextInt(chance(0.8) ? 24 : 80));
    legs = chance(0.3) ? 0 : index * wire * between(0, 8);
    constant = pick(AngularRate.HANDBOOK, AngularRate.FRICTIONLESS, 10.2);
    closing = chance(0.7);
    double meanDiameter = index * wire;
    double active = coils + legs / (3 * Math.PI * meanDiameter);
    rate = AngularRate.of(ELASTIC_MODULUS, wire, meanDiameter, active, constant);
    stress = between(500, 1500);
    deflection = stress / BendingStress.uncorrected(rate, wire);
  }

  private void loads(TorsionDraft draft) {
    double free = between(-10, 10);
    switch (random.nextInt(4)) {
      case 0 -> draft.loads(rate, free, deflection);
      case 1 -> draft.loads(rate, free, deflection, between(0.1, 0.5) * deflection, deflection / 2);
      case 2 -> draft.torques(rate, between(0.1, 0.9) * deflection * rate, deflection * rate);
      default -> draft.loads(rate, free, between(0.01, 0.9) * deflection, deflection);
    }
  }

  private void shape(TorsionDraft draft) {
    double first = legs * random.nextDouble();
    if (chance(0.4)) {
      draft.legs(first, legs - first, pick(0.0, 0.5, 1.0, random.nextDouble() * 2) * Math.PI, 1);
    } else {
      draft.legs(first, legs - first);
    }
    double diameter = pick(0.0, 0.01, 0.1, 0.3);
    draft
        .coilStep(pick(0.25, 0.5, 1.0, 0.1, 0.3))
        .rounding(new Rounding(diameter, 0, pick(1.0, 0.1) * diameter, 0));
    if (chance(0.3)) {
      draft.method(Method.EN_13906);
    }
    if (chance(0.2)) {
      draft.coating(wire * between(0.001, 0.05));
    }
  }

  /** Between 5 and 40 wires, in most problems about 20. */
  private void wires(TorsionDraft draft) {
    List<String> ids = new ArrayList<>(GRADES);
    ids.removeIf(id -> chance(0.75));
    WireGrade[] own =
        IntStream.rangeClosed(1, ids.isEmpty() || chance(0.6) ? 1 + random.nextInt(2) : 0)
            .mapToObj(this::own)
            .toArray(WireGrade[]::new);
    int grades = ids.size() + own.length;
    int sizes = Math.max((int) Math.ceil(5.0 / grades), random.nextInt(1 + 40 / grades));
    double[] drawn =
        random
            .doubles(sizes, 0.75 * wire, 1.3 * wire)
            .map(size -> Rounding.toStep(size, 0.01))
            .sorted()
            .toArray();
    draft.materials(ids).own(own).sizes(drawn);
  }

  private WireGrade own(int number) {
    double strength = stress / between(0.4, 0.9);
    return GradeDraft.of("own-" + number, strength)
        .moduli(80_000, ELASTIC_MODULUS * between(0.85, 1.1))
        .weight(between(4000, 9000), between(0.5, 10))
        .shares(between(0.01, 0.6), between(0.01, 0.6))
        .grade();
  }

  private void proportions(TorsionDraft draft) {
    if (chance(0.6)) {
      draft.with(TorsionBound.LEAST_INDEX, pick(1.2, 0.9 * index, index));
      draft.with(TorsionBound.GREATEST_INDEX, index * between(1, 1.5));
    }
    if (chance(0.5)) {
      draft.with(TorsionBound.FEWEST_COILS, coils * between(0.5, 1));
      draft.with(TorsionBound.MOST_COILS, coils * between(1, 2));
    }
    for (TorsionBound bound : TorsionBound.values()) {
      if (chance(0.2)) {
        draft.without(bound);
      }
    }
  }

  private void space(TorsionDraft draft) {
    double meanDiameter = index * wire;
    if (chance(0.5)) {
      draft.with(TorsionBound.CLEARANCE, pick(0.0, 0.02, 0.1) * meanDiameter);
    }
    if (chance(0.5)) {
      draft.with(TorsionBound.BORE, (meanDiameter + wire) * between(1, 1.3));
    }
    if (chance(0.5)) {
      draft.with(TorsionBound.ROD, Math.max(0.05, (meanDiameter - wire) * between(0.5, 1)));
    }
    if (chance(0.2)) {
      draft.with(TorsionBound.OUTSIDE_DIAMETER, (meanDiameter + wire) * between(0.95, 1.2));
    }
    if (chance(0.2)) {
      draft.with(TorsionBound.INSIDE_DIAMETER, (meanDiameter - wire) * between(0.7, 1.05));
    }
    if (chance(0.5)) {
      draft.with(TorsionBound.BODY_LENGTH, (coils + 1.3) * wire * between(0.9, 1.5));
    }
  }

  private void stress(TorsionDraft draft) {
    if (chance(0.3)) {
      draft.with(TorsionBound.STRESS, between(0.4, 1.1));
    } else if (chance(0.5)) {
      double inner = BendingFactor.INNER.at(index);
      draft.with(TorsionBound.STRESS, inner * between(0.4, 0.9));
    } else if (chance(0.1)) {
      draft.stressOff();
    }
  }

  private boolean chance(double share) {
    return random.nextDouble() < share;
  }

  private double between(double low, double high) {
    return low + (high - low) * random.nextDouble();
  }

  private double pick(double... values) {
    return values[random.nextInt(values.length)];
  }
}
