package coilwright.rank;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.offset;

import coilwright.material.Catalogue;
import coilwright.problem.Problem;
import coilwright.problem.ProblemReader;
import coilwright.problem.Purpose;
import coilwright.problem.RankBy;
import coilwright.problem.Reading;
import coilwright.search.Answer;
import coilwright.search.Candidate;
import coilwright.search.CompressionSearch;
import coilwright.search.WireChoice;
import coilwright.spring.CompressionSpring;
import coilwright.spring.CompressionState;
import coilwright.unit.Dimension;
import coilwright.unit.Unit;
import java.io.IOException;
import java.io.InputStream;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/**
 * The discrete coil spring of Sandgren 1990, solved by the search and the order by mass.
 *
 * <p>Printed optimum, from memory and recomputed: wire 0.283 in, 9 coils, mean diameter 1.2230410
 * in, wire volume 2.65856 in^3, as later papers have it (Lampinen and Zelinka 1999). The benchmark
 * takes the helix for flat, the order by mass does not. The problem file says how the terms of the
 * benchmark stand in it; here they are written out as the benchmark has them, and every wire and
 * coil count is tried.
 */
class SandgrenTest {

  private static final String FILE = "/problems/sandgren-1990.yaml";
  private static final Unit INCH = Dimension.LENGTH.unit("in").orElseThrow();
  private static final double PRINTED = 1e-5;
  private static final int MOST_COILS = 70;

  private static final Problem PROBLEM = problem();
  private static final Answer<CompressionState> ANSWER =
      new CompressionSearch().search(PROBLEM, WireChoice.of(PROBLEM, Catalogue.load()));

  /**
   * A design of the benchmark [in].
   *
   * @param coils N
   * @param d wire diameter
   * @param dia mean diameter
   */
  private record Design(int coils, double d, double dia) {

    private static final double GREATEST = 1000;
    private static final double PRELOAD = 300;
    private static final double LEAST_DEFLECTION = 1.25;
    private static final double STRESS = 189_000;
    private static final double SHEAR_MODULUS = 11.5e6;
    private static final double JUST = 1e-9;

    /** The smallest coil that deflects enough between the loads. */
    static Design softEnough(int coils, double d) {
      double cube =
          LEAST_DEFLECTION * SHEAR_MODULUS * d * d * d * d / (8 * coils * (GREATEST - PRELOAD));
      return new Design(coils, d, Math.cbrt(cube));
    }

    /** The smallest coil of the benchmark: soft enough, and no tighter than an index of 3. */
    static Design smallest(int coils, double d) {
      return new Design(coils, d, Math.max(3 * d, softEnough(coils, d).dia));
    }

    double volume() {
      return Math.PI * Math.PI / 4 * dia * d * d * (coils + 2);
    }

    boolean holds() {
      double c = dia / d;
      double factor = (4 * c - 1) / (4 * c - 4) + 0.615 / c;
      double rate = SHEAR_MODULUS * d * d * d * d / (8 * coils * dia * dia * dia);
      return 8 * factor * GREATEST * dia / (Math.PI * d * d * d) <= STRESS
          && GREATEST / rate + 1.05 * (coils + 2) * d <= 14
          && d >= 0.2
          && dia + d <= 3
          && c >= 3 - JUST
          && PRELOAD / rate <= 6
          && (GREATEST - PRELOAD) / rate >= LEAST_DEFLECTION - JUST;
    }
  }

  @Test
  void theLightestIsThePrintedOptimum() {
    CompressionSpring best = ranked(false).get(0).state().spring();
    assertThat(INCH.fromInner(best.wireDiameter())).isCloseTo(0.283, offset(1e-12));
    assertThat(best.activeCoils()).isEqualTo(9);
    assertThat(INCH.fromInner(best.meanDiameter())).isCloseTo(1.22304, offset(PRINTED));
    assertThat(design(best).volume()).isCloseTo(2.65856, offset(PRINTED));
  }

  @Test
  void noDesignOfTheBenchmarkHasLessWire() {
    Design least =
        every(Design::smallest)
            .filter(Design::holds)
            .min(Comparator.comparingDouble(Design::volume))
            .orElseThrow();
    assertThat(least.volume()).isCloseTo(2.65856, offset(PRINTED));
    assertThat(least).isEqualTo(Design.softEnough(9, 0.283));
  }

  @Test
  void everyDesignOfThisRateIsFoundAndNoOther() {
    List<String> found =
        ANSWER.feasible().stream()
            .flatMap(List::stream)
            .map(candidate -> label(design(candidate.state().spring())))
            .toList();
    assertThat(found)
        .hasSizeGreaterThan(50)
        .containsExactlyInAnyOrderElementsOf(
            every(Design::softEnough).filter(Design::holds).map(SandgrenTest::label).toList());
  }

  @Test
  void theBestOfEachWireComesInTheBenchmarksOrder() {
    List<Design> best =
        ranked(false).stream().map(candidate -> design(candidate.state().spring())).toList();
    assertThat(best).isSortedAccordingTo(Comparator.comparingDouble(Design::volume));
    assertThat(best.stream().map(SandgrenTest::label))
        .containsExactly(
            "0.2830 9",
            "0.3070 5",
            "0.2630 17",
            "0.3310 3",
            "0.3620 3",
            "0.3940 4",
            "0.4375 6",
            "0.5000 11");
  }

  private interface Kind {
    Design of(int coils, double d);
  }

  private static Stream<Design> every(Kind kind) {
    return sizes()
        .boxed()
        .flatMap(d -> IntStream.rangeClosed(1, MOST_COILS).mapToObj(coils -> kind.of(coils, d)));
  }

  private static DoubleStream sizes() {
    return PROBLEM.make().wireSizes().stream()
        .mapToDouble(size -> Double.parseDouble(size.label().replace(" in", "")));
  }

  private static String label(Design design) {
    return String.format(Locale.ROOT, "%.4f %d", design.d, design.coils);
  }

  private static Design design(CompressionSpring spring) {
    return new Design(
        (int) spring.activeCoils(),
        INCH.fromInner(spring.wireDiameter()),
        INCH.fromInner(spring.meanDiameter()));
  }

  private static List<Candidate<CompressionState>> ranked(boolean everyCount) {
    return Order.ranked(ANSWER, RankBy.MASS, everyCount);
  }

  private static Problem problem() {
    try (InputStream in = SandgrenTest.class.getResourceAsStream(FILE)) {
      Reading reading = ProblemReader.read(in.readAllBytes(), Purpose.SHORTLIST, Catalogue.load());
      assertThat(reading.faults()).isEmpty();
      return reading.problem().orElseThrow();
    } catch (IOException e) {
      throw new IllegalStateException(e);
    }
  }
}
