package coilwright.limit;

import coilwright.problem.Envelope;
import coilwright.problem.LimitName;
import coilwright.spring.CompressionState;
import coilwright.spring.Family;
import coilwright.spring.Method;
import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;

/** The limits that the space sets for compression springs. */
final class SpaceLimits {

  private final Clearance clearance;
  private final Method method;
  private final String covered;
  private final List<Limit<CompressionState>> limits = new ArrayList<>();

  private SpaceLimits(Envelope space, Method method, String covered) {
    this.clearance = new Clearance(space);
    this.method = method;
    this.covered = covered;
  }

  /**
   * Every limit of the space, in the order of the names.
   *
   * @param space the space
   * @param method whose rules reckon the solid length and the growth
   * @param covered what a definition says of the wire's coating, after a comma; empty if bare
   */
  static List<Limit<CompressionState>> of(Envelope space, Method method, String covered) {
    SpaceLimits all = new SpaceLimits(space, method, covered);
    all.clearances();
    all.nominal(
        LimitName.OUTSIDE_DIAMETER,
        Side.MAX,
        "nominal, free state",
        state -> state.spring().outsideDiameter(),
        space.maxOutsideDiameter());
    all.nominal(
        LimitName.INSIDE_DIAMETER,
        Side.MIN,
        "nominal, free state",
        state -> state.spring().insideDiameter(),
        space.minInsideDiameter());
    all.nominal(
        LimitName.FREE_LENGTH,
        Side.MAX,
        "nominal",
        state -> state.spring().freeLength(),
        space.maxFreeLength());
    if (space.maxSolidLength().isPresent()) {
      all.limits.add(
          ValueLimit.fixed(
              new Check(
                  LimitName.SOLID_LENGTH,
                  Side.MAX,
                  Dimension.LENGTH,
                  method.solidMeans() + covered),
              CompressionState::solidLength,
              space.maxSolidLength().getAsDouble(),
              method.solidCitation(),
              true));
    }
    return all.limits;
  }

  private void nominal(
      LimitName name,
      Side side,
      String definition,
      ToDoubleFunction<CompressionState> value,
      OptionalDouble bound) {
    if (bound.isPresent()) {
      Check check = new Check(name, side, Dimension.LENGTH, definition);
      limits.add(ValueLimit.fixed(check, value, bound.getAsDouble(), Clearance.ASKED, false));
    }
  }

  private void clearances() {
    ToDoubleFunction<CompressionState> mean = state -> state.spring().meanDiameter();
    clearance
        .bore(
            "outside diameter at solid, " + method.growthMeans() + covered,
            CompressionState::outsideDiameterAtSolid,
            mean,
            method.growthCitation())
        .ifPresent(limits::add);
    clearance
        .rod(
            LimitName.ROD,
            "free state" + covered,
            CompressionState::clearInsideDiameter,
            mean,
            clearance.source(),
            this::steps)
        .ifPresent(limits::add);
  }

  private double[] steps(Family<CompressionState> family, double rod) {
    AlongFamily along = new AlongFamily(family);
    return clearance.steps(
        rod + along.any().coatedDiameter(), along.any().wire().diameter(), along::coilsAt);
  }
}
