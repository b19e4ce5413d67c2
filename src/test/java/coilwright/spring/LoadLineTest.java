package coilwright.spring;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

/** The line of force against length. */
class LoadLineTest {

  private static final double EXACT = 1e-12;

  @Test
  void aLineGoesThroughBothLoads() {
    LoadLine line = LoadLine.through(32, 18, 22, 45);
    assertThat(line.rate()).isCloseTo(2.7, within(EXACT));
    assertThat(line.freeLength()).isCloseTo(32 + 18 / 2.7, within(EXACT * 40));
    assertThat(line.forceAt(32)).isCloseTo(18, within(EXACT * 20));
    assertThat(line.forceAt(22)).isCloseTo(45, within(EXACT * 50));
  }

  @Test
  void theFreeSpringBearsNothing() {
    assertThat(new LoadLine(2.7, 40).forceAt(40)).isZero();
  }

  @Test
  void lengthAndForceAreEachOthersInverse() {
    LoadLine line = new LoadLine(3.1, 55);
    for (double length : new double[] {60, 55, 41.3, 10}) {
      assertThat(line.lengthUnder(line.forceAt(length))).isCloseTo(length, within(EXACT * 100));
    }
  }

  @Test
  void theOrderOfTheLoadsDoesNotMatter() {
    assertThat(LoadLine.through(22, 45, 32, 18).rate()).isCloseTo(2.7, within(EXACT));
  }
}
