package coilwright.limit;

import coilwright.problem.LimitName;
import coilwright.problem.StressLimit;
import coilwright.spring.TorsionState;
import coilwright.unit.Dimension;

/**
 * Bending stress at the greatest torque against a share of tensile strength. Its margin never
 * turns: along a family the torque stays and the inner factor rises as the coil grows narrower.
 *
 * @param check what the bound asks
 * @param limit what the file says
 * @param basis whose allowables apply where it says nothing
 * @param closing whether the loads wind the spring up
 */
record BendingBound(Check check, StressLimit limit, BendingBasis basis, boolean closing)
    implements Limit<TorsionState> {

  /** The bound for one direction of loading. */
  static BendingBound of(StressLimit limit, BendingBasis basis, boolean closing) {
    String way = closing ? "closing" : "opening";
    Check check =
        new Check(
            LimitName.BENDING_STRESS,
            Side.MAX,
            Dimension.STRESS,
            basis.definition() + ", at the greatest torque, " + way);
    return new BendingBound(check, limit, basis, closing);
  }

  @Override
  public Finding judge(TorsionState state) {
    Allowable allowable = basis.allowable(limit, state.wire().grade().allowableClass(), closing);
    return Finding.of(
        check,
        basis.stress(state.greatest()),
        allowable.share() * state.wire().tensileStrength(),
        allowable.source());
  }
}
