package coilwright.optimisers;

import coilwright.docs.Section;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;

/** Runs every method on every task and writes the table to its part of results/benchmarks.md. */
public final class Comparison {

  private static final long BUDGET = 20_000;
  private static final int SEEDS = 10;

  private Comparison() {}

  /**
   * Compares and writes.
   *
   * @param args not used
   * @throws IOException if a list of problems cannot be read or the table not be written
   */
  public static void main(String[] args) throws IOException {
    List<Optimiser> optimisers = List.of(new CovarianceSearch(), new LocalSearch());
    List<Task> tasks = Tasks.all();
    List<Found> searched = new ArrayList<>();
    for (Task task : tasks) {
      searched.add(task.search());
    }
    for (Optimiser optimiser : optimisers) {
      runs(optimiser, tasks.get(tasks.size() - 1)); // warms up
    }
    ComparisonTable table = new ComparisonTable(BUDGET, SEEDS);
    for (int i = 0; i < tasks.size(); i++) {
      Task task = tasks.get(i);
      table.search(task, searched.get(i));
      for (Optimiser optimiser : optimisers) {
        table.method(task, optimiser.name(), runs(optimiser, task));
      }
      System.out.println(task.name() + " done");
    }
    new Section("Against general-purpose optimisers").write(table.text());
  }

  private static List<Found> runs(Optimiser optimiser, Task task) {
    List<Found> runs = new ArrayList<>();
    for (int seed = 0; seed < SEEDS; seed++) {
      Trial trial = new Trial(task, BUDGET);
      optimiser.run(trial, seed);
      runs.add(trial.found());
    }
    return runs;
  }
}
