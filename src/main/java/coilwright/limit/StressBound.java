package coilwright.limit;

import coilwright.material.WireGrade;
import coilwright.problem.LimitName;
import coilwright.problem.StressLimit;
import coilwright.spring.CompressionState;
import coilwright.spring.Family;
import coilwright.spring.LoadState;
import coilwright.spring.StressCorrection;
import coilwright.unit.Dimension;
import java.util.function.Function;

/** Shear stress at one place against a share of tensile strength. */
final class StressBound implements Limit<CompressionState> {

  /** How the bound at one place is chosen. */
  private interface Choice {
    Allowable of(StressLimit limit, WireGrade grade, StressBasis basis);
  }

  private final Check check;
  private final StressLimit limit;
  private final StressBasis basis;
  private final Function<CompressionState, LoadState> where;
  private final Choice choice;
  private final Function<Family<CompressionState>, double[]> turns;

  private StressBound(
      Check check,
      StressLimit limit,
      StressBasis basis,
      Function<CompressionState, LoadState> where,
      Choice choice,
      Function<Family<CompressionState>, double[]> turns) {
    this.check = check;
    this.limit = limit;
    this.basis = basis;
    this.where = where;
    this.choice = choice;
    this.turns = turns;
  }

  /** The bound at the most compressed load, or at the overtravel beyond it. */
  static StressBound atLoad(
      StressLimit limit, StressBasis basis, StressCorrection correction, boolean overtravel) {
    String definition =
        basis.meaning().definition(correction) + (overtravel ? ", overtravel included" : "");
    return new StressBound(
        new Check(LimitName.STRESS_AT_LOAD, Side.MAX, Dimension.STRESS, definition),
        limit,
        basis,
        CompressionState::extreme,
        Allowable::atLoad,
        family -> StressTurns.atLoad(family, basis.meaning()));
  }

  /** The bound at solid. */
  static StressBound atSolid(StressLimit limit, StressBasis basis, StressCorrection correction) {
    String definition = basis.meaning().definition(correction);
    return new StressBound(
        new Check(LimitName.STRESS_AT_SOLID, Side.MAX, Dimension.STRESS, definition),
        limit,
        basis,
        CompressionState::solid,
        Allowable::atSolid,
        family -> StressTurns.atSolid(family, basis.meaning()));
  }

  @Override
  public Check check() {
    return check;
  }

  @Override
  public Finding judge(CompressionState state) {
    Allowable allowable = choice.of(limit, state.wire().grade(), basis);
    return Finding.of(
        check,
        basis.meaning().of(state, where.apply(state)),
        allowable.share() * state.wire().tensileStrength(),
        allowable.source());
  }

  /** The stress by its closed form along the family, against the bound and what holds it still. */
  @Override
  public double expected(Family<CompressionState> family, double from, double to) {
    AlongFamily along = new AlongFamily(family);
    double allowable =
        choice.of(limit, family.wire().grade(), basis).share() * family.wire().tensileStrength();
    return ClosedForm.solve(
        coils -> along.shearStress(coils, deflection(along, coils), basis.meaning()),
        allowable * (1 + Finding.TOLERANCE),
        from,
        to);
  }

  private double deflection(AlongFamily along, double coils) {
    return name() == LimitName.STRESS_AT_SOLID
        ? along.deflectionToSolid(coils)
        : along.deflectionAtExtreme(coils);
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
