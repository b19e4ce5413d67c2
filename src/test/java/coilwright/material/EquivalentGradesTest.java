package coilwright.material;

import static org.assertj.core.api.Assertions.assertThat;

import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Grades that two standards describe separately and that the trade takes for each other: their
 * tables were written by different committees, in different units, and must tell of one wire. Where
 * one of them has steps, up to 3 % of the difference is the step.
 */
class EquivalentGradesTest {

  private static final Catalogue CATALOGUE = Catalogue.load();

  /** What class II of ASTM A229 has above class I below and above .062 in [MPa]. */
  private static final double CLASS_II = 31 * 6.894_757;

  /** From and to in mm; how far the second may be from the first, as a share of it [%]. */
  @ParameterizedTest
  @CsvSource({
    "music-wire, en-10270-1-sh, 0.3, 6.3, 6",
    "music-wire, en-10270-1-dh, 0.102, 0.3, 9",
    "stainless-302, en-10270-3-1.4310-ns, 0.3, 2.03, 5",
    "stainless-316, en-10270-3-1.4401, 0.3, 3.7, 8",
    "chrome-vanadium, en-10270-2-fdcrv, 0.52, 6, 5.5",
    "chrome-vanadium, en-10270-2-fdcrv, 6, 12, 8.5",
    "chrome-silicon, en-10270-2-fdsicr, 0.9, 10, 4",
    "en-10270-2-fdsicr, en-10270-2-vdsicr, 0.5, 10, 3",
    "stainless-17-7ph, en-10270-3-1.4568, 0.3, 10, 11"
  })
  void areAboutAsStrong(String one, String other, double from, double to, double percent) {
    for (int i = 0; i <= 60; i++) {
      double d = from + (to - from) * i / 60;
      assertThat(strength(other, d))
          .as(other + " at " + d + " mm")
          .isCloseTo(strength(one, d), Percentage.withPercentage(percent));
    }
  }

  @Test
  void mediumStrengthIsNoWeakerThanHardDrawnClassOneAndNoStrongerThanMusicWire() {
    for (double d = 0.52; d < 6.3; d += 0.1) {
      double medium = strength("en-10270-1-sm", d);
      assertThat(medium)
          .as(d + " mm")
          .isBetween(strength("hard-drawn", d), strength("music-wire", d));
    }
  }

  /** The steps of EN 10270-2 give thin wire of a step what its thickest has, 6 % less at most. */
  @Test
  void carbonSteelOfTheSecondPartLiesBetweenTheTwoClassesOfOilTempered() {
    for (double d = 0.72; d < 15.5; d += 0.1) {
      double first = strength("oil-tempered", d);
      assertThat(strength("en-10270-2-fdc", d))
          .as(d + " mm")
          .isBetween(0.94 * first, first + CLASS_II);
    }
  }

  @Test
  void theOrderOfTheGradesOfPatentedWire() {
    for (double d = 1; d <= 10; d += 0.25) {
      double medium = strength("en-10270-1-sm", d);
      assertThat(strength("en-10270-1-sl", d)).isLessThan(medium);
      assertThat(strength("en-10270-1-dm", d)).isEqualTo(medium);
      assertThat(strength("en-10270-1-sh", d)).isGreaterThan(medium);
      assertThat(strength("en-10270-1-dh", d)).isEqualTo(strength("en-10270-1-sh", d));
    }
  }

  @Test
  void theOrderOfTheStainlessGrades() {
    for (double d = 0.2; d <= 10; d += 0.1) {
      double normal = strength("en-10270-3-1.4310-ns", d);
      assertThat(strength("en-10270-3-1.4401", d)).as(d + " mm").isLessThan(normal);
      assertThat(strength("en-10270-3-1.4310-hs", d)).as(d + " mm").isGreaterThan(normal);
      assertThat(strength("en-10270-3-1.4568", d)).as(d + " mm").isGreaterThan(normal);
    }
  }

  private static double strength(String id, double diameter) {
    return CATALOGUE.grade(id).strength().at(diameter);
  }
}
