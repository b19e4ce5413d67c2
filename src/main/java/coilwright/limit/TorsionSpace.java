package coilwright.limit;

import coilwright.problem.Envelope;
import coilwright.problem.LimitName;
import coilwright.spring.CoilTolerance;
import coilwright.spring.Family;
import coilwright.spring.TorsionState;
import coilwright.spring.WoundBody;
import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;

/**
 * The limits that the space sets for torsion springs. A spring that closes is tightest round its
 * arbor at the greatest torque and widest in its bore when free; one that opens the other way
 * round.
 */
final class TorsionSpace {

  private final Clearance clearance;
  private final boolean closing;
  private final String covered;
  private final List<Limit<TorsionState>> limits = new ArrayList<>();

  private TorsionSpace(Envelope space, boolean closing, String covered) {
    this.clearance = new Clearance(space);
    this.closing = closing;
    this.covered = covered;
  }

  /**
   * Bore and nominal diameters, in the order of the names.
   *
   * @param space the space
   * @param closing whether the loads wind the spring up
   * @param covered what a definition says of the wire's coating, after a comma; empty if bare
   */
  static List<Limit<TorsionState>> outside(Envelope space, boolean closing, String covered) {
    TorsionSpace all = new TorsionSpace(space, closing, covered);
    all.bore();
    all.nominal(
        LimitName.OUTSIDE_DIAMETER,
        Side.MAX,
        state -> state.spring().outsideDiameter(),
        space.maxOutsideDiameter());
    all.nominal(
        LimitName.INSIDE_DIAMETER,
        Side.MIN,
        state -> state.spring().insideDiameter(),
        space.minInsideDiameter());
    return all.limits;
  }

  /**
   * Arbor and body length, in the order of the names.
   *
   * @param space the space
   * @param maxBodyLength greatest body length at the greatest torque [mm], or empty
   * @param closing whether the loads wind the spring up
   * @param covered what a definition says of the wire's coating, after a comma; empty if bare
   */
  static List<Limit<TorsionState>> inside(
      Envelope space, OptionalDouble maxBodyLength, boolean closing, String covered) {
    TorsionSpace all = new TorsionSpace(space, closing, covered);
    all.arbor();
    maxBodyLength.ifPresent(all::bodyLength);
    return all.limits;
  }

  private void nominal(
      LimitName name, Side side, ToDoubleFunction<TorsionState> value, OptionalDouble bound) {
    if (bound.isPresent()) {
      Check check = new Check(name, side, Dimension.LENGTH, "nominal, free state");
      limits.add(ValueLimit.fixed(check, value, bound.getAsDouble(), Clearance.ASKED, false));
    }
  }

  private void bore() {
    clearance
        .bore(
            "outside diameter, "
                + (closing ? "free state" : "unwound by the greatest torque")
                + covered,
            TorsionState::greatestOutsideDiameter,
            TorsionSpace::meanDiameter,
            closing ? clearance.source() : WoundBody.DIAMETER)
        .ifPresent(limits::add);
  }

  private void arbor() {
    clearance
        .rod(
            LimitName.ARBOR,
            (closing ? "wound up by the greatest torque" : "free state") + covered,
            TorsionState::leastInsideDiameter,
            TorsionSpace::meanDiameter,
            closing ? WoundBody.DIAMETER : clearance.source(),
            this::steps)
        .ifPresent(limits::add);
  }

  private static double meanDiameter(TorsionState state) {
    return state.spring().meanDiameter();
  }

  private void bodyLength(double greatest) {
    limits.add(
        ValueLimit.fixed(
            new Check(
                LimitName.BODY_LENGTH,
                Side.MAX,
                Dimension.LENGTH,
                (closing ? "wound up" : "unwound") + " by the greatest torque" + covered),
            state -> state.greatest().bodyLength(),
            greatest,
            WoundBody.LENGTH,
            true));
  }

  /** A wound-up coil clears the rod by some tolerance where it is wider by as much. */
  private double[] steps(Family<TorsionState> family, double rod) {
    if (!clearance.space().clearanceAssumed()) {
      return new double[0];
    }
    TorsionState end = family.at(family.mostCoils());
    double clears = rod + end.coatedDiameter();
    double same = end.spring().meanDiameter() * end.coils();
    return clearance.stepsBetween(
        free(end, clears),
        free(end, clears + CoilTolerance.greatest()),
        end.spring().wireDiameter(),
        meanDiameter -> same / meanDiameter);
  }

  /**
   * The free mean diameter of the family that comes to a least one under load [mm]. Of the
   * deflection each coil takes as much as it has of the product of diameter and coils, so that
   * along a family 1/D when wound up lies above 1/D when free by the same for all.
   */
  private double free(TorsionState end, double least) {
    if (!closing) {
      return least;
    }
    double mean = end.greatest().insideDiameter() + end.spring().wireDiameter();
    double inverse = 1 / least - (1 / mean - 1 / end.spring().meanDiameter());
    return inverse > 0 ? 1 / inverse : Double.POSITIVE_INFINITY;
  }
}
