package coilwright.unit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Quantities with units of every kind, and what is said of those that are refused. */
class QuantityParserTest {

  /**
   * Exact by definition: inch 25.4 mm, pound 0.45359237 kg, standard gravity 9.80665 m/s^2. The
   * products of these are written out to the last digit, from memory of NIST SP 811 appendix B and
   * worked again by hand.
   */
  @ParameterizedTest
  @CsvSource({
    "LENGTH, 1 mm, 1",
    "LENGTH, 8 um, 0.008",
    "LENGTH, 2 cm, 20",
    "LENGTH, 0.03 m, 30",
    "LENGTH, 1e-3 m, 1",
    "LENGTH, 0.5 in, 12.7",
    "LENGTH, 1 ft, 304.8",
    "FORCE, 18 N, 18",
    "FORCE, 1.5 kN, 1500",
    "FORCE, 250 mN, 0.25",
    "FORCE, 1 lbf, 4.4482216152605",
    "FORCE, 16 ozf, 4.4482216152605",
    "FORCE, 1 kgf, 9.80665",
    "RATE, 2.7 N/mm, 2.7",
    "RATE, 2700 N/m, 2.7",
    "RATE, 1 lbf/in, 0.175126835246476377952755905511811",
    "RATE, 12 lbf/ft, 0.175126835246476377952755905511811",
    "TORQUE, 2 N*m, 2000",
    "TORQUE, 1 lbf*in, 112.98482902761670",
    "TORQUE, 1 lbf*ft, 1355.81794833140040",
    "TORQUE, 16 ozf*in, 112.98482902761670",
    "ANGULAR_RATE, 3 N*mm/rad, 3",
    "ANGULAR_RATE, 3.14159265358979323846 N*mm/deg, 180",
    "ANGULAR_RATE, 2 N*m/rad, 2000",
    "ANGULAR_RATE, 3.14159265358979323846 N*m/deg, 180000",
    "ANGULAR_RATE, 1 lbf*in/rad, 112.98482902761670",
    "ANGULAR_RATE, 1 lbf*in/deg, 6473.55385228962964126711",
    "ANGULAR_RATE, 1 lbf*in/turn, 17.98209403413786011463",
    "STRESS, 80 GPa, 80000",
    "STRESS, 1 N/mm^2, 1",
    "STRESS, 1 psi, 0.00689475729316836133672267344534689",
    "STRESS, 30 ksi, 206.842718795050840101680203360407",
    "STRESS, 11.5 Mpsi, 79289.7088714361553723107446214892",
    "ANGLE, 180 deg, 3.14159265358979323846",
    "FREQUENCY, 0.2 kHz, 200",
    "DENSITY, 7.85 g/cm^3, 7850",
    "DENSITY, 1 lb/in^3, 27679.9047102031222300",
    "SHARE, 45 %, 0.45",
    "SHARE, 35%, 0.35"
  })
  void converts(Dimension dimension, String text, double inner) {
    double read = read(dimension, text).value().orElseThrow().inner();
    assertThat(read).isCloseTo(inner, within(4 * Math.ulp(inner)));
  }

  @ParameterizedTest
  @ValueSource(strings = {"12mm", "12 mm", "12  mm", "12\tmm", "+12 mm", "1.2e1 mm", "1.2 cm"})
  void takesBlanksOrNone(String text) {
    assertThat(read(Dimension.LENGTH, text).value().orElseThrow().inner()).isEqualTo(12);
  }

  @ParameterizedTest
  @CsvSource({"35 %, 0.35", "7 %, 0.07", "0.3 %, 0.003", "29 %, 0.29"})
  void sharesAreExactToTheLastDigit(String text, double inner) {
    assertThat(read(Dimension.SHARE, text).value().orElseThrow().inner()).isEqualTo(inner);
  }

  @ParameterizedTest
  @EnumSource(value = Dimension.class, mode = EnumSource.Mode.EXCLUDE, names = "NUMBER")
  void readsEveryUnitOfEveryKind(Dimension dimension) {
    for (Unit unit : dimension.units()) {
      Quantity quantity = read(dimension, "3 " + unit.symbol()).value().orElseThrow();
      assertThat(quantity.unit()).isEqualTo(unit);
      assertThat(quantity.inner()).isCloseTo(3 * unit.factor(), within(1e-15 * 3 * unit.factor()));
    }
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "LENGTH|32|without a unit|",
        "LENGTH|12 N|a force|",
        "FORCE|4 lbs|with an unknown unit|lbf",
        "FORCE|4 lb|a mass|lbf",
        "FORCE|4 n|with an unknown unit|N",
        "LENGTH|3 inch|with an unknown unit|in",
        "LENGTH|3 MM|with an unknown unit|mm",
        "LENGTH|3 parsec|with an unknown unit|",
        "STRESS|3 Mpa|with an unknown unit|MPa",
        "STRESS|3 N/mm2|with an unknown unit|N/mm^2",
        "LENGTH|3 mm mm|with an unknown unit|mm",
        "LENGTH|1,5 mm|with a comma where a point may stand|",
        "LENGTH|1_000 mm|with an underscore|",
        "LENGTH|010 mm|with a leading zero|",
        "LENGTH|1e400 mm|too large a number|",
        "LENGTH|1e308 m|too large a number|",
        "LENGTH|1e-322 um|too small a number|",
        "LENGTH|mm||",
        "LENGTH|- 3 mm||",
        "LENGTH|.inf mm||",
        "LENGTH|.5.5 mm||",
      })
  void saysWhyItRefuses(Dimension dimension, String text, String why, String nearest) {
    assertThat(read(dimension, text))
        .isEqualTo(Parsed.misspelt(why == null ? "" : why, Optional.ofNullable(nearest)));
  }

  @Test
  void namesTheUnitsThatFit() {
    assertThat(QuantityParser.accepted(List.of(Dimension.FORCE, Dimension.SHARE)))
        .isEqualTo("a force in N, mN, kN, lbf, ozf or kgf or a share in %");
  }

  private static Parsed<Quantity> read(Dimension dimension, String text) {
    return QuantityParser.parse(text, List.of(dimension));
  }
}
