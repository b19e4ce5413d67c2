package coilwright.spring;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

/** What the four end types and the four seatings have in common, and how they differ. */
class EndTypeTest {

  private static final double EXACT = 1e-12;

  @ParameterizedTest
  @EnumSource
  void wiresAtTheEndsAreWhatSolidHasBeyondTheActiveCoils(EndType ends) {
    double wires = ends.solidLength(7.25, 2) / 2 - 7.25;
    assertThat(wires).isCloseTo(ends.deadCoils() + (ends.ground() ? 0 : 1), within(EXACT));
  }

  /**
   * At solid the coils touch: a spring whose free length is its solid length has the wire for
   * pitch.
   */
  @ParameterizedTest
  @EnumSource
  void solidIsWhereThePitchIsTheWire(EndType ends) {
    assertThat(ends.pitch(ends.solidLength(7.25, 2), 2, 7.25)).isCloseTo(2, within(EXACT));
  }

  @ParameterizedTest
  @CsvSource({
    "PLAIN, plain, 0, false, false, PINNED_PINNED",
    "PLAIN_GROUND, plain-ground, 1, false, true, PINNED_PINNED",
    "SQUARED, squared, 2, true, false, PINNED_PINNED",
    "SQUARED_GROUND, squared-ground, 2, true, true, FIXED_FIXED"
  })
  void endsAreAsAgreed(
      EndType ends, String id, int dead, boolean closed, boolean ground, Seating usual) {
    assertThat(ends.id()).isEqualTo(id);
    assertThat(EndType.of(id)).contains(ends);
    assertThat(ends.deadCoils()).isEqualTo(dead);
    assertThat(ends.closed()).isEqualTo(closed);
    assertThat(ends.ground()).isEqualTo(ground);
    assertThat(Seating.usualFor(ends)).isEqualTo(usual);
  }

  @ParameterizedTest
  @CsvSource({
    "FIXED_FIXED, fixed-fixed, 0.5",
    "FIXED_PINNED, fixed-pinned, 0.7",
    "PINNED_PINNED, pinned-pinned, 1",
    "FIXED_FREE, fixed-free, 2"
  })
  void seatingsAreAsAgreed(Seating seating, String id, double factor) {
    assertThat(seating.id()).isEqualTo(id);
    assertThat(Seating.of(id)).contains(seating);
    assertThat(seating.factor()).isEqualTo(factor);
  }

  @Test
  void unknownIdsHaveNoType() {
    assertThat(EndType.of("open")).isEmpty();
    assertThat(Seating.of("fixed")).isEmpty();
  }

  @ParameterizedTest
  @CsvSource({"WAHL, wahl, Wahl, Wahl", "BERGSTRAESSER, bergstraesser, Bergstraesser, Shigley"})
  void correctionsAreNamedForTheirAuthors(
      StressCorrection correction, String id, String author, String source) {
    assertThat(correction.id()).isEqualTo(id);
    assertThat(correction.author()).isEqualTo(author);
    assertThat(correction.citation().source().shortTitle()).isEqualTo(source);
  }
}
