package coilwright.optimisers;

import java.util.Arrays;
import org.apache.commons.math3.exception.MaxCountExceededException;
import org.apache.commons.math3.optim.InitialGuess;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.SimpleBounds;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.nonlinear.scalar.ObjectiveFunction;
import org.apache.commons.math3.optim.nonlinear.scalar.noderiv.CMAESOptimizer;
import org.apache.commons.math3.random.MersenneTwister;
import org.apache.commons.math3.random.RandomGenerator;

/**
 * Covariance matrix adaptation on the unit box, started anew from a random place with twice the
 * population whenever it stops before the budget is spent.
 */
final class CovarianceSearch implements Optimiser {

  private static final double STEP = 0.3;
  private static final int ITERATIONS = 100_000;
  private static final int LEAST_LEFT = 50;

  @Override
  public String name() {
    return "CMA-ES";
  }

  @Override
  public void run(Trial trial, long seed) {
    RandomGenerator random = new MersenneTwister(seed);
    int variables = trial.task().choices().length;
    int population = 4 + (int) (3 * StrictMath.log(variables));
    while (trial.left() >= LEAST_LEFT) {
      descend(trial, population, random);
      population = Math.min(2 * population, trial.left() / 10 + LEAST_LEFT);
    }
  }

  private static void descend(Trial trial, int population, RandomGenerator random) {
    int variables = trial.task().choices().length;
    double[] start = new double[variables];
    for (int i = 0; i < variables; i++) {
      start[i] = random.nextDouble();
    }
    try {
      new CMAESOptimizer(ITERATIONS, 0, true, 0, 0, random, false, null)
          .optimize(
              new MaxEval(trial.left()),
              GoalType.MINIMIZE,
              new ObjectiveFunction(shares -> trial.judge(shares).penalised()),
              new SimpleBounds(new double[variables], filled(variables, 1)),
              new InitialGuess(start),
              new CMAESOptimizer.Sigma(filled(variables, STEP)),
              new CMAESOptimizer.PopulationSize(population));
    } catch (MaxCountExceededException e) {
      return; // calls spent, or a covariance gone flat: the trial knows the best
    }
  }

  private static double[] filled(int size, double value) {
    double[] values = new double[size];
    Arrays.fill(values, value);
    return values;
  }
}
