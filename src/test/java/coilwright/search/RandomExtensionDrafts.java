package coilwright.search;

import coilwright.problem.HookLength;
import coilwright.problem.LoopPlanes;
import coilwright.spring.HookType;
import coilwright.spring.InitialTension;
import coilwright.spring.Method;
import coilwright.spring.Rate;
import coilwright.spring.Rounding;
import coilwright.spring.ShearStress;
import coilwright.spring.StressCorrection;
import java.util.Random;
import java.util.stream.IntStream;
import java.util.stream.Stream;

/**
 * Problems drawn at random around an extension spring that exists: its line of loads is asked, and
 * limits close to its own numbers, so that some wires fit, some just fail and some are far off. The
 * same seed gives the same problems.
 */
final class RandomExtensionDrafts {

  private static final double SHEAR_MODULUS = 80_000;
  private static final double ELASTIC_MODULUS = 200_000;

  private final Random random;
  private double wire;
  private double index;
  private double coils;
  private HookType hook;
  private double hookLength;
  private double tension;
  private double rate;
  private double free;
  private double greatest;

  private RandomExtensionDrafts(long seed) {
    this.random = new Random(seed);
  }

  /** As many drafts as asked. */
  static Stream<ExtensionDraft> of(long seed, int count) {
    RandomExtensionDrafts drafts = new RandomExtensionDrafts(seed);
    return IntStream.range(0, count).mapToObj(i -> drafts.next());
  }

  private ExtensionDraft next() {
    spring();
    ExtensionDraft draft = new ExtensionDraft();
    loads(draft);
    wires(draft);
    steps(draft);
    hooks(draft);
    proportions(draft);
    space(draft);
    stress(draft);
    return draft;
  }

  /** The spring that exists. */
  private void spring() {
    wire = 0.3 * StrictMath.pow(15, random.nextDouble());
    index = chance(0.2) ? between(2.2, 4) : between(4, 14);
    coils = 0.25 * (8 + random.nextInt(120));
    hook = pick(HookType.values());
    double mean = index * wire;
    double active = coils + 2 * hook.activeCoils(SHEAR_MODULUS, ELASTIC_MODULUS);
    rate = Rate.of(SHEAR_MODULUS, wire, mean, active);
    hookLength = hook.naturalShare() * (mean - wire) * (chance(0.5) ? 1 : between(0.9, 2));
    free = (coils + 1) * wire + 2 * hookLength;
    InitialTension relation = InitialTension.USUAL;
    double stress =
        relation.least(index)
            + between(-0.4, 1.4) * (relation.greatest(index) - relation.least(index));
    tension = Math.max(0, InitialTension.force(stress, mean, wire));
    double full = between(300, 900) / ShearStress.uncorrected(1, mean, wire);
    greatest = Math.max(1.05 * tension, full);
  }

  private void loads(ExtensionDraft draft) {
    double zero = free - tension / rate;
    double longest = zero + greatest / rate;
    double first = free + between(0, 0.6) * (longest - free);
    if (chance(0.2)) {
      draft.loads(rate, zero, longest);
    } else if (chance(0.2)) {
      draft.loads(rate, zero, first, (first + longest) / 2, longest);
    } else {
      draft.loads(rate, zero, longest, first);
    }
    if (chance(0.2)) {
      draft.lengthsOpen();
    }
    if (chance(0.2)) {
      draft.overtravel(longest * between(1, 1.3));
    }
  }

  private void wires(ExtensionDraft draft) {
    double needed = ShearStress.uncorrected(greatest, index * wire, wire) / 0.4;
    draft.own(
        GradeDraft.of("own-1", needed * between(0.8, 1.6))
            .moduli(SHEAR_MODULUS, ELASTIC_MODULUS)
            .grade(),
        GradeDraft.of("own-2", needed * between(1, 3))
            .moduli(SHEAR_MODULUS * between(0.8, 1.1), ELASTIC_MODULUS * between(0.8, 1.1))
            .weight(between(4000, 9000), between(0.5, 10))
            .grade());
    draft.sizes(
        random
            .doubles(3 + random.nextInt(7), 0.75 * wire, 1.35 * wire)
            .map(size -> Rounding.toStep(size, 0.01))
            .sorted()
            .toArray());
  }

  private void steps(ExtensionDraft draft) {
    double diameter = pick(0.0, 0.01, 0.01, 0.1, 0.5);
    double length = pick(0.0, 0.01, 0.1, 0.5);
    double finer = pick(1.0, 0.1);
    draft
        .coilStep(pick(0.25, 0.5, 1.0, 0.1, 0.3))
        .rounding(new Rounding(diameter, length, finer * diameter, finer * length));
    if (chance(0.2)) {
      draft.coating(wire * between(0.001, 0.03));
    }
  }

  private void hooks(ExtensionDraft draft) {
    draft.hooks(chance(0.3) ? HookType.values() : new HookType[] {hook});
    draft.planes(chance(0.7) ? LoopPlanes.ANY : pick(LoopPlanes.values()));
    draft.radii(chance(0.7) ? 0.5 : between(0.3, 0.8), chance(0.7) ? 0.25 : between(0.2, 0.6));
    switch (random.nextInt(5)) {
      case 0 -> draft.hookLength(HookLength.of(hookLength * between(0.95, 1.1)));
      case 1 -> draft.hookLength(HookLength.free());
      case 2 -> draft.hookLength(HookLength.free()).freeLength(free * between(0.98, 1.02));
      default -> draft.hookLength(HookLength.natural());
    }
    if (chance(0.3)) {
      draft.hookActive(between(0, 0.6));
    }
    if (chance(0.5)) {
      draft.anyTension();
    }
  }

  private void proportions(ExtensionDraft draft) {
    if (chance(0.5)) {
      draft.with(ExtensionBound.LEAST_INDEX, pick(1.5, 0.9 * index, index));
      draft.with(ExtensionBound.GREATEST_INDEX, index * between(1, 1.5));
    } else if (chance(0.4)) {
      draft.without(ExtensionBound.GREATEST_INDEX, ExtensionBound.LEAST_INDEX);
    }
    if (chance(0.3)) {
      draft.with(ExtensionBound.FEWEST_COILS, coils * between(0.3, 1));
    }
    // so that a scan of every count ends
    draft.with(ExtensionBound.MOST_COILS, coils * between(1, 2.5));
  }

  private void space(ExtensionDraft draft) {
    double mean = index * wire;
    maybe(draft, ExtensionBound.BORE, (mean + wire) * between(1, 1.3));
    maybe(draft, ExtensionBound.ROD, (mean - wire) * between(0.7, 1));
    if (chance(0.5)) {
      draft.with(ExtensionBound.CLEARANCE, mean * between(0.001, 0.05));
    }
    maybe(draft, ExtensionBound.OUTSIDE_DIAMETER, (mean + wire) * between(0.98, 1.3));
    maybe(draft, ExtensionBound.INSIDE_DIAMETER, (mean - wire) * between(0.7, 1.02));
    maybe(draft, ExtensionBound.FREE_LENGTH, free * between(0.95, 1.1));
    maybe(draft, ExtensionBound.EXTENDED_LENGTH, (free + greatest / rate) * between(0.8, 1.2));
    maybe(draft, ExtensionBound.PIN, (mean - wire) * between(0.6, 1.05));
  }

  private void stress(ExtensionDraft draft) {
    draft.correction(pick(StressCorrection.values()));
    if (chance(0.3)) {
      draft.method(Method.EN_13906);
    }
    for (ExtensionBound bound :
        new ExtensionBound[] {
          ExtensionBound.BODY_STRESS, ExtensionBound.HOOK_BENDING, ExtensionBound.HOOK_TORSION
        }) {
      if (chance(0.3)) {
        draft.with(bound, between(0.3, 0.8));
      } else if (chance(0.3)) {
        draft.without(bound);
      }
    }
  }

  private void maybe(ExtensionDraft draft, ExtensionBound bound, double value) {
    if (chance(0.25) && value > 0.01) {
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
