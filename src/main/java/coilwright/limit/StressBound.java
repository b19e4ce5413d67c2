package coilwright.limit;

import coilwright.material.WireGrade;
import coilwright.problem.LimitName;
import coilwright.problem.StressLimit;
import coilwright.spring.CompressionState;
import coilwright.spring.Family;
import coilwright.spring.LoadState;
import coilwright.unit.Dimension;
import java.util.function.BiFunction;
import java.util.function.Function;

/** Corrected shear stress at one place against a share of tensile strength. */
final class StressBound implements Limit<CompressionState> {

  private final Check check;
  private final StressLimit limit;
  private final Function<CompressionState, LoadState> where;
  private final BiFunction<StressLimit, WireGrade, Allowable> allowableOf;
  private final Function<Family<CompressionState>, double[]> turns;

  private StressBound(
      LimitName name,
      String author,
      StressLimit limit,
      Function<CompressionState, LoadState> where,
      BiFunction<StressLimit, WireGrade, Allowable> allowable,
      Function<Family<CompressionState>, double[]> turns) {
    this.check = new Check(name, Side.MAX, Dimension.STRESS, "corrected, " + author);
    this.limit = limit;
    this.where = where;
    this.allowableOf = allowable;
    this.turns = turns;
  }

  /** The bound at the most compressed load. */
  static StressBound atLoad(StressLimit limit, String author) {
    return new StressBound(
        LimitName.STRESS_AT_LOAD,
        author,
        limit,
        CompressionState::mostCompressed,
        Allowable::atLoad,
        StressTurns::atLoad);
  }

  /** The bound at solid. */
  static StressBound atSolid(StressLimit limit, String author) {
    return new StressBound(
        LimitName.STRESS_AT_SOLID,
        author,
        limit,
        CompressionState::solid,
        Allowable::atSolid,
        StressTurns::atSolid);
  }

  @Override
  public LimitName name() {
    return check.limit();
  }

  @Override
  public Finding judge(CompressionState state) {
    Allowable allowable = allowableOf.apply(limit, state.wire().grade());
    return Finding.of(
        check,
        where.apply(state).correctedShearStress(),
        allowable.share() * state.wire().tensileStrength(),
        allowable.source());
  }

  /** At solid the force goes with the deflection left, which falls straight to none. */
  @Override
  public boolean straight() {
    return name() == LimitName.STRESS_AT_SOLID;
  }

  @Override
  public double[] turns(Family<CompressionState> family) {
    return turns.apply(family);
  }
}
