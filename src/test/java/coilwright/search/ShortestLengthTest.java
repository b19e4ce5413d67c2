package coilwright.search;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.limit.Limit;
import coilwright.problem.LimitName;
import coilwright.spring.CompressionFamily;
import coilwright.spring.CompressionSpring;
import coilwright.spring.CompressionState;
import java.util.List;
import java.util.Optional;
import java.util.stream.LongStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Where the lengths are left open, a spring is the shortest that every limit allows: a scan of free
 * lengths finds no shorter one, and where the shortest fails no longer one would do.
 */
class ShortestLengthTest {

  private static final int EVERY_SO_MANY = 7;
  private static final double FINER = 1.004;
  private static final double LONGEST = 3;

  static LongStream seeds() {
    return LongStream.range(2000, 2010);
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void noLengthBelowItHolds(long seed) {
    for (Searched wire : Searched.wiresOf(seed)) {
      for (var candidate : wire.outcome().candidates()) {
        CompressionState spring = candidate.state();
        double step = wire.family().rounding().lengthStepAt(spring.spring().meanDiameter());
        double shorter = spring.spring().freeLength() - Math.max(step, 1e-6);
        assertThat(failed(wire, spring, shorter))
            .as("%s, %s coils, %s mm", wire, spring.coils(), shorter)
            .isPresent();
      }
    }
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void whereItFailsNoLengthHolds(long seed) {
    List<Searched> wires = Searched.wiresOf(seed);
    for (int i = 0; i < wires.size(); i += EVERY_SO_MANY) {
      Searched wire = wires.get(i);
      double last = Math.min(20, wire.family().mostCoils());
      for (double coils = wire.coilStep(); coils <= last; coils += wire.coilStep()) {
        Optional<CompressionState> shortest = wire.family().rounded(coils);
        if (shortest.isPresent() && !wire.holds(shortest.get())) {
          noneHolds(wire, shortest.get());
        }
      }
    }
  }

  private static void noneHolds(Searched wire, CompressionState shortest) {
    double least = shortest.spring().freeLength();
    for (double length = least; length < LONGEST * least; length *= FINER) {
      assertThat(failed(wire, shortest, length))
          .as("%s, %s coils, %s mm", wire, shortest.coils(), length)
          .isPresent();
    }
  }

  /** The first limit that a spring fails once it is given another free length. */
  private static Optional<LimitName> failed(
      Searched wire, CompressionState spring, double freeLength) {
    CompressionFamily family = wire.family();
    CompressionState other =
        new CompressionState(
            new CompressionSpring(
                family.wire(),
                spring.spring().meanDiameter(),
                spring.coils(),
                freeLength,
                family.ends()),
            family.duty());
    return wire.limits().stream()
        .filter(limit -> !limit.judge(other).holds())
        .map(Limit::name)
        .findFirst();
  }
}
