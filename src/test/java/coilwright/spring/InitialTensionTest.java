package coilwright.spring;

import static coilwright.published.Published.Column.INDEX;
import static coilwright.published.Published.Column.QUANTITY;
import static coilwright.published.Published.Column.STRESS;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import coilwright.published.Published;
import coilwright.source.Evidence;
import coilwright.unit.Dimension;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * The preferred initial tension by both relations; neither was seen, so that each holds the other.
 */
class InitialTensionTest {

  static Stream<Published> values() {
    return Published.ofGroup("initial tension", INDEX);
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("values")
  void isAsItsRelationHasIt(Published row) {
    InitialTension relation =
        row.file().entry("source").equals("Norton")
            ? InitialTension.NORTON
            : InitialTension.SHIGLEY;
    double index = row.number(INDEX);
    double stress =
        switch (row.text(QUANTITY)) {
          case "least" -> relation.least(index);
          case "middle" -> relation.middle(index);
          default -> relation.greatest(index);
        };
    assertThat(stress).isCloseTo(row.inner(STRESS, Dimension.STRESS), row.closeness());
  }

  /** Two authors drew lines through one chart: their middles agree to 4 % from index 4 to 12. */
  @Test
  void theRelationsAgree() {
    for (double index = 4; index <= 12; index += 0.5) {
      double ratio = InitialTension.NORTON.middle(index) / InitialTension.SHIGLEY.middle(index);
      assertThat(ratio).as("at " + index).isCloseTo(1, within(0.04));
    }
  }

  @ParameterizedTest
  @EnumSource
  void theRangeIsInOrderAndNeverBelowZero(InitialTension relation) {
    assertThat(relation.citation().evidence()).isEqualTo(Evidence.MEMORY);
    for (double index = 1.1; index <= 60; index += 0.1) {
      assertThat(relation.least(index)).isBetween(0.0, relation.greatest(index));
      assertThat(relation.middle(index)).isBetween(relation.least(index), relation.greatest(index));
    }
  }

  @ParameterizedTest
  @EnumSource
  void theSlopeIsThatOfTheLines(InitialTension relation) {
    for (double index = 4; index <= 18; index += 0.7) {
      double step = 1e-5;
      double least = relation.least(index + step) - relation.least(index - step);
      double greatest = relation.greatest(index + step) - relation.greatest(index - step);
      assertThat(relation.slopeAt(index, true)).isCloseTo(least / (2 * step), within(1e-4));
      assertThat(relation.slopeAt(index, false)).isCloseTo(greatest / (2 * step), within(1e-4));
    }
  }

  @Test
  void forceAndStressStandForEachOther() {
    double force = InitialTension.force(100, 16, 2);
    assertThat(force).isCloseTo(Math.PI * 8 * 100 / (8 * 16), within(1e-12));
    assertThat(ShearStress.uncorrected(force, 16, 2)).isCloseTo(100, within(1e-12));
  }
}
