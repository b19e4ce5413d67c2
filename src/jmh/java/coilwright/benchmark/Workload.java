package coilwright.benchmark;

import coilwright.limit.CoilSet;
import coilwright.limit.Limit;
import coilwright.material.Catalogue;
import coilwright.problem.Problem;
import coilwright.problem.ProblemReader;
import coilwright.problem.Purpose;
import coilwright.problem.Reading;
import coilwright.report.Sheets;
import coilwright.search.Answer;
import coilwright.search.Candidate;
import coilwright.search.CoilStep;
import coilwright.search.CountingFamily;
import coilwright.search.Search;
import coilwright.search.Synthesis;
import coilwright.search.WireChoice;
import coilwright.spring.Family;
import coilwright.spring.State;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.Objects;
import java.util.concurrent.atomic.AtomicLong;

/**
 * A problem over the whole catalogue, ready to be searched and to be scanned.
 *
 * @param <S> the state of its kind of spring
 */
final class Workload<S extends State> {

  /** Where no limit ends the coils of a body, a scan ends here [-]. */
  private static final double MOST_BODY_COILS = 120;

  private final Problem problem;
  private final List<? extends Family<S>> families;
  private final List<Limit<S>> limits;
  private final CoilStep step;

  private Workload(Problem problem, Synthesis<S> kind, Catalogue catalogue) {
    this.problem = problem;
    this.families = kind.families(problem, WireChoice.of(problem, catalogue).wires());
    this.limits = kind.limits(problem);
    this.step = kind.step(problem);
  }

  /** The problem with a name among the resources. */
  static Workload<?> of(String name) {
    Catalogue catalogue = Catalogue.load();
    Reading reading = ProblemReader.read(bytes(name), Purpose.SHORTLIST, catalogue);
    Problem problem = reading.problem().orElseThrow();
    return of(problem, Sheets.of(problem.kind()).synthesis(), catalogue);
  }

  private static <S extends State> Workload<S> of(
      Problem problem, Synthesis<S> kind, Catalogue catalogue) {
    return new Workload<>(problem, kind, catalogue);
  }

  private static byte[] bytes(String name) {
    try (InputStream in = Workload.class.getResourceAsStream("/benchmark/" + name + ".yaml")) {
      return in.readAllBytes();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** How many wires it offers. */
  int wires() {
    return families.size();
  }

  /** The search of the program, with every conflict worked out. */
  Answer<S> search() {
    return search(families);
  }

  private Answer<S> search(List<? extends Family<S>> over) {
    Answer<S> answer = Search.run(over, List.of(), limits, step, 0);
    answer.conflicts().forEach(Objects::requireNonNull);
    return answer;
  }

  /** Every practical count within the limits on active coils, judged; how many hold. */
  int scan() {
    return scan(families);
  }

  private int scan(List<? extends Family<S>> over) {
    double fewest = problem.limits().activeCoils().min().orElse(0);
    double most = problem.limits().activeCoils().max().orElse(MOST_BODY_COILS);
    int held = 0;
    for (Family<S> family : over) {
      double last = Math.min(most, family.mostCoils());
      if (fewest > last) {
        continue;
      }
      for (double coils : step.in(CoilSet.of(fewest, last))) {
        held +=
            family
                    .rounded(coils)
                    .map(state -> Candidate.judge(state, limits))
                    .filter(Candidate::holds)
                    .isPresent()
                ? 1
                : 0;
      }
    }
    return held;
  }

  /** Springs computed by one search. */
  long statesOfSearch() {
    AtomicLong count = new AtomicLong();
    search(counted(count));
    return count.get();
  }

  /** Springs computed by one scan. */
  long statesOfScan() {
    AtomicLong count = new AtomicLong();
    scan(counted(count));
    return count.get();
  }

  private List<CountingFamily<S>> counted(AtomicLong count) {
    return families.stream().map(family -> new CountingFamily<S>(family, count)).toList();
  }
}
