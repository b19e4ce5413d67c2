package coilwright.search;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.problem.LimitName;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** A wire without candidate counts against every limit without which it had one. */
class RejectedTest {

  private static final double FEWEST = 0.5;
  private static final double CLOSE = 1.0025;
  private static final int WIDE = 5;
  private static final int EVERY_SO_MANY = 10;

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("coilwright.search.Searched#seeds")
  void countsWhatAScanWithoutEachLimitLetsThrough(long seed) {
    Searched.failedOf(seed).forEach(RejectedTest::countsRightly);
  }

  /** The coil step is left to the next test: without it there is no list of counts to scan. */
  private static void countsRightly(Searched wire) {
    Set<LimitName> expected = EveryCount.of(wire).decisive();
    Set<LimitName> counted = EnumSet.copyOf(wire.outcome().ruledOutBy());
    if (!expected.isEmpty()) {
      counted.remove(LimitName.COIL_STEP);
      assertThat(counted).as(wire.toString()).isEqualTo(expected);
    } else if (!counted.equals(EnumSet.of(LimitName.COIL_STEP))) {
      assertThat(counted).as(wire.toString()).isEqualTo(namesOfConflict(wire));
    }
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("coilwright.search.Searched#seeds")
  void countsTheCoilStepWhereOtherCountsWouldDo(long seed) {
    List<Searched> failed = Searched.failedOf(seed);
    for (int i = 0; i < failed.size(); i += EVERY_SO_MANY) {
      if (holdsWidelyBetweenSteps(failed.get(i))) {
        assertThat(failed.get(i).outcome().ruledOutBy())
            .as(failed.get(i).toString())
            .contains(LimitName.COIL_STEP);
      }
    }
  }

  private static Set<LimitName> namesOfConflict(Searched wire) {
    return wire.parts().stream().map(Conflict.Part::limit).collect(Collectors.toSet());
  }

  /** Whether counts that are no multiples of the step hold over a stretch of one percent. */
  private static boolean holdsWidelyBetweenSteps(Searched wire) {
    double last = EveryCount.last(wire.family());
    int inARow = 0;
    for (double coils = FEWEST; coils <= last; coils *= CLOSE) {
      inARow = wire.family().rounded(coils).filter(wire::holds).isPresent() ? inARow + 1 : 0;
      if (inARow == WIDE) {
        return true;
      }
    }
    return false;
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("coilwright.search.Searched#seeds")
  void aWireWithCandidatesCountsAgainstNothing(long seed) {
    Searched.wiresOf(seed).stream()
        .filter(wire -> !wire.failed())
        .forEach(wire -> assertThat(wire.outcome().ruledOutBy()).isEmpty());
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("coilwright.search.Searched#seeds")
  void aPhysicalFactCountsOnlyAsPartOfAConflict(long seed) {
    Searched.failedOf(seed).stream()
        .filter(wire -> wire.outcome().ruledOutBy().stream().anyMatch(name -> !name.removable()))
        .forEach(wire -> assertThat(wire.outcome().ruledOutBy()).isEqualTo(namesOfConflict(wire)));
  }
}
