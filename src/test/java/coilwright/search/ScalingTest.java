package coilwright.search;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Percentage.withPercentage;

import coilwright.spring.CompressionState;
import coilwright.spring.LoadLine;
import coilwright.spring.Rounding;
import coilwright.unit.Dimension;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The same problem in other units, or of another size, has the same answer in proportion. */
class ScalingTest {

  private static final double MM = 1;
  private static final double INCH = Dimension.LENGTH.unit("in").orElseThrow().factor();
  private static final double POUND = Dimension.FORCE.unit("lbf").orElseThrow().factor();

  @Test
  void anInchFileHasTheAnswerOfTheMetricFileThatSaysTheSame() {
    Answer<CompressionState> metric = answer(inMillimetresAndNewtons());
    Answer<CompressionState> inch = answer(inInchesAndPounds());
    assertThat(metric.candidates()).isGreaterThan(20);
    inProportion(metric, inch, MM, 1);
    assertThat(inch.ruledOut()).isEqualTo(metric.ruledOut());
    assertThat(inch.conflicts()).hasSameSizeAs(metric.conflicts());
  }

  /** A feed-water valve's spring, every number as it stands in a metric file. */
  private static ProblemDraft inMillimetresAndNewtons() {
    return new ProblemDraft()
        .loads(LoadLine.through(31.75, 17.792886461042, 22.225, 44.482216152605), 31.75, 22.225)
        .materials(List.of("music-wire", "hard-drawn", "stainless-302"))
        .sizes(1.27, 1.3208, 1.397, 1.4224, 1.524, 1.6256, 1.778)
        .rounding(new Rounding(0.0127, 0.127, 0.0127, 0.127))
        .with(Bound.BORE, 16.51)
        .with(Bound.ROD, 8.382)
        .with(Bound.CLEARANCE, 0.381)
        .with(Bound.SOLID_LENGTH, 17.78)
        .with(Bound.FREE_LENGTH, 45.72);
  }

  /** The same in an inch file. */
  private static ProblemDraft inInchesAndPounds() {
    LoadLine line = LoadLine.through(1.25 * INCH, 4 * POUND, 0.875 * INCH, 10 * POUND);
    double step = 0.0005 * INCH;
    return new ProblemDraft()
        .loads(line, 1.25 * INCH, 0.875 * INCH)
        .materials(List.of("music-wire", "hard-drawn", "stainless-302"))
        .sizes(inches(0.05, 0.052, 0.055, 0.056, 0.06, 0.064, 0.07))
        .rounding(new Rounding(step, 0.005 * INCH, step, 0.005 * INCH))
        .with(Bound.BORE, 0.65 * INCH)
        .with(Bound.ROD, 0.33 * INCH)
        .with(Bound.CLEARANCE, 0.015 * INCH)
        .with(Bound.SOLID_LENGTH, 0.7 * INCH)
        .with(Bound.FREE_LENGTH, 1.8 * INCH);
  }

  private static double[] inches(double... values) {
    return Arrays.stream(values).map(value -> value * INCH).toArray();
  }

  @ParameterizedTest
  @ValueSource(doubles = {0.5, 3.7, 128})
  void forcesStrengthAndModuliTogetherChangeNoDimension(double factor) {
    inProportion(answer(steel(1, 1)), answer(steel(1, factor)), 1, factor);
  }

  @ParameterizedTest
  @ValueSource(doubles = {0.25, 2, 5.3})
  void lengthsAndTheRootsOfForcesChangeEveryDimensionAlike(double factor) {
    double volume = factor * factor * factor;
    inProportion(answer(steel(1, 1)), answer(steel(factor, 1)), factor, volume);
  }

  /**
   * A problem on another scale. A frequency goes with the root of modulus over density, and with
   * the inverse of the size.
   *
   * @param size by how much every length is longer
   * @param strength by how much strength, moduli and density are greater
   */
  private static ProblemDraft steel(double size, double strength) {
    double force = strength * size * size;
    LoadLine line = LoadLine.through(32 * size, 18 * force, 22 * size, 45 * force);
    Rounding steps = new Rounding(0.01 * size, 0.1 * size, 0.01 * size, 0.1 * size);
    return new ProblemDraft()
        .loads(line, 32 * size, 22 * size)
        .own(
            GradeDraft.of("steel", 1800 * strength)
                .moduli(80_000 * strength, 205_000 * strength)
                .weight(7850 * strength, 1)
                .grade())
        .sizes(1.2 * size, 1.3 * size, 1.4 * size, 1.5 * size, 1.6 * size)
        .rounding(steps)
        .with(Bound.BORE, 16.2 * size)
        .with(Bound.CLEARANCE, 0.3 * size)
        .with(Bound.SURGE_FREQUENCY, 300 / size)
        .with(Bound.SOLID_LENGTH, 19 * size);
  }

  private static Answer<CompressionState> answer(ProblemDraft draft) {
    return new CompressionSearch()
        .search(draft.problem(), WireChoice.of(draft.problem(), Searched.CATALOGUE));
  }

  private static void inProportion(
      Answer<CompressionState> one, Answer<CompressionState> other, double size, double mass) {
    assertThat(one.candidates()).isPositive();
    assertThat(other.wires()).isEqualTo(one.wires());
    List<CompressionState> before = springs(one);
    List<CompressionState> after = springs(other);
    assertThat(after).hasSameSizeAs(before);
    for (int i = 0; i < before.size(); i++) {
      inProportion(before.get(i), after.get(i), size, mass);
    }
  }

  private static List<CompressionState> springs(Answer<CompressionState> answer) {
    return answer.feasible().stream().flatMap(List::stream).map(Candidate::state).toList();
  }

  private static void inProportion(
      CompressionState before, CompressionState after, double size, double mass) {
    assertThat(after.wire().grade().id()).isEqualTo(before.wire().grade().id());
    assertThat(after.coils()).isEqualTo(before.coils());
    assertThat(after.endForm()).isEqualTo(before.endForm());
    assertThat(after.spring().meanDiameter())
        .isCloseTo(size * before.spring().meanDiameter(), withPercentage(1e-9));
    assertThat(after.mass()).isCloseTo(mass * before.mass(), withPercentage(1e-9));
  }
}
