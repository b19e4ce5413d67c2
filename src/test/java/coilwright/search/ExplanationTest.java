package coilwright.search;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.limit.CoilSet;
import coilwright.problem.LimitName;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** Which limits a conflict names, given the coil counts that each leaves. */
class ExplanationTest {

  private static final CoilSet FROM_9 = CoilSet.of(9, Double.POSITIVE_INFINITY);
  private static final CoilSet TO_7 = CoilSet.of(0, 7);
  private static final CoilSet TO_8 = CoilSet.of(0, 8);
  private static final CoilSet APART =
      new CoilSet(
          List.of(new CoilSet.Interval(0, 4), new CoilSet.Interval(10, Double.POSITIVE_INFINITY)));

  private final Map<LimitName, CoilSet> sets = new EnumMap<>(LimitName.class);

  @Test
  void nothingWhereSomethingIsLeft() {
    sets.put(LimitName.BORE, FROM_9);
    sets.put(LimitName.ROD, CoilSet.of(0, 9));
    assertThat(named()).isEmpty();
  }

  @Test
  void twoThatCross() {
    sets.put(LimitName.STRESS_AT_LOAD, FROM_9);
    sets.put(LimitName.SOLID_LENGTH, TO_8);
    assertThat(named()).containsExactly(LimitName.STRESS_AT_LOAD, LimitName.SOLID_LENGTH);
  }

  @Test
  void thePairFarthestApart() {
    sets.put(LimitName.STRESS_AT_LOAD, FROM_9);
    sets.put(LimitName.SOLID_LENGTH, TO_8);
    sets.put(LimitName.CLASH_ALLOWANCE, TO_7);
    sets.put(LimitName.PITCH_ANGLE, CoilSet.of(7.5, Double.POSITIVE_INFINITY));
    assertThat(named()).containsExactly(LimitName.STRESS_AT_LOAD, LimitName.CLASH_ALLOWANCE);
  }

  @Test
  void theFirstInTheListOfNamesOfPairsEquallyFarApart() {
    sets.put(LimitName.BORE, FROM_9);
    sets.put(LimitName.STRESS_AT_SOLID, FROM_9);
    sets.put(LimitName.ROD, TO_8);
    assertThat(named()).containsExactly(LimitName.STRESS_AT_SOLID, LimitName.ROD);
  }

  @Test
  void oneThatNoCountMeetsByItself() {
    sets.put(LimitName.STRESS_AT_LOAD, FROM_9);
    sets.put(LimitName.SOLID_LENGTH, TO_7);
    sets.put(LimitName.FREE_LENGTH, CoilSet.EMPTY);
    sets.put(LimitName.BUCKLING, CoilSet.EMPTY);
    assertThat(named()).containsExactly(LimitName.FREE_LENGTH);
  }

  @Test
  void threeWhereEveryTwoAgree() {
    sets.put(LimitName.STRESS_AT_LOAD, CoilSet.of(3, Double.POSITIVE_INFINITY));
    sets.put(LimitName.SPRING_INDEX, CoilSet.of(5, 20));
    sets.put(LimitName.SOLID_LENGTH, TO_8);
    sets.put(LimitName.BUCKLING, APART);
    assertThat(named())
        .containsExactly(LimitName.SPRING_INDEX, LimitName.SOLID_LENGTH, LimitName.BUCKLING);
  }

  @Test
  void distanceIsToTheNearestRange() {
    assertThat(APART.distanceTo(CoilSet.of(5, 8))).isEqualTo(1);
    assertThat(APART.distanceTo(CoilSet.of(5, 11))).isZero();
    assertThat(APART.distanceTo(CoilSet.EMPTY)).isInfinite();
  }

  private List<LimitName> named() {
    return new Explanation(sets).parts().stream().map(Conflict.Part::limit).toList();
  }
}
