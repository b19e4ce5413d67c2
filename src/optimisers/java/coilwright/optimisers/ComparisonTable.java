package coilwright.optimisers;

import coilwright.docs.Section;
import java.util.List;
import java.util.Locale;

/** The table of the comparison, and the words that go with it. */
final class ComparisonTable {

  /** What the tolerance of the limits, one in 10^9 of a bound, may be worth in an objective [-]. */
  private static final double WORTH = 1e-8;

  private static final String WORDS =
      """
      Command: `mvn -B -ntp -P optimisers test-compile exec:exec`

      Machine: %machine%

      Every method asks the same judge: the program's own limits, on the spring rounded as a shop
      would set it. Load line and rounding are given to all, so that a wire and a coil count make a
      spring; wires stand in the order of their diameters. The two optimisers get %budget% calls of
      the judge for each of %seeds% seeds. Both minimise ln f + 100 v, where f is the mass or what
      else is to be least and v the sum of the margins missed; what counts is the least f with no
      margin missed.

      - search: the program, all candidates; calls are the springs it computes, root finding
        included; time is the median of warm runs. It has no seed.
      - CMA-ES: Commons Math 3.6.1, on shares of the range from 0 to 1, of which a discrete variable
        cuts its range into equal parts; restarts with twice the population until the calls are spent.
      - OptaPlanner: 10.2.0, constraint streams with BAVET, late acceptance from a random spring,
        moves of one choice or two. A continuous variable is two choices of three digits each, which
        does not suit it.

      The weight benchmark is continuous and has no wires: its best is found by solving its two
      active limits; the search is given wires in steps of 0.0001 in and coils in steps of 0.01.

      Best is the least found in any run; calls and time, which is processor time of the one thread,
      are means of the runs; near is how many runs came within 0.1 % of the best known, which is the
      search's own but for the weight benchmark; after is the median of the calls until then, of
      those that did.

      | problem | space | method | best | unit | above best known | calls | ms | near | after calls |
      |---|---|---|---|---|---|---|---|---|---|
      """;

  private final StringBuilder rows = new StringBuilder();
  private final long budget;
  private final int seeds;

  ComparisonTable(long budget, int seeds) {
    this.budget = budget;
    this.seeds = seeds;
  }

  /** Adds the row of the program's search. */
  void search(Task task, Found found) {
    String near = Found.near(found.objective(), task.best()) ? "yes" : "no";
    row(task, "search", found.objective(), found.calls(), found.seconds(), near, "");
  }

  /**
   * Adds the row of an optimiser.
   *
   * @throws IllegalStateException if it beat the best known: then the search has missed a spring
   */
  void method(Task task, String method, List<Found> runs) {
    double best = runs.stream().mapToDouble(Found::objective).min().orElseThrow();
    if (best < task.best() * (1 - WORTH)) {
      throw new IllegalStateException(task.name() + ": " + method + " found " + best);
    }
    long[] after =
        runs.stream()
            .mapToLong(Found::callsToNearBest)
            .filter(calls -> calls >= 0)
            .sorted()
            .toArray();
    row(
        task,
        method,
        best,
        runs.stream().mapToLong(Found::calls).sum() / runs.size(),
        runs.stream().mapToDouble(Found::seconds).average().orElseThrow(),
        after.length + " of " + runs.size(),
        after.length == 0 ? "" : Long.toString(after[after.length / 2]));
  }

  private void row(
      Task task,
      String method,
      double best,
      long calls,
      double seconds,
      String near,
      String after) {
    rows.append("| ")
        .append(
            String.join(
                " | ",
                task.name(),
                task.space(),
                method,
                number("%.7g", best),
                task.unit(),
                number("%.4f %%", 100 * (best / task.best() - 1)),
                Long.toString(calls),
                number("%.2f", 1000 * seconds),
                near,
                after))
        .append(" |\n");
  }

  /** The section. */
  String text() {
    return WORDS
            .replace("%machine%", Section.machine())
            .replace("%budget%", Long.toString(budget))
            .replace("%seeds%", Integer.toString(seeds))
        + rows;
  }

  private static String number(String pattern, double value) {
    return String.format(Locale.ROOT, pattern, value);
  }
}
