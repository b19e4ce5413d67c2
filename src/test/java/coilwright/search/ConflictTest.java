package coilwright.search;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Percentage.withPercentage;

import coilwright.limit.CoilSet;
import coilwright.problem.LimitName;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Every conflict is true, and of several the one that is asked for. */
class ConflictTest {

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("coilwright.search.Searched#seeds")
  void everyWireWithoutCandidateHasOne(long seed) {
    Searched.wiresOf(seed)
        .forEach(
            wire -> assertThat(wire.outcome().conflict().isPresent()).isEqualTo(wire.failed()));
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("coilwright.search.Searched#seeds")
  void itsLimitsLeaveNothingTogetherButDoWithoutAnyOfThem(long seed) {
    Searched.failedOf(seed).forEach(wire -> leaveNothing(wire, wire.parts()));
  }

  private static void leaveNothing(Searched wire, List<Conflict.Part> parts) {
    assertThat(shared(parts).isEmpty()).as("%s: %s", wire, parts).isTrue();
    for (int i = 0; i < parts.size(); i++) {
      List<Conflict.Part> others = new ArrayList<>(parts);
      others.remove(i);
      assertThat(shared(others).isEmpty()).as("%s without part %s: %s", wire, i, parts).isFalse();
    }
  }

  private static CoilSet shared(List<Conflict.Part> parts) {
    return parts.stream().map(Conflict.Part::coils).reduce(CoilSet.ALL, CoilSet::intersect);
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("coilwright.search.Searched#seeds")
  void aLimitThatNoCountMeetsStandsAloneTheFirstInTheListOfNames(long seed) {
    Searched.failedOf(seed)
        .forEach(
            wire ->
                wire.alone().entrySet().stream()
                    .filter(entry -> entry.getValue().isEmpty())
                    .findFirst()
                    .ifPresent(first -> assertThat(names(wire)).containsExactly(first.getKey())));
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("coilwright.search.Searched#seeds")
  void aPairIsThePairFarthestApart(long seed) {
    Searched.failedOf(seed).forEach(ConflictTest::isFarthestApart);
  }

  private static void isFarthestApart(Searched wire) {
    Map<LimitName, CoilSet> alone = wire.alone();
    double widest = widest(new ArrayList<>(alone.values()));
    if (widest > 0 && alone.values().stream().noneMatch(CoilSet::isEmpty)) {
      assertThat(wire.parts()).as(wire.toString()).hasSize(2);
      assertThat(wire.parts().get(0).coils().distanceTo(wire.parts().get(1).coils()))
          .as(wire.toString())
          .isCloseTo(widest, withPercentage(1e-4));
      wire.parts().forEach(part -> isWhatItLeaves(wire, part, alone.get(part.limit())));
    }
  }

  private static double widest(List<CoilSet> sets) {
    double widest = 0;
    for (CoilSet one : sets) {
      for (CoilSet other : sets) {
        double gap = one.distanceTo(other);
        widest = gap < Double.POSITIVE_INFINITY ? Math.max(widest, gap) : widest;
      }
    }
    return widest;
  }

  private static void isWhatItLeaves(Searched wire, Conflict.Part part, CoilSet alone) {
    assertThat(part.coils().least())
        .as("%s: %s", wire, part)
        .isCloseTo(alone.least(), withPercentage(1e-4));
    if (alone.greatest() < Double.POSITIVE_INFINITY) {
      assertThat(part.coils().greatest())
          .as("%s: %s", wire, part)
          .isCloseTo(alone.greatest(), withPercentage(1e-4));
    } else {
      assertThat(part.coils().greatest()).as("%s: %s", wire, part).isInfinite();
    }
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("coilwright.search.Searched#seeds")
  void theCoilStepComesInOnlyWhereTheOthersLeaveSomething(long seed) {
    Searched.failedOf(seed)
        .forEach(
            wire ->
                assertThat(names(wire).contains(LimitName.COIL_STEP))
                    .as("%s: %s", wire, wire.parts())
                    .isEqualTo(leavesSomething(wire)));
  }

  private static boolean leavesSomething(Searched wire) {
    CoilSet left = wire.alone().values().stream().reduce(CoilSet.ALL, CoilSet::intersect);
    return !left.intersect(CoilSet.of(0, wire.family().mostCoils())).isEmpty();
  }

  private static List<LimitName> names(Searched wire) {
    return wire.parts().stream().map(Conflict.Part::limit).toList();
  }
}
