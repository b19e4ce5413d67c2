package coilwright.optimisers;

import coilwright.limit.CoilSet;
import coilwright.limit.Finding;
import coilwright.search.Candidate;
import coilwright.spring.CompressionFamily;
import coilwright.spring.CompressionState;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/**
 * A problem file: a wire with its ends and a practical coil count are to be chosen. The mean
 * diameter and the free length follow from the loads and are rounded to the shop's steps, for every
 * method alike; the judge holds the rounded spring to every limit.
 */
final class SpringTask implements Task {

  private static final double WORST_MARGIN = 10;
  private static final double NO_SPRING = 100;

  private final String name;
  private final String unit;
  private final ProgramSearch search;
  private final ToDoubleFunction<CompressionState> objective;
  private final List<Double> counts;
  private final double best;

  private SpringTask(
      String name, String unit, String file, ToDoubleFunction<CompressionState> objective) {
    this.name = name;
    this.unit = unit;
    this.search = ProgramSearch.of(file);
    this.objective = objective;
    this.counts = counts();
    this.best = search.run(objective).objective();
  }

  /** A problem file whose springs are to be light, in grams. */
  static SpringTask lightest(String name, String file) {
    return new SpringTask(name, "g", file, state -> 1000 * state.mass());
  }

  /** A problem file whose springs are to have little wire, every coil taken for flat, in in^3. */
  static SpringTask leastWire(String name, String file) {
    return new SpringTask(name, "in^3", file, FlatWire::volume);
  }

  private List<Double> counts() {
    var band = search.problem().limits().activeCoils();
    double most =
        band.max()
            .orElseThrow(
                () -> new IllegalArgumentException(name + ": no greatest number of active coils"));
    return search.step().in(CoilSet.of(band.min().orElse(0), most));
  }

  @Override
  public String name() {
    return name;
  }

  @Override
  public String space() {
    return search.families().size() + " wires x " + counts.size() + " counts";
  }

  @Override
  public String unit() {
    return unit;
  }

  @Override
  public int[] choices() {
    return new int[] {search.families().size(), counts.size()};
  }

  @Override
  public Verdict judge(double[] shares) {
    CompressionFamily family =
        search.families().get(Task.choice(shares[0], search.families().size()));
    double coils = counts.get(Task.choice(shares[1], counts.size()));
    Optional<CompressionState> spring = family.rounded(coils);
    return spring
        .map(this::verdict)
        .orElseGet(() -> new Verdict(Double.NaN, NO_SPRING * coils / family.mostCoils()));
  }

  private Verdict verdict(CompressionState spring) {
    double missed = 0;
    for (Finding finding : Candidate.judge(spring, search.limits()).findings()) {
      if (!finding.holds()) {
        missed += finding.margin() > -WORST_MARGIN ? -finding.margin() : WORST_MARGIN;
      }
    }
    return new Verdict(objective.applyAsDouble(spring), missed);
  }

  @Override
  public double best() {
    return best;
  }

  @Override
  public Found search() {
    return search.run(objective);
  }
}
