package coilwright.spring;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The angle between the legs, measured on the coil in space, and the coil count it asks. */
class LegsTest {

  private static final double TURN = 2 * Math.PI;

  /** The legs go on along the wire, each away from the body. */
  @ParameterizedTest
  @ValueSource(doubles = {1, 3.1, 3.25, 4.5, 4.9, 7.75, 12})
  void theAngleIsThatOfTheWiresEnds(double coils) {
    Helix body = new Helix(8, 2, coils);
    double first = direction(body.tangent(0).negate());
    double second = direction(body.tangent(coils));
    double counted = (second - first + 2 * TURN) % TURN;
    TorsionSpring spring = new TorsionSpring(SampleWire.of(2), 16, coils, new Legs(20, 20));
    assertThat(Math.cos(spring.legAngle(0) - counted)).isCloseTo(1, within(1e-9));
  }

  private static double direction(Vector3D along) {
    return Math.atan2(along.getY(), along.getX());
  }

  /** Whole coils: in one line. A quarter more: 90 degrees further on in the winding direction. */
  @ParameterizedTest
  @CsvSource({"4, 180", "4.25, 270", "4.5, 0", "4.75, 90", "5, 180"})
  void coilsAndAngles(double coils, double degrees) {
    TorsionSpring spring = new TorsionSpring(SampleWire.of(2), 16, coils, new Legs(20, 20));
    assertThat(Math.toDegrees(spring.legAngle(0))).isCloseTo(degrees, within(1e-9));
    assertThat(Legs.fractionOfACoil(Math.toRadians(degrees)))
        .isCloseTo(coils - Math.floor(coils), within(1e-12));
  }

  /** Winding up by 30 degrees carries the second leg on by 30 degrees. */
  @Test
  void windingUpOpensTheAngle() {
    TorsionSpring spring = new TorsionSpring(SampleWire.of(2), 16, 4, new Legs(20, 20));
    assertThat(Math.toDegrees(spring.legAngle(Math.toRadians(30)))).isCloseTo(210, within(1e-9));
    assertThat(Math.toDegrees(spring.legAngle(Math.toRadians(-30)))).isCloseTo(150, within(1e-9));
  }

  @ParameterizedTest
  @ValueSource(doubles = {-1e-17, -20, 0, 1e9, 3.141592653589793})
  void anAngleAndAFractionStayWithinATurn(double angle) {
    assertThat(Legs.angleAfter(angle)).isGreaterThanOrEqualTo(0).isLessThan(TURN);
    assertThat(Legs.fractionOfACoil(angle)).isGreaterThanOrEqualTo(0).isLessThan(1);
  }

  @Test
  void bothLegsCount() {
    assertThat(new Legs(10, 20).length()).isEqualTo(30);
    assertThat(new Legs(0, 0).diameterTimesCoils()).isZero();
    assertThatIllegalArgumentException().isThrownBy(() -> new Legs(-1, 0));
    assertThatIllegalArgumentException().isThrownBy(() -> new Legs(0, Double.NaN));
  }
}
