package coilwright.optimisers;

import coilwright.spring.CompressionState;
import coilwright.spring.WeightBenchmark;
import coilwright.spring.WeightBenchmark.Design;

/**
 * The continuous benchmark of the lightest spring, with its printed constants. The best known is
 * what solving its two active limits gives. The program's search has no continuous wire: it is
 * given the benchmark as a problem file with wires in steps of 0.0001 in and coils in steps of
 * 0.01, and what it finds is judged as the others are.
 */
final class WeightTask implements Task {

  private static final String FILE = "src/optimisers/resources/optimisers/weight-benchmark.yaml";
  private static final WeightBenchmark PRINTED = WeightBenchmark.printed();
  private static final double JUST = 1e-9;
  private static final double NO_SPRING = 100;
  private static final double[] FROM = {0.05, 0.25, 2};
  private static final double[] TO = {2, 1.3, 15};

  private final double best = PRINTED.weight(PRINTED.optimum());
  private final ProgramSearch search = ProgramSearch.of(FILE);

  private static double weight(CompressionState state) {
    Verdict verdict = verdict(design(state));
    return verdict.holds() ? verdict.objective() : Double.POSITIVE_INFINITY;
  }

  private static Design design(CompressionState state) {
    return new Design(state.spring().wireDiameter(), state.spring().meanDiameter(), state.coils());
  }

  @Override
  public String name() {
    return "weight benchmark (Belegundu, Arora)";
  }

  @Override
  public String space() {
    return "3 continuous";
  }

  @Override
  public String unit() {
    return "in^3";
  }

  @Override
  public int[] choices() {
    return new int[3];
  }

  @Override
  public Verdict judge(double[] shares) {
    double[] values = new double[shares.length];
    for (int i = 0; i < values.length; i++) {
      values[i] = FROM[i] + shares[i] * (TO[i] - FROM[i]);
    }
    return values[1] > values[0]
        ? verdict(Design.inInches(values[0], values[1], values[2]))
        : new Verdict(Double.NaN, NO_SPRING * values[0] / values[1]);
  }

  private static Verdict verdict(Design design) {
    double missed = 0;
    for (double limit : PRINTED.limits(design)) {
      missed += limit <= JUST ? 0 : limit;
    }
    return new Verdict(PRINTED.weight(design), missed);
  }

  @Override
  public double best() {
    return best;
  }

  @Override
  public Found search() {
    return search.run(WeightTask::weight);
  }
}
