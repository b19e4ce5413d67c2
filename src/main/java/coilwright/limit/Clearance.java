package coilwright.limit;

import coilwright.problem.Envelope;
import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.spring.CoilTolerance;
import java.util.function.DoubleUnaryOperator;

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

  /** In words. */
  String words() {
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
