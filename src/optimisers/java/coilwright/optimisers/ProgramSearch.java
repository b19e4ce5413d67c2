package coilwright.optimisers;

import coilwright.limit.Limit;
import coilwright.material.Catalogue;
import coilwright.problem.Problem;
import coilwright.problem.ProblemReader;
import coilwright.problem.Purpose;
import coilwright.problem.Reading;
import coilwright.search.Answer;
import coilwright.search.CoilStep;
import coilwright.search.CompressionSearch;
import coilwright.search.CountingFamily;
import coilwright.search.Search;
import coilwright.search.WireChoice;
import coilwright.spring.CompressionFamily;
import coilwright.spring.CompressionState;
import coilwright.spring.Family;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.concurrent.atomic.AtomicLong;
import java.util.function.ToDoubleFunction;

/** The program's search of one problem file, counted and timed. */
final class ProgramSearch {

  private static final double WARM_UP_SECONDS = 1;
  private static final int ROUNDS = 11;

  private final Problem problem;
  private final List<CompressionFamily> families;
  private final List<Limit<CompressionState>> limits;
  private final CoilStep step;

  private ProgramSearch(Problem problem, Catalogue catalogue) {
    this.problem = problem;
    this.families =
        new CompressionSearch()
            .families(problem, WireChoice.of(problem, catalogue).wires()).stream()
                .sorted(
                    Comparator.comparingDouble(
                            (CompressionFamily family) -> family.wire().diameter())
                        .thenComparingDouble(family -> family.wire().tensileStrength()))
                .toList();
    this.limits = new CompressionSearch().limits(problem);
    this.step = new CoilStep(problem.make().coilStep());
  }

  /**
   * The search of a problem file.
   *
   * @param file its path from the project's folder
   */
  static ProgramSearch of(String file) {
    Catalogue catalogue = Catalogue.load();
    Reading reading = ProblemReader.read(bytes(file), Purpose.SHORTLIST, catalogue);
    if (reading.problem().isEmpty()) {
      throw new IllegalArgumentException(file + ": " + reading.faults());
    }
    return new ProgramSearch(reading.problem().get(), catalogue);
  }

  private static byte[] bytes(String file) {
    try {
      return Files.readAllBytes(Path.of(file));
    } catch (IOException e) {
      throw new IllegalArgumentException(file + ": " + e, e);
    }
  }

  /** The problem. */
  Problem problem() {
    return problem;
  }

  /** One family for each wire and end type, thin wires first, the weaker of two alike first. */
  List<CompressionFamily> families() {
    return families;
  }

  /** The limits. */
  List<Limit<CompressionState>> limits() {
    return limits;
  }

  /** The practical coil counts. */
  CoilStep step() {
    return step;
  }

  /**
   * Searches.
   *
   * @param objective what is to be least over all candidates; positive infinity for one that does
   *     not count
   * @return the least, the states computed, and the median time of warm runs
   */
  Found run(ToDoubleFunction<CompressionState> objective) {
    AtomicLong states = new AtomicLong();
    List<CountingFamily<CompressionState>> counted =
        families.stream().map(family -> new CountingFamily<>(family, states)).toList();
    double least =
        answer(counted).feasible().stream()
            .flatMap(List::stream)
            .mapToDouble(candidate -> objective.applyAsDouble(candidate.state()))
            .min()
            .orElse(Double.POSITIVE_INFINITY);
    return new Found(least, states.get(), seconds(), states.get());
  }

  private Answer<CompressionState> answer(List<? extends Family<CompressionState>> over) {
    return Search.run(over, List.of(), limits, step, 0);
  }

  private double seconds() {
    double begin = Clock.seconds();
    while (Clock.seconds() - begin < WARM_UP_SECONDS) {
      answer(families);
    }
    double[] seconds = new double[ROUNDS];
    for (int i = 0; i < ROUNDS; i++) {
      double start = Clock.seconds();
      answer(families);
      seconds[i] = Clock.seconds() - start;
    }
    Arrays.sort(seconds);
    return seconds[ROUNDS / 2];
  }
}
