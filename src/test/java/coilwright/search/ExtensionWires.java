package coilwright.search;

import coilwright.limit.CoilSet;
import coilwright.limit.Finding;
import coilwright.limit.Limit;
import coilwright.limit.Reach;
import coilwright.limit.Trail;
import coilwright.problem.LimitName;
import coilwright.problem.Problem;
import coilwright.spring.ExtensionFamily;
import coilwright.spring.ExtensionState;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import java.util.stream.LongStream;
import java.util.stream.Stream;

/**
 * One wire and hook of a problem, with what the search made of it.
 *
 * @param draft the problem, for messages
 * @param family its springs
 * @param limits the problem's limits
 * @param step the practical counts
 * @param outcome what the search found
 */
record ExtensionWires(
    ExtensionDraft draft,
    ExtensionFamily family,
    List<Limit<ExtensionState>> limits,
    CoilStep step,
    Outcome<ExtensionState> outcome) {

  private static final int DRAFTS = 10;
  private static final Map<Long, List<ExtensionWires>> SEARCHED = new ConcurrentHashMap<>();

  /** The seeds that tests share: ten random problems each. */
  static LongStream seeds() {
    return LongStream.range(0, 24);
  }

  /** Every wire of the ten problems of a seed, searched once for all tests. */
  static List<ExtensionWires> of(long seed) {
    return SEARCHED.computeIfAbsent(
        seed, one -> RandomExtensionDrafts.of(one, DRAFTS).flatMap(ExtensionWires::of).toList());
  }

  /** Every wire of a problem. */
  static Stream<ExtensionWires> of(ExtensionDraft draft) {
    Problem problem = draft.problem();
    ExtensionSearch search = new ExtensionSearch();
    List<Limit<ExtensionState>> limits = search.limits(problem);
    CoilStep step = search.step(problem);
    return search.families(problem, WireChoice.of(problem, Searched.CATALOGUE).wires()).stream()
        .map(
            family ->
                new ExtensionWires(
                    draft, family, limits, step, new WireSearch<>(family, limits, step).outcome()));
  }

  /** The coil counts of its candidates. */
  List<Double> counts() {
    return outcome.candidates().stream().map(candidate -> candidate.state().coils()).toList();
  }

  /** Every practical count of the family; those beyond the greatest asked end the scan. */
  List<Double> every() {
    double most = draft.bound(ExtensionBound.MOST_COILS).orElse(family.mostCoils());
    return step.in(CoilSet.of(0, Math.min(family.mostCoils(), most + 1)));
  }

  /** The counts whose rounded springs hold every limit, by a scan of all. */
  List<Double> held() {
    List<Double> held = new ArrayList<>();
    for (double coils : every()) {
      family
          .rounded(coils)
          .filter(spring -> failed(spring).isEmpty())
          .ifPresent(spring -> held.add(coils));
    }
    return held;
  }

  /** The limits that a spring fails; a bound that cannot be dropped stands as no limit's own. */
  private List<Limit<ExtensionState>> failed(ExtensionState spring) {
    return limits.stream().filter(limit -> !limit.judge(spring).holds()).toList();
  }

  /** The limits without which some count would hold, by a scan of all up to the greatest asked. */
  Set<LimitName> decisive() {
    Set<LimitName> decisive = EnumSet.noneOf(LimitName.class);
    for (double coils : every()) {
      family.rounded(coils).ifPresent(spring -> decisive.addAll(alone(spring)));
    }
    return decisive;
  }

  private Set<LimitName> alone(ExtensionState spring) {
    Set<LimitName> names = EnumSet.noneOf(LimitName.class);
    boolean removable = true;
    for (Limit<ExtensionState> limit : failed(spring)) {
      names.add(limit.name());
      removable &= limit.removable();
    }
    return names.size() == 1 && removable ? names : EnumSet.noneOf(LimitName.class);
  }

  /** What every limit leaves by itself of its unrounded springs. */
  Map<LimitName, CoilSet> sets() {
    Trail<ExtensionState> trail = new Trail<>(family);
    Map<LimitName, CoilSet> sets = new EnumMap<>(LimitName.class);
    for (Limit<ExtensionState> limit : limits) {
      if (!limit.onlyAfterRounding()) {
        sets.merge(limit.name(), Reach.of(limit, trail), CoilSet::intersect);
      }
    }
    return sets;
  }

  /** Whether a spring holds every bound of a limit that is judged unrounded. */
  boolean holds(LimitName name, ExtensionState spring) {
    for (Limit<ExtensionState> limit : limits) {
      Finding finding = limit.judge(spring);
      if (limit.name() == name && !limit.onlyAfterRounding() && !finding.holds()) {
        return false;
      }
    }
    return true;
  }

  @Override
  public String toString() {
    return family.wire().grade().id()
        + " "
        + family.wire().diameter()
        + " mm "
        + family.endForm()
        + ": "
        + draft;
  }
}
