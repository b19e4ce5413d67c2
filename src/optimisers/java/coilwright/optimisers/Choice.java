package coilwright.optimisers;

import org.optaplanner.core.api.domain.entity.PlanningEntity;
import org.optaplanner.core.api.domain.valuerange.CountableValueRange;
import org.optaplanner.core.api.domain.valuerange.ValueRangeFactory;
import org.optaplanner.core.api.domain.valuerange.ValueRangeProvider;
import org.optaplanner.core.api.domain.variable.PlanningVariable;

/** One thing to be chosen among so many: a wire, a coil count, or digits of a continuous number. */
@PlanningEntity
class Choice {

  private int place;
  private int most;
  private Trial trial;

  @PlanningVariable(valueRangeProviderRefs = "values")
  private Integer value;

  /** For the planner, which copies the fields. */
  Choice() {}

  /**
   * A choice.
   *
   * @param place its place among the choices of a spring
   * @param most how many there are to choose from
   * @param trial the run
   * @param value the first choice
   */
  Choice(int place, int most, Trial trial, int value) {
    this.place = place;
    this.most = most;
    this.trial = trial;
    this.value = value;
  }

  /** What there is to choose from. */
  @ValueRangeProvider(id = "values")
  CountableValueRange<Integer> values() {
    return ValueRangeFactory.createIntValueRange(0, most);
  }

  /** What is chosen. */
  int value() {
    return value;
  }

  /** Its place among the choices of a spring. */
  int place() {
    return place;
  }

  /** How many there are to choose from. */
  int most() {
    return most;
  }

  /** The run. */
  Trial trial() {
    return trial;
  }
}
