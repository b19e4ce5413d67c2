package coilwright.optimisers;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.optaplanner.core.api.domain.solution.PlanningEntityCollectionProperty;
import org.optaplanner.core.api.domain.solution.PlanningScore;
import org.optaplanner.core.api.domain.solution.PlanningSolution;
import org.optaplanner.core.api.score.buildin.simplelong.SimpleLongScore;

/**
 * All that is to be chosen for one spring. A continuous variable is two choices of three digits.
 */
@PlanningSolution
class Choices {

  /** The choices of each part of a continuous variable: three digits. */
  private static final int CHOICES = 1000;

  private static final int PARTS = 2;

  @PlanningEntityCollectionProperty private List<Choice> all;
  @PlanningScore private SimpleLongScore score;

  /** For the planner, which copies the fields. */
  Choices() {}

  private Choices(List<Choice> all) {
    this.all = all;
  }

  /** Random first choices for a task. */
  static Choices of(Trial trial, Random random) {
    List<Choice> all = new ArrayList<>();
    for (int most : trial.task().choices()) {
      for (int part = 0; part < (most == 0 ? PARTS : 1); part++) {
        int range = most == 0 ? CHOICES : most;
        all.add(new Choice(all.size(), range, trial, random.nextInt(range)));
      }
    }
    return new Choices(all);
  }

  /**
   * The task's shares that choices stand for, each the middle of its part of the range.
   *
   * @param all the choices in any order
   * @param trial the run
   * @return one share for each variable
   */
  static double[] shares(List<Choice> all, Trial trial) {
    double[] values = new double[all.size()];
    for (Choice choice : all) {
      values[choice.place()] = choice.value();
    }
    int[] variables = trial.task().choices();
    double[] shares = new double[variables.length];
    int place = 0;
    for (int i = 0; i < variables.length; i++) {
      if (variables[i] == 0) {
        shares[i] = 0.5;
        for (int part = PARTS - 1; part >= 0; part--) {
          shares[i] = (values[place + part] + shares[i]) / CHOICES;
        }
        place += PARTS;
      } else {
        shares[i] = (values[place] + 0.5) / variables[i];
        place++;
      }
    }
    return shares;
  }

  /** The score, once the planner has reckoned it. */
  SimpleLongScore score() {
    return score;
  }
}
