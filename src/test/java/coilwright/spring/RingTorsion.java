package coilwright.spring;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.RealVector;

/**
 * Torsion of a ring sector of round section by a force on the ring's axis, solved in the plane of
 * the section.
 *
 * <p>With u_z = h theta and a warping u_theta(r, z) only the two shear stresses in the section are
 * left. Equilibrium gives them a stress function psi, zero on the edge, with tau_thetaz = (2 G
 * h/r^2) dpsi/dr and tau_rtheta = -(2 G h/r^2) dpsi/dz; compatibility asks div(grad psi / r^3) =
 * -1/r^3. Ritz: psi = (1 - x^2 - y^2) times a polynomial in x = r - C and y = z, the wire's radius
 * being 1, with the integrals by Gauss along radii and an even rule round the section.
 */
final class RingTorsion {

  private static final int RADII = 20;
  private static final int RAYS = 48;

  private final double index;
  private final List<int[]> powers = new ArrayList<>();
  private final RealVector solution;
  private final double volume;

  /**
   * Solves for one ring.
   *
   * @param index C = D/d [-]
   * @param degree greatest power of the polynomial
   */
  RingTorsion(double index, int degree) {
    this.index = index;
    for (int m = 0; m <= degree; m++) {
      for (int n = 0; m + n <= degree; n += 2) {
        powers.add(new int[] {m, n});
      }
    }
    RealMatrix stiffness = new Array2DRowRealMatrix(powers.size(), powers.size());
    RealVector load = new ArrayRealVector(powers.size());
    assemble(stiffness, load);
    this.solution = new LUDecomposition(stiffness).getSolver().solve(load);
    this.volume = solution.dotProduct(load);
  }

  private void assemble(RealMatrix stiffness, RealVector load) {
    GaussIntegrator rule = new GaussIntegratorFactory().legendre(RADII, 0, 1);
    for (int i = 0; i < RADII; i++) {
      for (int j = 0; j < RAYS; j++) {
        double angle = 2 * Math.PI * j / RAYS;
        double radius = rule.getPoint(i);
        double weight = rule.getWeight(i) * radius * 2 * Math.PI / RAYS;
        add(radius * Math.cos(angle), radius * Math.sin(angle), weight, stiffness, load);
      }
    }
  }

  private void add(double x, double y, double weight, RealMatrix stiffness, RealVector load) {
    double nearer = weight * Math.pow(index / (index + x), 3);
    double[][] shapes = shapes(x, y);
    for (int k = 0; k < shapes.length; k++) {
      load.addToEntry(k, nearer * shapes[k][0]);
      for (int l = 0; l < shapes.length; l++) {
        double energy = shapes[k][1] * shapes[l][1] + shapes[k][2] * shapes[l][2];
        stiffness.addToEntry(k, l, nearer * energy);
      }
    }
  }

  /** Every shape at a point: its value and its two slopes. */
  private double[][] shapes(double x, double y) {
    double[][] shapes = new double[powers.size()][];
    double edge = 1 - x * x - y * y;
    for (int k = 0; k < shapes.length; k++) {
      int m = powers.get(k)[0];
      int n = powers.get(k)[1];
      double p = Math.pow(x, m) * Math.pow(y, n);
      double px = m == 0 ? 0 : m * Math.pow(x, m - 1) * Math.pow(y, n);
      double py = n == 0 ? 0 : n * Math.pow(x, m) * Math.pow(y, n - 1);
      shapes[k] = new double[] {edge * p, edge * px - 2 * x * p, edge * py - 2 * y * p};
    }
    return shapes;
  }

  /**
   * Rate of a turn over that of a straight bar twisted by the same moment [-]: the force is the
   * integral of tau_thetaz, which by parts is that of 4 G h psi/r^3.
   */
  double rateFactor() {
    return 8 / Math.PI * volume;
  }

  /**
   * Shear stress at the edge over the greatest stress of the straight bar, 8 F D/(pi d^3) [-].
   *
   * @param angle from the outside of the coil [rad]; the inside is at pi
   */
  double stressFactor(double angle) {
    double x = Math.cos(angle);
    double slopeX = 0;
    double slopeY = 0;
    double[][] shapes = shapes(x, Math.sin(angle));
    for (int k = 0; k < shapes.length; k++) {
      slopeX += solution.getEntry(k) * shapes[k][1];
      slopeY += solution.getEntry(k) * shapes[k][2];
    }
    double nearer = Math.pow(index / (index + x), 2);
    return Math.PI / 4 * nearer * Math.hypot(slopeX, slopeY) / volume;
  }
}
