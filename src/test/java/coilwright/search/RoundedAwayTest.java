package coilwright.search;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import coilwright.limit.CoilSet;
import coilwright.problem.LimitName;
import coilwright.spring.CompressionState;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Conflicts of wires that have unrounded springs but no practical one: the coil step is part of
 * them, and to the others are left only counts at which the rounded spring holds.
 */
class RoundedAwayTest {

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("coilwright.search.Searched#seeds")
  void theCoilStepLeavesPracticalCounts(long seed) {
    roundedAway(seed)
        .forEach(
            wire ->
                part(wire, LimitName.COIL_STEP)
                    .intervals()
                    .forEach(interval -> isPractical(wire, interval)));
  }

  private static void isPractical(Searched wire, CoilSet.Interval interval) {
    assertThat(interval.from()).as(wire.toString()).isEqualTo(interval.to());
    double steps = interval.from() / wire.coilStep();
    assertThat(steps).as(wire.toString()).isCloseTo(Math.rint(steps), within(1e-9));
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("coilwright.search.Searched#seeds")
  void everyCountThatTheStepLeavesFailsWhatDoesNotLeaveIt(long seed) {
    roundedAway(seed)
        .forEach(
            wire ->
                part(wire, LimitName.COIL_STEP)
                    .intervals()
                    .forEach(interval -> isRefusedRightly(wire, interval.from())));
  }

  private static void isRefusedRightly(Searched wire, double coils) {
    Map<LimitName, CoilSet> alone = wire.alone();
    Optional<CompressionState> rounded = wire.family().rounded(coils);
    for (Conflict.Part part : wire.parts()) {
      boolean left = !part.coils().intersect(CoilSet.of(coils, coils)).isEmpty();
      CoilSet before = alone.getOrDefault(part.limit(), CoilSet.ALL);
      boolean leftBefore = !before.intersect(CoilSet.of(coils, coils)).isEmpty();
      if (part.limit() != LimitName.COIL_STEP && !left && leftBefore) {
        assertThat(rounded.filter(spring -> wire.holds(part.limit(), spring)))
            .as("%s: %s at %s coils", wire, part.limit(), coils)
            .isEmpty();
      }
    }
  }

  @Test
  void aRangeBetweenTwoPracticalCountsCrossesTheCoilStep() {
    Searched wire = only(8.05, 8.2);
    assertThat(wire.outcome().conflict().orElseThrow().limits())
        .containsExactly(LimitName.ACTIVE_COILS, LimitName.COIL_STEP);
    assertThat(part(wire, LimitName.ACTIVE_COILS).least()).isCloseTo(8.05, within(1e-6));
    assertThat(part(wire, LimitName.ACTIVE_COILS).greatest()).isCloseTo(8.2, within(1e-6));
    assertThat(part(wire, LimitName.COIL_STEP))
        .isEqualTo(
            new CoilSet(List.of(new CoilSet.Interval(8, 8), new CoilSet.Interval(8.25, 8.25))));
    assertThat(wire.outcome().ruledOutBy())
        .containsExactly(LimitName.ACTIVE_COILS, LimitName.COIL_STEP);
  }

  @Test
  void aRangeOfOneImpracticalCountCrossesTheCoilStep() {
    assertThat(only(8.2, 8.2).outcome().conflict().orElseThrow().limits())
        .containsExactly(LimitName.ACTIVE_COILS, LimitName.COIL_STEP);
  }

  @Test
  void aRangeOfOnePracticalCountHoldsIt() {
    assertThat(only(8.25, 8.25).counts()).containsExactly(8.25);
  }

  private static Searched only(double fewest, double most) {
    ProblemDraft draft =
        Drafts.plain().with(Bound.FEWEST_COILS, fewest).with(Bound.MOST_COILS, most);
    return Searched.wiresOf("few coils", draft.problem()).findFirst().orElseThrow();
  }

  private static CoilSet part(Searched wire, LimitName name) {
    return wire.parts().stream()
        .filter(part -> part.limit() == name)
        .findFirst()
        .orElseThrow()
        .coils();
  }

  private static List<Searched> roundedAway(long seed) {
    return Searched.failedOf(seed).stream()
        .filter(wire -> wire.parts().stream().anyMatch(part -> part.limit() == LimitName.COIL_STEP))
        .toList();
  }
}
