package coilwright.spring;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.Arrays;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.apache.commons.math3.linear.EigenDecomposition;
import org.apache.commons.math3.stat.StatUtils;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The first natural frequency once more: the coil cut into lumps of mass joined by springs, both
 * ends held, and the least eigenvalue of the chain. Stiffness and mass of the lumps come from the
 * wire in space.
 *
 * <p>Found: 40 lumps fall short by 0.026 %, twice the lumps by a quarter of that; what they tend to
 * agrees to 5e-7 %.
 */
class SurgeByMassesTest {

  private static final double G = SampleWire.SHEAR_MODULUS;
  private static final double E = SampleWire.ELASTIC_MODULUS;
  private static final double DENSITY = SampleWire.DENSITY;
  private static final double MM_PER_M = 1000;

  @ParameterizedTest
  @CsvSource({"1, 6, 5", "2, 16, 8.25", "0.3, 3.6, 20"})
  void theChainConvergesToTheLaw(double wire, double coil, double coils) {
    double law = Surge.firstFrequency(wire, coil, coils, G, DENSITY);
    double coarse = chain(wire, coil, coils, 40);
    double fine = chain(wire, coil, coils, 80);
    assertThat(coarse).isCloseTo(law, withinPercentage(0.03));
    assertThat((law - coarse) / (law - fine)).isBetween(3.99, 4.01);
    assertThat(fine + (fine - coarse) / 3).isCloseTo(law, withinPercentage(1e-5));
  }

  /** Least frequency of a chain between walls [Hz]. */
  private static double chain(double wire, double coil, double coils, int lumps) {
    double stiffness = lumps * MM_PER_M / (coils * twist(wire, coil));
    double mass = mass(wire, coil, coils) / lumps;
    double[] diagonal = new double[lumps - 1];
    double[] beside = new double[lumps - 2];
    Arrays.fill(diagonal, 2 * stiffness / mass);
    Arrays.fill(beside, -stiffness / mass);
    double[] squares = new EigenDecomposition(diagonal, beside).getRealEigenvalues();
    return Math.sqrt(StatUtils.min(squares)) / (2 * Math.PI);
  }

  /** Deflection of a flat turn per unit of force [mm/N]. */
  private static double twist(double wire, double coil) {
    return new CoilFlexibility(new Helix(coil / 2, 0, 1), wire, G, E)
        .underLoad(Vector3D.PLUS_K, Vector3D.ZERO)
        .twist();
  }

  /** Mass of the flat active coils [kg]. */
  private static double mass(double wire, double coil, double coils) {
    double length = new Helix(coil / 2, 0, coils).length() / MM_PER_M;
    return DENSITY * Math.PI / 4 * Math.pow(wire / MM_PER_M, 2) * length;
  }
}
