package coilwright.rank;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Percentage.withPercentage;

import coilwright.material.WireSize;
import coilwright.search.GradeDraft;
import coilwright.spring.CompressionSpring;
import coilwright.spring.CompressionState;
import coilwright.spring.Duty;
import coilwright.spring.EndType;
import coilwright.spring.LoadPoint;
import coilwright.spring.Seating;
import coilwright.spring.StressCorrection;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The cost proxy adds up as it says it does. */
class CostTest {

  @Test
  void itsTermsAddUp() {
    Cost cost = Cost.of(spring(EndType.SQUARED_GROUND, 2));
    assertThat(cost.terms().stream().mapToDouble(Cost.Term::value).sum())
        .isCloseTo(cost.total(), withPercentage(1e-12));
  }

  @Test
  void wireGoesWithCostIndexAndMassAndScrap() {
    CompressionState spring = spring(EndType.SQUARED_GROUND, 2);
    assertThat(Cost.of(spring).wire())
        .isCloseTo(2 * 1000 * spring.mass() * 1.03, withPercentage(1e-12));
  }

  @Test
  void onlyGroundEndsAreGround() {
    assertThat(Cost.of(spring(EndType.SQUARED, 2)).ends()).isZero();
    assertThat(Cost.of(spring(EndType.SQUARED_GROUND, 2)).ends()).isPositive();
  }

  @Test
  void aDearerGradeCostsMoreInProportion() {
    assertThat(Cost.of(spring(EndType.SQUARED, 6)).total())
        .isCloseTo(3 * Cost.of(spring(EndType.SQUARED, 2)).total(), withPercentage(1e-12));
  }

  private static CompressionState spring(EndType ends, double costIndex) {
    return new CompressionState(
        new CompressionSpring(
            GradeDraft.of("steel", 1900)
                .weight(7850, costIndex)
                .grade()
                .drawnTo(WireSize.explicit("1.4 mm", 1.4)),
            12.2,
            8,
            38.7,
            ends),
        new Duty(
            List.of(LoadPoint.at(22, 45)), StressCorrection.BERGSTRAESSER, Seating.usualFor(ends)));
  }
}
