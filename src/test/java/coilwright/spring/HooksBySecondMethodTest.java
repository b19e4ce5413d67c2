package coilwright.spring;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Hooks once more: their stress as a curved bar, their share of coils and the rate by energy. */
class HooksBySecondMethodTest {

  private static final double G = SampleWire.SHEAR_MODULUS;
  private static final double E = SampleWire.ELASTIC_MODULUS;
  private static final double D = 2;
  private static final GaussIntegrator RULE = new GaussIntegratorFactory().legendre(200, -1, 1);

  /**
   * The factor of the formula lies above the integral of {@link CurvedBeam} by 0.56 % at index 2,
   * 0.09 % at 3, 0.03 % at 4 and less at wider loops.
   */
  @ParameterizedTest
  @CsvSource({"2, 0.555", "3, 0.092", "4, 0.027", "6, 0.005", "9, 0.001", "12, 0"})
  void theLoopIsStressedLikeACurvedBar(double index, double percent) {
    double straight = 100 * 16 / 2.0 / (Math.PI / 32 * D * D * D);
    double bending = HookStress.bending(100, 16, D, index) - 100 / (Math.PI / 4 * D * D);
    double exact = straight * new CurvedBeam(index).innerFactor();
    assertThat(100 * (bending / exact - 1)).isCloseTo(percent, within(0.002));
  }

  /** The tension beside the bending is that of the straight bar. */
  @Test
  void theLoopIsPulledToo() {
    double far = HookStress.bending(100, 1e-9, D, 6);
    assertThat(far).isCloseTo(100 / (Math.PI / 4 * D * D), withinPercentage(1e-6));
  }

  /**
   * A loop is half a circle in bending from where the load hangs, a half hook a quarter. The
   * straight piece of an extended hook is stiff.
   */
  @ParameterizedTest
  @CsvSource({
    "FULL_LOOP, 3.141592653589793",
    "EXTENDED_HOOK, 3.141592653589793",
    "HALF_LOOP, 1.5707963267948966"
  })
  void aHookDeflectsAsItsShareOfACoil(HookType type, double arc) {
    double mean = 16;
    double coil = 1 / Rate.of(G, D, mean, 1);
    assertThat(type.activeCoils(G, E)).isCloseTo(bent(mean, arc) / coil, withinPercentage(1e-9));
  }

  /** Movement under a unit force of an arc bent by it, from energy. */
  private static double bent(double mean, double arc) {
    double inertia = Math.PI / 64 * D * D * D * D;
    double sum = 0;
    for (int i = 0; i < RULE.getNumberOfPoints(); i++) {
      double angle = arc / 2 * (1 + RULE.getPoint(i));
      double moment = mean / 2 * Math.sin(angle);
      sum += RULE.getWeight(i) * arc / 2 * mean / 2 * moment * moment;
    }
    return sum / (E * inertia);
  }

  /** Body by the energy of its twisted wire, hooks by that of their bent arcs. */
  @ParameterizedTest
  @ValueSource(doubles = {4, 7, 12})
  void theRateIsThatOfAllEnergies(double index) {
    double mean = index * D;
    double body =
        12
            * new CoilFlexibility(new Helix(mean / 2, 1e-6, 1), D, G, E)
                .underLoad(Vector3D.PLUS_K, Vector3D.ZERO)
                .twist();
    Hooks hooks = new Hooks(HookType.FULL_LOOP, 0.5, 0.25, HookType.FULL_LOOP.activeCoils(G, E));
    ExtensionSpring spring = new ExtensionSpring(SampleWire.of(D), mean, 12, hooks, mean - D, 0);
    assertThat(spring.rate())
        .isCloseTo(1 / (body + 2 * bent(mean, Math.PI)), withinPercentage(1e-7));
  }

  /** Of a given force a wider coil bends more, but for coils so tight that curvature tells. */
  @Test
  void theStressesTurnWhereTheyAreSaidTo() {
    double[] least = {HookStress.LEAST_BENDING_INDEX, HookStress.LEAST_TORSION_INDEX};
    for (double step : new double[] {-0.05, 0.05}) {
      double bend = least[0] + step;
      double side = least[1] + step;
      assertThat(bend * HookStress.bendingFactor(bend))
          .isGreaterThan(least[0] * HookStress.bendingFactor(least[0]));
      assertThat(side * HookStress.torsionFactor(side))
          .isGreaterThan(least[1] * HookStress.torsionFactor(least[1]));
    }
    assertThat(HookStress.torsionFactor(1e9)).isCloseTo(1, within(1e-8));
    assertThat(HookStress.bendingFactor(1e9)).isCloseTo(1, within(1e-8));
  }
}
