package coilwright.search;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Percentage.withPercentage;

import coilwright.material.WireGrade;
import coilwright.spring.Method;
import coilwright.spring.Rounding;
import coilwright.spring.TorqueState;
import coilwright.spring.TorsionState;
import java.util.Arrays;
import java.util.List;
import java.util.function.DoubleFunction;
import java.util.stream.Stream;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * A torsion spring of another size: with every length k times as long and every force k^2 times as
 * great, hence every torque k^3 times, the same coil counts hold at the same angles, under the same
 * stresses.
 */
class TorsionScalingTest {

  private static final Percentage SAME = withPercentage(1e-9);
  private static final double[] SIZES = {0.25, 2, 5.3};

  private static final WireGrade STEEL =
      GradeDraft.of("steel", 1800).moduli(80_000, 205_000).grade();

  private record Case(DoubleFunction<TorsionDraft> draft, double size) {}

  static Stream<Case> cases() {
    List<DoubleFunction<TorsionDraft>> drafts =
        List.of(TorsionScalingTest::flap, TorsionScalingTest::lid, TorsionScalingTest::torques);
    return drafts.stream()
        .flatMap(draft -> Arrays.stream(SIZES).mapToObj(size -> new Case(draft, size)));
  }

  private static TorsionDraft scaled(double size) {
    double step = 0.01 * size;
    return new TorsionDraft()
        .own(STEEL)
        .sizes(1.8 * size, 1.9 * size, 2 * size, 2.1 * size, 2.2 * size)
        .rounding(new Rounding(step, 10 * step, step, 10 * step));
  }

  /** Round an arbor, with legs whose angle fixes the fraction of a coil. */
  private static TorsionDraft flap(double size) {
    return scaled(size)
        .loads(380 * size * size * size, 0.3, 0.8, 2)
        .legs(25 * size, 30 * size, 1.5, 2)
        .with(TorsionBound.ROD, 9 * size)
        .with(TorsionBound.CLEARANCE, 0.3 * size)
        .with(TorsionBound.BODY_LENGTH, 40 * size);
  }

  /** Unwound in a bore, by the standard. */
  private static TorsionDraft lid(double size) {
    return scaled(size)
        .opening()
        .loads(380 * size * size * size, 0.3, 0.5, 1.5)
        .legs(10 * size, 20 * size)
        .method(Method.EN_13906)
        .with(TorsionBound.BORE, 30 * size)
        .with(TorsionBound.CLEARANCE, 0.3 * size);
  }

  /** At whatever angle, on coated wire. */
  private static TorsionDraft torques(double size) {
    double cube = size * size * size;
    return scaled(size)
        .torques(300 * cube, 200 * cube, 600 * cube)
        .coating(0.02 * size)
        .with(TorsionBound.OUTSIDE_DIAMETER, 22 * size);
  }

  @ParameterizedTest
  @MethodSource("cases")
  void everyDimensionGrowsAlikeAndNoStressChanges(Case problem) {
    List<TorsionState> before = springs(problem.draft().apply(1));
    List<TorsionState> after = springs(problem.draft().apply(problem.size()));
    assertThat(before).hasSizeGreaterThan(3);
    assertThat(after).hasSameSizeAs(before);
    for (int i = 0; i < before.size(); i++) {
      inProportion(before.get(i), after.get(i), problem.size());
    }
  }

  private static void inProportion(TorsionState one, TorsionState other, double size) {
    double cube = size * size * size;
    assertThat(other.coils()).isEqualTo(one.coils());
    assertThat(other.spring().meanDiameter()).isCloseTo(size * one.spring().meanDiameter(), SAME);
    assertThat(other.rate()).isCloseTo(cube * one.rate(), SAME);
    assertThat(other.mass()).isCloseTo(cube * one.mass(), SAME);
    assertThat(other.freeLegAngle()).isCloseTo(one.freeLegAngle(), SAME);
    assertThat(other.leastInsideDiameter()).isCloseTo(size * one.leastInsideDiameter(), SAME);
    for (int i = 0; i < one.loads().size(); i++) {
      loaded(one.loads().get(i), other.loads().get(i), size);
    }
  }

  private static void loaded(TorqueState one, TorqueState other, double size) {
    assertThat(other.torque()).isCloseTo(size * size * size * one.torque(), SAME);
    assertThat(other.deflection()).isCloseTo(one.deflection(), SAME);
    assertThat(other.bendingStress()).isCloseTo(one.bendingStress(), SAME);
    assertThat(other.correctedBendingStress()).isCloseTo(one.correctedBendingStress(), SAME);
    assertThat(other.insideDiameter()).isCloseTo(size * one.insideDiameter(), SAME);
    assertThat(other.outsideDiameter()).isCloseTo(size * one.outsideDiameter(), SAME);
    assertThat(other.bodyLength()).isCloseTo(size * one.bodyLength(), SAME);
  }

  private static List<TorsionState> springs(TorsionDraft draft) {
    Answer<TorsionState> answer =
        new TorsionSearch()
            .search(draft.problem(), WireChoice.of(draft.problem(), Searched.CATALOGUE));
    return answer.feasible().stream().flatMap(List::stream).map(Candidate::state).toList();
  }
}
