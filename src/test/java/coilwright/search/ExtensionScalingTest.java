package coilwright.search;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Percentage.withPercentage;

import coilwright.material.WireGrade;
import coilwright.problem.HookLength;
import coilwright.problem.LoopPlanes;
import coilwright.spring.ExtensionLoad;
import coilwright.spring.ExtensionState;
import coilwright.spring.HookType;
import coilwright.spring.Rounding;
import java.util.Arrays;
import java.util.List;
import java.util.function.DoubleFunction;
import java.util.stream.Stream;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * An extension spring of another size: with every length k times as long and every force k^2 times
 * as great the same coil counts hold, under the same stresses. The preferred initial tension is a
 * stress that depends on the index alone, and goes along.
 */
class ExtensionScalingTest {

  private static final Percentage SAME = withPercentage(1e-9);
  private static final double[] SIZES = {0.25, 2, 5.3};

  private static final WireGrade STEEL =
      GradeDraft.of("steel", 1800).moduli(80_000, 205_000).grade();

  private record Case(DoubleFunction<ExtensionDraft> draft, double size) {}

  static Stream<Case> cases() {
    List<DoubleFunction<ExtensionDraft>> drafts =
        List.of(
            ExtensionScalingTest::door, ExtensionScalingTest::pair, ExtensionScalingTest::fitted);
    return drafts.stream()
        .flatMap(draft -> Arrays.stream(SIZES).mapToObj(size -> new Case(draft, size)));
  }

  private static ExtensionDraft scaled(double size) {
    double step = 0.01 * size;
    return new ExtensionDraft()
        .own(STEEL)
        .sizes(1.1 * size, 1.2 * size, 1.3 * size, 1.4 * size, 1.5 * size)
        .rounding(new Rounding(step, 10 * step, step, 10 * step));
  }

  /** With natural hooks that a pin passes. */
  private static ExtensionDraft door(double size) {
    return scaled(size)
        .loads(0.8 * size, 47.5 * size, 60 * size, 85 * size)
        .with(ExtensionBound.OUTSIDE_DIAMETER, 14 * size)
        .with(ExtensionBound.PIN, 5 * size);
  }

  /** With two kinds of hooks in planes at right angles, in a bore. */
  private static ExtensionDraft pair(double size) {
    return scaled(size)
        .loads(0.9 * size, 40 * size, 55 * size, 75 * size)
        .hooks(HookType.FULL_LOOP, HookType.HALF_LOOP)
        .hookActive(0.3)
        .planes(LoopPlanes.RIGHT_ANGLE)
        .with(ExtensionBound.BORE, 15 * size)
        .with(ExtensionBound.CLEARANCE, 0.4 * size)
        .with(ExtensionBound.EXTENDED_LENGTH, 80 * size);
  }

  /** With hooks that follow a free length, and any initial tension. */
  private static ExtensionDraft fitted(double size) {
    return scaled(size)
        .loads(0.8 * size, 47.5 * size, 62 * size, 85 * size)
        .hookLength(HookLength.free())
        .freeLength(55 * size)
        .coating(0.01 * size)
        .anyTension();
  }

  @ParameterizedTest
  @MethodSource("cases")
  void everyDimensionGrowsAlikeAndNoStressChanges(Case problem) {
    List<ExtensionState> before = springs(problem.draft().apply(1));
    List<ExtensionState> after = springs(problem.draft().apply(problem.size()));
    assertThat(before).hasSizeGreaterThan(3);
    assertThat(after).hasSameSizeAs(before);
    for (int i = 0; i < before.size(); i++) {
      inProportion(before.get(i), after.get(i), problem.size());
    }
  }

  private static void inProportion(ExtensionState one, ExtensionState other, double size) {
    assertThat(other.coils()).isEqualTo(one.coils());
    assertThat(other.endForm()).isEqualTo(one.endForm());
    assertThat(other.spring().meanDiameter()).isCloseTo(size * one.spring().meanDiameter(), SAME);
    assertThat(other.freeLength()).isCloseTo(size * one.freeLength(), SAME);
    assertThat(other.rate()).isCloseTo(size * one.rate(), SAME);
    assertThat(other.initialTension()).isCloseTo(size * size * one.initialTension(), SAME);
    assertThat(other.initialTensionStress()).isCloseTo(one.initialTensionStress(), SAME);
    assertThat(other.mass()).isCloseTo(size * size * size * one.mass(), SAME);
    for (int i = 0; i < one.loads().size(); i++) {
      loaded(one.loads().get(i), other.loads().get(i), size);
    }
  }

  private static void loaded(ExtensionLoad one, ExtensionLoad other, double size) {
    assertThat(other.length()).isCloseTo(size * one.length(), SAME);
    assertThat(other.force()).isCloseTo(size * size * one.force(), SAME);
    assertThat(other.shearStress()).isCloseTo(one.shearStress(), SAME);
    assertThat(other.correctedShearStress()).isCloseTo(one.correctedShearStress(), SAME);
    assertThat(other.hookBendingStress()).isCloseTo(one.hookBendingStress(), SAME);
    assertThat(other.hookTorsionStress()).isCloseTo(one.hookTorsionStress(), SAME);
  }

  private static List<ExtensionState> springs(ExtensionDraft draft) {
    Answer<ExtensionState> answer =
        new ExtensionSearch()
            .search(draft.problem(), WireChoice.of(draft.problem(), Searched.CATALOGUE));
    return answer.feasible().stream().flatMap(List::stream).map(Candidate::state).toList();
  }
}
