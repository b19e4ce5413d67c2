package coilwright.optimisers;

import java.util.List;
import org.optaplanner.core.api.score.buildin.simplelong.SimpleLongScore;
import org.optaplanner.core.api.score.stream.Constraint;
import org.optaplanner.core.api.score.stream.ConstraintCollectors;
import org.optaplanner.core.api.score.stream.ConstraintFactory;
import org.optaplanner.core.api.score.stream.ConstraintProvider;

/** The judge as the planner asks it: limits missed are hard, the objective is soft. */
public final class Scoring implements ConstraintProvider {

  private static final double PARTS = 1e12;

  /** Keeps the penalty above zero, as the planner wants it: no objective is that small. */
  private static final double ABOVE_ZERO = 100;

  @Override
  public Constraint[] defineConstraints(ConstraintFactory factory) {
    return new Constraint[] {
      factory
          .forEach(Choice.class)
          .groupBy(ConstraintCollectors.<Choice>toList())
          .penalizeLong(SimpleLongScore.ONE, Scoring::penalised)
          .asConstraint("judge")
    };
  }

  private static long penalised(List<Choice> all) {
    Trial trial = all.get(0).trial();
    return Math.round(PARTS * (ABOVE_ZERO + trial.judge(Choices.shares(all, trial)).penalised()));
  }
}
