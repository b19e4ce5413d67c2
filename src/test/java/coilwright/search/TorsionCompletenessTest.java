package coilwright.search;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import coilwright.limit.CoilSet;
import coilwright.limit.Limit;
import coilwright.limit.Reach;
import coilwright.limit.Trail;
import coilwright.problem.LimitName;
import coilwright.problem.Problem;
import coilwright.spring.TorsionState;
import java.util.EnumSet;
import java.util.HashSet;
import java.util.List;
import java.util.Random;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The search finds every practical torsion spring that holds, and no other, and says why not. */
class TorsionCompletenessTest {

  private static final int SAMPLES = 60;
  private static final double CLOSE = 1e-6;
  private static final String SEEDS = "coilwright.search.TorsionSearched#seeds";

  @ParameterizedTest(name = "seed {0}")
  @MethodSource(SEEDS)
  void findsWhatAScanOfEveryCountFinds(long seed) {
    TorsionSearched.wiresOf(seed)
        .forEach(wire -> assertThat(wire.found()).as(wire.toString()).isEqualTo(wire.held()));
  }

  /** The coil step aside: without it there is no list of counts to scan. */
  @ParameterizedTest(name = "seed {0}")
  @MethodSource(SEEDS)
  void countsAgainstAWireWhatAScanWithoutEachLimitLetsThrough(long seed) {
    TorsionSearched.wiresOf(seed).stream()
        .filter(TorsionSearched::failed)
        .forEach(TorsionCompletenessTest::countsRightly);
  }

  private static void countsRightly(TorsionSearched wire) {
    Set<LimitName> expected = wire.decisive();
    Set<LimitName> counted = EnumSet.copyOf(wire.outcome().ruledOutBy());
    Set<LimitName> conflict =
        wire.parts().stream().map(Conflict.Part::limit).collect(Collectors.toSet());
    if (!expected.isEmpty()) {
      counted.remove(LimitName.COIL_STEP);
      assertThat(counted).as(wire.toString()).isEqualTo(expected);
    } else if (!counted.equals(EnumSet.of(LimitName.COIL_STEP))) {
      assertThat(counted).as(wire.toString()).isEqualTo(conflict);
    }
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource(SEEDS)
  void everyConflictIsTrue(long seed) {
    for (TorsionSearched wire : TorsionSearched.wiresOf(seed)) {
      assertThat(wire.outcome().conflict().isPresent()).isEqualTo(wire.failed());
      if (wire.failed()) {
        List<CoilSet> sets = wire.parts().stream().map(Conflict.Part::coils).toList();
        assertThat(shared(sets, -1).isEmpty()).as("%s: %s", wire, wire.parts()).isTrue();
        for (int i = 0; i < sets.size(); i++) {
          assertThat(shared(sets, i).isEmpty()).as("%s without part %s", wire, i).isFalse();
        }
      }
    }
  }

  private static CoilSet shared(List<CoilSet> sets, int without) {
    return IntStream.range(0, sets.size())
        .filter(i -> i != without)
        .mapToObj(sets::get)
        .reduce(CoilSet.ALL, CoilSet::intersect);
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource(SEEDS)
  void whatALimitLeavesAgreesWithTheJudgingOfSprings(long seed) {
    List<TorsionSearched> wires = TorsionSearched.wiresOf(seed);
    for (int i = 0; i < wires.size(); i += 7) {
      for (Limit<TorsionState> limit : wires.get(i).limits()) {
        if (!limit.onlyAfterRounding()) {
          agrees(wires.get(i), limit);
        }
      }
    }
  }

  private static void agrees(TorsionSearched wire, Limit<TorsionState> limit) {
    CoilSet left = Reach.of(limit, new Trail<>(wire.family()));
    double fewest = wire.family().fewestCoils();
    double most = wire.family().mostCoils();
    for (int i = 0; i <= SAMPLES; i++) {
      double coils = Math.min(most, fewest * StrictMath.pow(most / fewest, i / (double) SAMPLES));
      boolean near =
          left.intervals().stream()
              .anyMatch(
                  interval ->
                      Math.abs(coils - interval.from()) <= CLOSE * coils
                          || Math.abs(coils - interval.to()) <= CLOSE * coils);
      if (!near) {
        assertThat(limit.judge(wire.family().at(coils)).holds())
            .as("%s: %s at %s coils, said to leave %s", wire, limit.name(), coils, left)
            .isEqualTo(!left.intersect(CoilSet.of(coils, coils)).isEmpty());
      }
    }
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource(SEEDS)
  void tighteningNeverAddsAndLooseningNeverRemoves(long seed) {
    Random random = new Random(seed);
    RandomTorsionDrafts.of(seed, 1)
        .forEach(
            draft -> {
              Set<String> found = ids(draft);
              for (TorsionBound bound : TorsionBound.values()) {
                draft
                    .bound(bound)
                    .ifPresent(
                        value -> {
                          double share = 0.1 * random.nextDouble();
                          double tighter = bound.tightened(value, share);
                          double looser = bound.tightened(value, -share);
                          assertThat(found).containsAll(ids(draft.copy().with(bound, tighter)));
                          assertThat(ids(draft.copy().with(bound, looser))).containsAll(found);
                        });
              }
            });
  }

  private static Set<String> ids(TorsionDraft draft) {
    Problem problem = draft.problem();
    Answer<TorsionState> answer =
        new TorsionSearch().search(problem, WireChoice.of(problem, Searched.CATALOGUE));
    Set<String> ids = new HashSet<>();
    answer
        .feasible()
        .forEach(
            wire ->
                wire.forEach(
                    found ->
                        ids.add(
                            found.state().wire().grade().id()
                                + " "
                                + found.state().wire().size().label()
                                + " "
                                + found.state().coils())));
    return ids;
  }

  /** The legs of every candidate stand at the angle asked when its load is on. */
  @ParameterizedTest(name = "seed {0}")
  @MethodSource(SEEDS)
  void theLegsStandAsAsked(long seed) {
    RandomTorsionDrafts.of(seed, 10).map(TorsionDraft::problem).forEach(this::standAsAsked);
  }

  private void standAsAsked(Problem problem) {
    problem
        .torsion()
        .orElseThrow()
        .legs()
        .angle()
        .ifPresent(
            angle ->
                TorsionSearched.wiresOf("legs", problem)
                    .flatMap(wire -> wire.outcome().candidates().stream())
                    .forEach(
                        found ->
                            assertThat(Math.cos(found.state().legAngleAt(1) - angle))
                                .isCloseTo(1, within(1e-12))));
  }

  @Test
  void theRandomProblemsAreWorthSearching() {
    long[] found = new long[2];
    Set<LimitName> conflicting = EnumSet.noneOf(LimitName.class);
    TorsionSearched.seeds()
        .boxed()
        .flatMap(seed -> TorsionSearched.wiresOf(seed).stream())
        .forEach(
            wire -> {
              found[wire.failed() ? 1 : 0]++;
              if (wire.failed()) {
                wire.parts().forEach(part -> conflicting.add(part.limit()));
              }
            });
    assertThat(found[0]).as("wires with candidates").isGreaterThan(500);
    assertThat(found[1]).as("wires without").isGreaterThan(1500);
    assertThat(conflicting)
        .contains(
            LimitName.SPRING_INDEX,
            LimitName.ACTIVE_COILS,
            LimitName.COIL_STEP,
            LimitName.BORE,
            LimitName.OUTSIDE_DIAMETER,
            LimitName.INSIDE_DIAMETER,
            LimitName.BENDING_STRESS,
            LimitName.ARBOR,
            LimitName.BODY_LENGTH);
  }
}
