package coilwright.search;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Percentage.withPercentage;

import coilwright.limit.CoilSet;
import coilwright.limit.Limit;
import coilwright.limit.Reach;
import coilwright.limit.Trail;
import coilwright.problem.LimitName;
import coilwright.spring.CompressionState;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * The coil counts that a limit leaves are those at which its judging of unrounded springs holds.
 */
class ReachTest {

  private static final int SAMPLES = 300;
  private static final double CLOSE = 1e-6;

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("coilwright.search.Searched#seeds")
  void agreesWithTheJudgingOfSprings(long seed) {
    List<Searched> wires = Searched.wiresOf(seed);
    for (int i = 0; i < wires.size(); i += 10) {
      agrees(wires.get(i));
    }
  }

  private static void agrees(Searched wire) {
    Trail<CompressionState> trail = new Trail<>(wire.family());
    List<CompressionState> springs = springs(wire);
    for (Limit<CompressionState> limit : wire.limits()) {
      if (!limit.onlyAfterRounding()) {
        CoilSet left = Reach.of(limit, trail);
        boundsAreClose(wire, limit, left);
        springs.forEach(spring -> agrees(wire, limit, left, spring));
      }
    }
  }

  /** Springs all along a family, as many between one and ten coils as between ten and a hundred. */
  private static List<CompressionState> springs(Searched wire) {
    double fewest = wire.family().fewestCoils();
    double most = wire.family().mostCoils();
    return IntStream.rangeClosed(0, SAMPLES)
        .mapToObj(i -> fewest * StrictMath.pow(most / fewest, i / (double) SAMPLES))
        .map(coils -> wire.family().at(Math.min(coils, most)))
        .toList();
  }

  private static void agrees(
      Searched wire, Limit<CompressionState> limit, CoilSet left, CompressionState spring) {
    double coils = spring.coils();
    if (!near(left, coils)) {
      assertThat(limit.judge(spring).holds())
          .as("%s: %s at %s coils, said to leave %s", wire, limit.name(), coils, left)
          .isEqualTo(within(left, coils));
    }
  }

  private static void boundsAreClose(Searched wire, Limit<CompressionState> limit, CoilSet left) {
    for (CoilSet.Interval interval : left.intervals()) {
      if (interval.from() > 0) {
        turns(wire, limit, interval.from(), 1 + CLOSE);
      }
      if (interval.to() < Double.POSITIVE_INFINITY) {
        turns(wire, limit, interval.to(), 1 - CLOSE);
      }
    }
  }

  /** A bound holds just inside and fails just outside. */
  private static void turns(
      Searched wire, Limit<CompressionState> limit, double bound, double inward) {
    assertThat(limit.judge(wire.family().at(bound * inward)).holds())
        .as("%s: %s just inside %s coils", wire, limit.name(), bound)
        .isTrue();
    assertThat(limit.judge(wire.family().at(bound / inward)).holds())
        .as("%s: %s just outside %s coils", wire, limit.name(), bound)
        .isFalse();
  }

  private static boolean within(CoilSet left, double coils) {
    return left.intervals().stream()
        .anyMatch(interval -> coils >= interval.from() && coils <= interval.to());
  }

  private static boolean near(CoilSet left, double coils) {
    return left.intervals().stream()
        .anyMatch(
            interval ->
                Math.abs(coils - interval.from()) <= CLOSE * coils
                    || Math.abs(coils - interval.to()) <= CLOSE * coils);
  }

  @Test
  void twoLimitsWithTheSameBoundLeaveTheSame() {
    ProblemDraft draft =
        Drafts.plain()
            .with(Bound.ROD, 8)
            .with(Bound.CLEARANCE, 0.5)
            .with(Bound.INSIDE_DIAMETER, 8.5);
    Searched wire = Searched.wiresOf("same bound", draft.problem()).findFirst().orElseThrow();
    assertThat(wire.alone().get(LimitName.ROD).greatest())
        .isCloseTo(wire.alone().get(LimitName.INSIDE_DIAMETER).greatest(), withPercentage(1e-6));
  }
}
