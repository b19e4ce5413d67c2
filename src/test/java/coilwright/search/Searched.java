package coilwright.search;

import coilwright.limit.CoilSet;
import coilwright.limit.Limit;
import coilwright.limit.Reach;
import coilwright.limit.Trail;
import coilwright.material.Catalogue;
import coilwright.problem.LimitName;
import coilwright.problem.Problem;
import coilwright.spring.CompressionFamily;
import coilwright.spring.CompressionState;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.stream.IntStream;
import java.util.stream.LongStream;
import java.util.stream.Stream;

/**
 * One wire of a problem, with what the search made of it.
 *
 * @param problem which problem it belongs to, for messages
 * @param family its springs
 * @param limits the problem's limits
 * @param coilStep the problem's coil step [-]
 * @param outcome what the search found
 */
record Searched(
    String problem,
    CompressionFamily family,
    List<Limit<CompressionState>> limits,
    double coilStep,
    Outcome<CompressionState> outcome) {

  static final Catalogue CATALOGUE = Catalogue.load();

  private static final int DRAFTS = 10;
  private static final Map<Long, List<Searched>> SEARCHED = new ConcurrentHashMap<>();

  private static final long ALL_KINDS = 1000;
  private static final long OPEN_LENGTHS = 2000;

  /** The seeds that tests share: ten random problems each. */
  static LongStream seeds() {
    return LongStream.concat(
        LongStream.range(0, 30),
        LongStream.concat(
            LongStream.range(ALL_KINDS, ALL_KINDS + 20),
            LongStream.range(OPEN_LENGTHS, OPEN_LENGTHS + 10)));
  }

  /** The drafts of a seed: bare wire by handbook, any kind, or any kind with lengths left open. */
  static Stream<ProblemDraft> drafts(long seed, int count) {
    if (seed < ALL_KINDS) {
      return RandomDrafts.of(seed, count);
    }
    return seed < OPEN_LENGTHS
        ? RandomDrafts.ofAllKinds(seed, count)
        : RandomDrafts.ofOpenLengths(seed, count);
  }

  /** Every wire of the ten problems of a seed, searched once for all tests. */
  static List<Searched> wiresOf(long seed) {
    return SEARCHED.computeIfAbsent(seed, Searched::search);
  }

  /** Those that have no candidate. */
  static List<Searched> failedOf(long seed) {
    return wiresOf(seed).stream().filter(Searched::failed).toList();
  }

  private static List<Searched> search(long seed) {
    List<ProblemDraft> drafts = drafts(seed, DRAFTS).toList();
    return IntStream.range(0, DRAFTS)
        .boxed()
        .flatMap(i -> wiresOf(seed + "/" + i, drafts.get(i).problem()))
        .toList();
  }

  /** Every wire of a problem. */
  static Stream<Searched> wiresOf(String name, Problem problem) {
    List<Limit<CompressionState>> limits = new CompressionSearch().limits(problem);
    double step = problem.make().coilStep();
    WireChoice choice = WireChoice.of(problem, CATALOGUE);
    return new CompressionSearch()
        .families(problem, choice.wires()).stream()
            .map(
                family ->
                    new Searched(
                        name,
                        family,
                        limits,
                        step,
                        new WireSearch<>(family, limits, new CoilStep(step)).outcome()));
  }

  /** The coil counts of its candidates. */
  List<Double> counts() {
    return outcome.candidates().stream().map(candidate -> candidate.state().coils()).toList();
  }

  /** Whether it has no candidate. */
  boolean failed() {
    return outcome.candidates().isEmpty();
  }

  /** Why it has none. */
  List<Conflict.Part> parts() {
    return outcome.conflict().orElseThrow().parts();
  }

  /** What every limit leaves by itself of its unrounded springs. */
  Map<LimitName, CoilSet> alone() {
    Trail<CompressionState> trail = new Trail<>(family);
    Map<LimitName, CoilSet> sets = new EnumMap<>(LimitName.class);
    for (Limit<CompressionState> limit : limits) {
      if (!limit.onlyAfterRounding()) {
        sets.merge(limit.name(), Reach.of(limit, trail), CoilSet::intersect);
      }
    }
    return sets;
  }

  /** Whether a spring holds every limit. */
  boolean holds(CompressionState spring) {
    for (Limit<CompressionState> limit : limits) {
      if (!limit.judge(spring).holds()) {
        return false;
      }
    }
    return true;
  }

  /** Whether a spring holds every bound of a limit. */
  boolean holds(LimitName name, CompressionState spring) {
    return limits.stream()
        .filter(limit -> limit.name() == name)
        .allMatch(limit -> limit.judge(spring).holds());
  }

  @Override
  public String toString() {
    return "problem "
        + problem
        + ": "
        + family.wire().grade().id()
        + " "
        + family.wire().diameter()
        + " mm "
        + family.endForm();
  }
}
