package coilwright.optimisers;

import java.util.Arrays;

/** One run of a method on a task: it asks the judge through this, which counts and remembers. */
final class Trial {

  private final Task task;
  private final long budget;
  private final double start = Clock.seconds();
  private double[] last;
  private Verdict verdict;
  private long calls;
  private long callsToNearBest = -1;
  private double least = Double.POSITIVE_INFINITY;

  /**
   * Begins a run.
   *
   * @param task the task
   * @param budget how often the judge may be asked
   */
  Trial(Task task, long budget) {
    this.task = task;
    this.budget = budget;
  }

  /** The task. */
  Task task() {
    return task;
  }

  /** How often the judge may still be asked. */
  int left() {
    return Math.toIntExact(Math.max(0, budget - calls));
  }

  /** Asks the judge; asking for the same once more in a row is answered from memory. */
  Verdict judge(double[] shares) {
    if (!Arrays.equals(shares, last)) {
      last = shares.clone();
      verdict = task.judge(shares);
      calls++;
      note();
    }
    return verdict;
  }

  private void note() {
    if (verdict.holds() && verdict.objective() < least) {
      least = verdict.objective();
      if (callsToNearBest < 0 && Found.near(least, task.best())) {
        callsToNearBest = calls;
      }
    }
  }

  /** What the run came to. */
  Found found() {
    return new Found(least, calls, Clock.seconds() - start, callsToNearBest);
  }
}
