package coilwright.spring;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The slenderness L0/D below which a spring with pivoted ends cannot buckle, for the moduli of
 * common wires: our own numbers, pinned, not published ones. Books round all of them to 2.63.
 */
class PinnedSlendernessTest {

  @ParameterizedTest(name = "{0}")
  @CsvSource({
    "EN 10270-1, 206, 81.5, 2.58",
    "EN 10270-2, 206, 79.5, 2.62",
    "music wire of 2 mm, 28.5, 11.75, 2.52",
    "oil-tempered, 28.5, 11.2, 2.59",
    "302, 28, 10, 2.72",
    "1.4310 heat-treated, 185, 73, 2.58",
    "phosphor bronze, 15, 6, 2.57"
  })
  void slendernessIsAsPinned(String wire, double elastic, double shear, double slenderness) {
    double widest = Buckling.alwaysStableMeanDiameter(1, 1, shear, elastic);
    assertThat(1 / widest).as(wire).isCloseTo(slenderness, within(0.005));
  }
}
