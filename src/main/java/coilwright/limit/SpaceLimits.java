package coilwright.limit;

import coilwright.problem.Envelope;
import coilwright.problem.LimitName;
import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.spring.CoilTolerance;
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

  private static final Citation ASKED = Citation.seen(Source.PROBLEM_FILE, "envelope");
  private static final double JUST = 1e-9;

  private final Envelope space;
  private final Method method;
  private final String covered;
  private final List<Limit<CompressionState>> limits = new ArrayList<>();

  private SpaceLimits(Envelope space, Method method, String covered) {
    this.space = space;
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
      limits.add(ValueLimit.fixed(check, value, bound.getAsDouble(), ASKED, false));
    }
  }

  private void clearances() {
    if (space.bore().isPresent()) {
      double bore = space.bore().getAsDouble();
      limits.add(
          new ValueLimit<>(
              new Check(
                  LimitName.BORE,
                  Side.MAX,
                  Dimension.LENGTH,
                  "outside diameter at solid, "
                      + method.growthMeans()
                      + covered
                      + ", against bore less "
                      + clearance()),
              CompressionState::outsideDiameterAtSolid,
              state -> bore - clearance(state),
              method.growthCitation(),
              false));
    }
    if (space.rod().isPresent()) {
      double rod = space.rod().getAsDouble();
      limits.add(
          new ValueLimit<>(
              new Check(
                  LimitName.ROD,
                  Side.MIN,
                  Dimension.LENGTH,
                  "inside diameter, free state" + covered + ", against rod plus " + clearance()),
              CompressionState::clearInsideDiameter,
              state -> rod + clearance(state),
              space.clearanceAssumed() ? CoilTolerance.citation() : ASKED,
              false,
              family -> space.clearanceAssumed() ? steps(family, rod) : new double[0]));
    }
  }

  private String clearance() {
    return space.clearanceAssumed()
        ? "the coil diameter tolerance of EN 15800 grade 2, assumed"
        : "clearance";
  }

  private double clearance(CompressionState state) {
    return space
        .diametralClearance()
        .orElseGet(
            () -> CoilTolerance.of(state.spring().meanDiameter(), state.spring().wireDiameter()));
  }

  /**
   * Where the tolerance steps up near the diameter at which the coil just clears the rod: on both
   * sides of each step, since there a wider coil may clear less.
   */
  private static double[] steps(Family<CompressionState> family, double rod) {
    AlongFamily along = new AlongFamily(family);
    double wire = along.any().coatedDiameter();
    double[] diameters = CoilTolerance.stepsNear(rod + wire, along.any().wire().diameter());
    double[] turns = new double[2 * diameters.length];
    for (int i = 0; i < diameters.length; i++) {
      double coils = along.coilsAt(diameters[i]);
      turns[2 * i] = coils * (1 - JUST);
      turns[2 * i + 1] = coils * (1 + JUST);
    }
    return turns;
  }
}
