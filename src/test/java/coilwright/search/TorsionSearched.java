package coilwright.search;

import coilwright.limit.Finding;
import coilwright.limit.Limit;
import coilwright.problem.LimitName;
import coilwright.problem.Problem;
import coilwright.problem.TorsionAsked;
import coilwright.spring.TorsionFamily;
import coilwright.spring.TorsionState;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import java.util.stream.IntStream;
import java.util.stream.LongStream;
import java.util.stream.Stream;

/**
 * One wire of a problem of a torsion spring, with what the search made of it and what a scan of
 * every practical coil count finds, without any reasoning about where its springs may lie.
 *
 * @param name which problem it belongs to, for messages
 * @param family its springs
 * @param limits the problem's limits
 * @param counts every practical coil count of the family
 * @param outcome what the search found
 */
record TorsionSearched(
    String name,
    TorsionFamily family,
    List<Limit<TorsionState>> limits,
    List<Double> counts,
    Outcome<TorsionState> outcome) {

  private static final int DRAFTS = 10;
  private static final double TURN = 2 * Math.PI;
  private static final Map<Long, List<TorsionSearched>> SEARCHED = new ConcurrentHashMap<>();

  /** The seeds that tests share: ten random problems each. */
  static LongStream seeds() {
    return LongStream.range(0, 20);
  }

  /** Every wire of the ten problems of a seed, searched once for all tests. */
  static List<TorsionSearched> wiresOf(long seed) {
    return SEARCHED.computeIfAbsent(seed, TorsionSearched::search);
  }

  private static List<TorsionSearched> search(long seed) {
    List<TorsionDraft> drafts = RandomTorsionDrafts.of(seed, DRAFTS).toList();
    return IntStream.range(0, DRAFTS)
        .boxed()
        .flatMap(i -> wiresOf(seed + "/" + i, drafts.get(i).problem()))
        .toList();
  }

  /** Every wire of a problem that leaves a body between its legs. */
  static Stream<TorsionSearched> wiresOf(String name, Problem problem) {
    TorsionSearch search = new TorsionSearch();
    List<Limit<TorsionState>> limits = search.limits(problem);
    CoilStep step = search.step(problem);
    return search.families(problem, WireChoice.of(problem, Searched.CATALOGUE).wires()).stream()
        .map(
            family ->
                new TorsionSearched(
                    name,
                    family,
                    limits,
                    counts(problem, family.mostCoils()),
                    new WireSearch<>(family, limits, step).outcome()));
  }

  /** Multiples of the step; where the legs' angle is asked, whole coils and what it leaves. */
  private static List<Double> counts(Problem problem, double most) {
    TorsionAsked asked = problem.torsion().orElseThrow();
    boolean fixed = asked.legs().angle().isPresent();
    BigDecimal step = fixed ? BigDecimal.ONE : BigDecimal.valueOf(problem.make().coilStep());
    BigDecimal count = fixed ? BigDecimal.valueOf(fraction(asked)) : step;
    List<Double> counts = new ArrayList<>();
    for (; count.doubleValue() <= most; count = count.add(step)) {
      if (count.signum() > 0) {
        counts.add(count.doubleValue());
      }
    }
    return counts;
  }

  /**
   * Legs of whole coils lie in one line: half a turn lies between them. To billionths, the loaded
   * spring's angle less what the load winds up is what the free body has.
   */
  private static double fraction(TorsionAsked asked) {
    double torque =
        asked.line().orElseThrow().loads().get(asked.legs().atLoad() - 1).torque().orElseThrow();
    double turned = torque / asked.line().orElseThrow().rate() / TURN;
    double turns =
        asked.legs().angle().orElseThrow() / TURN - 0.5 + (asked.closing() ? -turned : turned);
    double fraction = Math.rint((turns - Math.floor(turns)) * 1e9) / 1e9;
    return fraction == 1 ? 0 : fraction;
  }

  /** The coil counts of its candidates. */
  List<Double> found() {
    return outcome.candidates().stream().map(candidate -> candidate.state().coils()).toList();
  }

  /** The counts whose rounded springs hold every limit. */
  List<Double> held() {
    return counts.stream().filter(coils -> failed(coils).filter(Set::isEmpty).isPresent()).toList();
  }

  /** The removable limits without which some count would hold. */
  Set<LimitName> decisive() {
    Set<LimitName> decisive = EnumSet.noneOf(LimitName.class);
    for (double coils : counts) {
      failed(coils)
          .filter(names -> names.size() == 1)
          .ifPresent(names -> names.stream().filter(LimitName::removable).forEach(decisive::add));
    }
    return decisive;
  }

  /** The limits that the rounded spring of a count fails; empty where there is no such spring. */
  private Optional<Set<LimitName>> failed(double coils) {
    return family
        .rounded(coils)
        .map(
            spring -> {
              Set<LimitName> failed = EnumSet.noneOf(LimitName.class);
              for (Finding finding : Candidate.judge(spring, limits).findings()) {
                if (!finding.holds()) {
                  failed.add(finding.check().limit());
                }
              }
              return failed;
            });
  }

  /** Whether it has no candidate. */
  boolean failed() {
    return outcome.candidates().isEmpty();
  }

  /** Why it has none. */
  List<Conflict.Part> parts() {
    return outcome.conflict().orElseThrow().parts();
  }

  @Override
  public String toString() {
    return "problem " + name + ": " + family;
  }
}
