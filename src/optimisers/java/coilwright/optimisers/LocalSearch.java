package coilwright.optimisers;

import java.util.List;
import java.util.Random;
import org.optaplanner.core.api.score.stream.ConstraintStreamImplType;
import org.optaplanner.core.api.solver.SolverFactory;
import org.optaplanner.core.config.heuristic.selector.move.composite.CartesianProductMoveSelectorConfig;
import org.optaplanner.core.config.heuristic.selector.move.composite.UnionMoveSelectorConfig;
import org.optaplanner.core.config.heuristic.selector.move.generic.ChangeMoveSelectorConfig;
import org.optaplanner.core.config.localsearch.LocalSearchPhaseConfig;
import org.optaplanner.core.config.localsearch.LocalSearchType;
import org.optaplanner.core.config.score.director.ScoreDirectorFactoryConfig;
import org.optaplanner.core.config.solver.EnvironmentMode;
import org.optaplanner.core.config.solver.SolverConfig;
import org.optaplanner.core.config.solver.termination.TerminationConfig;

/**
 * Local search of OptaPlanner with late acceptance, from a random spring: moves change one choice
 * or two.
 */
final class LocalSearch implements Optimiser {

  @Override
  public String name() {
    return "OptaPlanner";
  }

  @Override
  public void run(Trial trial, long seed) {
    SolverFactory.<Choices>create(config(trial.left(), seed))
        .buildSolver()
        .solve(Choices.of(trial, new Random(seed)));
  }

  private static SolverConfig config(long budget, long seed) {
    return new SolverConfig()
        .withSolutionClass(Choices.class)
        .withEntityClasses(Choice.class)
        .withScoreDirectorFactory(
            new ScoreDirectorFactoryConfig()
                .withConstraintProviderClass(Scoring.class)
                .withConstraintStreamImplType(ConstraintStreamImplType.BAVET))
        .withEnvironmentMode(EnvironmentMode.REPRODUCIBLE)
        .withRandomSeed(seed)
        .withTerminationConfig(new TerminationConfig().withScoreCalculationCountLimit(budget))
        .withPhases(
            new LocalSearchPhaseConfig()
                .withLocalSearchType(LocalSearchType.LATE_ACCEPTANCE)
                .withMoveSelectorConfig(
                    new UnionMoveSelectorConfig(
                        List.of(
                            new ChangeMoveSelectorConfig(),
                            new CartesianProductMoveSelectorConfig(
                                List.of(
                                    new ChangeMoveSelectorConfig(),
                                    new ChangeMoveSelectorConfig()))))));
  }
}
