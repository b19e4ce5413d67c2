package coilwright.limit;

import coilwright.problem.Envelope;
import coilwright.problem.LimitName;
import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.spring.CoilTolerance;
import coilwright.spring.Family;
import coilwright.spring.State;
import coilwright.unit.Dimension;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.DoubleUnaryOperator;
import java.util.function.ToDoubleFunction;

/**
 * What must stay free between a coil and the bore round it or the rod in it, whatever the kind of
 * spring.
 *
 * @param space the space
 */
record Clearance(Envelope space) {

  /** Where the space comes from. */
  static final Citation ASKED = Citation.seen(Source.PROBLEM_FILE, "envelope");

  private static final double JUST = 1e-9;

  /**
   * The bound that a bore sets.
   *
   * @param outside which outside diameter clears it, in words
   * @param value that diameter [mm]
   * @param meanDiameter D [mm]
   * @param source where the diameter's law comes from
   * @param <S> the state of the kind of spring
   * @return the limit; empty without a bore
   */
  <S extends State> Optional<Limit<S>> bore(
      String outside,
      ToDoubleFunction<S> value,
      ToDoubleFunction<S> meanDiameter,
      Citation source) {
    if (space.bore().isEmpty()) {
      return Optional.empty();
    }
    double bore = space.bore().getAsDouble();
    String definition = outside + ", against bore less " + words();
    return Optional.of(
        new ValueLimit<>(
            new Check(LimitName.BORE, Side.MAX, Dimension.LENGTH, definition),
            value,
            state -> bore - of(meanDiameter.applyAsDouble(state), state.wire().diameter()),
            source,
            false));
  }

  /**
   * The bound that a rod sets.
   *
   * @param name what the kind of spring calls it
   * @param inside which inside diameter clears it, in words
   * @param value that diameter [mm]
   * @param meanDiameter D [mm]
   * @param source where the diameter's law comes from
   * @param turns the counts at which the margin may turn, of a family and the rod's diameter [mm]
   * @param <S> the state of the kind of spring
   * @return the limit; empty without a rod
   */
  <S extends State> Optional<Limit<S>> rod(
      LimitName name,
      String inside,
      ToDoubleFunction<S> value,
      ToDoubleFunction<S> meanDiameter,
      Citation source,
      BiFunction<Family<S>, Double, double[]> turns) {
    if (space.rod().isEmpty()) {
      return Optional.empty();
    }
    double rod = space.rod().getAsDouble();
    String definition = "inside diameter, " + inside + ", against rod plus " + words();
    return Optional.of(
        new ValueLimit<>(
            new Check(name, Side.MIN, Dimension.LENGTH, definition),
            value,
            state -> rod + of(meanDiameter.applyAsDouble(state), state.wire().diameter()),
            source,
            false,
            family -> turns.apply(family, rod)));
  }

  /** In words. */
  private String words() {
    return space.clearanceAssumed()
        ? "the coil diameter tolerance of EN 15800 grade 2, assumed"
        : "clearance";
  }

  /** Where its size comes from. */
  Citation source() {
    return space.clearanceAssumed() ? CoilTolerance.citation() : ASKED;
  }

  /** Its size [mm] for a coil of a mean diameter, of a wire [mm]. */
  double of(double meanDiameter, double wireDiameter) {
    return space.diametralClearance().orElseGet(() -> CoilTolerance.of(meanDiameter, wireDiameter));
  }

  /**
   * Where the tolerance steps up near the diameter at which the coil just clears the rod: on both
   * sides of each step, since there a wider coil may clear less.
   *
   * @param meanDiameter D at which the coil just clears the rod [mm]
   * @param wireDiameter d [mm]
   * @param coilsAt the coil count of a mean diameter
   * @return coil counts [-]; none where the clearance is given
   */
  double[] steps(double meanDiameter, double wireDiameter, DoubleUnaryOperator coilsAt) {
    return space.clearanceAssumed()
        ? besides(CoilTolerance.stepsNear(meanDiameter, wireDiameter), coilsAt)
        : new double[0];
  }

  /**
   * The same between two diameters, of a clearance that is assumed.
   *
   * @param from D at which the coil just clears the rod by nothing [mm]
   * @param to D at which it does by the greatest tolerance [mm]
   * @param wireDiameter d [mm]
   * @param coilsAt the coil count of a mean diameter
   * @return coil counts [-]
   */
  double[] stepsBetween(double from, double to, double wireDiameter, DoubleUnaryOperator coilsAt) {
    return besides(CoilTolerance.stepsBetween(from, to, wireDiameter), coilsAt);
  }

  private static double[] besides(double[] diameters, DoubleUnaryOperator coilsAt) {
    double[] turns = new double[2 * diameters.length];
    for (int i = 0; i < diameters.length; i++) {
      double coils = coilsAt.applyAsDouble(diameters[i]);
      turns[2 * i] = coils * (1 - JUST);
      turns[2 * i + 1] = coils * (1 + JUST);
    }
    return turns;
  }
}
