package coilwright.spring;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.integration.IterativeLegendreGaussIntegrator;

/**
 * A bar of round section bent in the plane of its curvature, by the theory of Winkler: sections
 * stay plane, so that a fibre nearer to the centre of curvature, being shorter, strains more. All
 * is summed over the section; no closed form is used. The unit of length is half the wire, that of
 * stress the modulus times the share by which the angle of a piece changes.
 */
final class CurvedBeam {

  /** I of a circle of radius one. */
  private static final double INERTIA = Math.PI / 4;

  private final double radius;
  private final double neutral;
  private final double moment;

  /**
   * A bar.
   *
   * @param springIndex C = D/d, which is also the radius of the centre line in half wires
   */
  CurvedBeam(double springIndex) {
    radius = springIndex;
    neutral = Math.PI / over(y -> 1 / (radius + y)); // no force on the section
    moment = -over(y -> stress(y) * y);
  }

  /** Stress at the inside over that of a straight bar under the same moment [-]. */
  double innerFactor() {
    return stress(-1) * INERTIA / moment;
  }

  /** Stress at the outside over that of a straight bar under the same moment [-]. */
  double outerFactor() {
    return -stress(1) * INERTIA / moment;
  }

  /** The moment that it takes over that of a straight bar bent by the same angle [-]. */
  double stiffness() {
    return moment * radius / INERTIA;
  }

  /** Stress at a place, y outward from the centre line. */
  private double stress(double y) {
    return (neutral - radius - y) / (radius + y);
  }

  /** Sum over the section; y = sin(t) smooths its ends. */
  private static double over(DoubleUnaryOperator value) {
    return new IterativeLegendreGaussIntegrator(20, 1e-12, 1e-14)
        .integrate(
            100_000,
            t -> value.applyAsDouble(Math.sin(t)) * 2 * Math.cos(t) * Math.cos(t),
            -Math.PI / 2,
            Math.PI / 2);
  }
}
