package coilwright.spring;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The angular rate once more, from the strain energy of the wire: the body as a rod in space under
 * a moment on its axis, the legs as bars bent by a force across their ends.
 *
 * <p>A flat body without friction is the law with 64/(2 pi). A body wound close leans, so that its
 * wire is longer and also twists: it is softer by 0.31 % at index 5 and 0.05 % at index 12.
 */
class AngularRateByEnergyTest {

  private static final double E = SampleWire.ELASTIC_MODULUS;
  private static final double G = SampleWire.SHEAR_MODULUS;
  private static final double D = 2;
  private static final int STATIONS = 2000;

  @ParameterizedTest
  @CsvSource({"4, 3, 0, 0", "7, 4.25, 25, 25", "7, 4.25, 0, 60", "12, 20, 10, 40", "5, 1, 90, 90"})
  void aFlatBodyWithItsLegsIsTheLaw(double index, double coils, double first, double second) {
    TorsionSpring spring =
        new TorsionSpring(SampleWire.of(D), index * D, coils, new Legs(first, second));
    double turned = coils * body(index, 1e-6) + leg(first) + leg(second);
    assertThat(spring.rate(AngularRate.FRICTIONLESS)).isCloseTo(1 / turned, withinPercentage(1e-5));
  }

  /** What is left of the deflection turns the body. */
  @ParameterizedTest
  @CsvSource({"7, 4.25, 25, 25", "5, 1, 90, 90"})
  void theLegsTakeTheirShareOfTheTurning(double index, double coils, double first, double second) {
    TorsionSpring spring =
        new TorsionSpring(SampleWire.of(D), index * D, coils, new Legs(first, second));
    double body = coils * body(index, 1e-6);
    double share = body / (body + leg(first) + leg(second));
    assertThat(spring.bodyTurns(1) * 2 * Math.PI).isCloseTo(share, withinPercentage(1e-5));
  }

  @ParameterizedTest
  @CsvSource({"4, 0.483", "5, 0.309", "7, 0.158", "12, 0.054"})
  void aBodyWoundCloseIsSofter(double index, double percent) {
    double softer = body(index, D) / body(index, 1e-6) - 1;
    assertThat(100 * softer).isCloseTo(percent, within(0.005));
  }

  /** Turning of one turn of the body under a unit moment on its axis [rad/(N mm)]. */
  private static double body(double index, double pitch) {
    Helix coil = new Helix(index * D / 2, pitch, 1);
    return new CoilFlexibility(coil, D, G, E).underLoad(Vector3D.ZERO, Vector3D.PLUS_K).sum();
  }

  /**
   * Turning of a straight leg under a force across its end whose moment on the axis is one: the
   * moment falls from one at the body to none at the force [rad/(N mm)].
   */
  private static double leg(double length) {
    double inertia = Math.PI / 64 * Math.pow(D, 4);
    double sum = 0;
    for (int i = 0; i < STATIONS; i++) {
      double moment = (i + 0.5) / STATIONS;
      sum += moment * moment * length / STATIONS / (E * inertia);
    }
    return sum;
  }
}
