package coilwright.spring;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

/**
 * Solid length and pitch once more, by laying the wire turn on turn: the centre line climbs by the
 * local pitch of each small piece, the wire stands out by half its diameter at each end, and
 * grinding takes that half away.
 *
 * <p>Closed ends lie on their neighbour, one turn at each end. Plain and ground ends lose half a
 * turn each to the grinding, which is still wound at the pitch. Found: no difference but rounding.
 */
class EndsByStackingTest {

  private static final int PIECES_OF_A_TURN = 100;
  private static final double WIRE = 1.5;

  @ParameterizedTest
  @EnumSource
  void pressedToSolidTheCoilsTouch(EndType ends) {
    for (double coils : new double[] {3, 7.25, 20}) {
      assertThat(ends.solidLength(coils, WIRE)).isCloseTo(stacked(ends, coils, WIRE), within(1e-9));
    }
  }

  @ParameterizedTest
  @CsvSource({"2", "4.5", "9"})
  void stackedAtItsPitchTheSpringHasItsFreeLength(double pitch) {
    for (EndType ends : EndType.values()) {
      for (double coils : new double[] {3, 7.25, 20}) {
        double freeLength = stacked(ends, coils, pitch);
        assertThat(ends.pitch(freeLength, WIRE, coils))
            .as(ends.id())
            .isCloseTo(pitch, within(1e-9));
      }
    }
  }

  /** Height over all of a spring whose open coils have a pitch. */
  private static double stacked(EndType ends, double activeCoils, double pitch) {
    double turns = activeCoils + (ends.closed() ? 2 : ends.ground() ? 1 : 0);
    double height = 0;
    long pieces = Math.round(turns * PIECES_OF_A_TURN);
    for (int i = 0; i < pieces; i++) {
      double middle = (i + 0.5) / PIECES_OF_A_TURN;
      boolean atAnEnd = middle < 1 || middle > turns - 1;
      height += (ends.closed() && atAnEnd ? WIRE : pitch) / PIECES_OF_A_TURN;
    }
    return height + (ends.ground() ? 0 : WIRE);
  }
}
