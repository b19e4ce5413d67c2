package coilwright.unit;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Which texts are numbers, and what they are. */
class DecimalNumberTest {

  @ParameterizedTest
  @CsvSource({
    "0, 0",
    "12, 12",
    "-3, -3",
    "+4, 4",
    "0.25, 0.25",
    ".063, 0.063",
    "1e-3, 0.001",
    "2.5E2, 250",
    "1e+2, 100",
    "-0, 0",
    "0.0, 0",
    "10, 10",
    "123456789012345678901, 1.2345678901234568e20"
  })
  void reads(String text, double value) {
    assertThat(DecimalNumber.parse(text).value()).contains(value);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        "-",
        ".",
        "5.",
        "e3",
        ".e3",
        "1e",
        "1e1.5",
        "0x1F",
        "0o17",
        ".inf",
        "-.inf",
        ".nan",
        "NaN",
        "Infinity",
        "1 000",
        "1d",
        "1f",
        "--1",
        "1:30",
        "\u0661",
        "1/2",
        "1.2.3",
        "' 1'"
      })
  void refuses(String text) {
    assertThat(DecimalNumber.parse(text)).isEqualTo(Parsed.refused(""));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "010|with a leading zero",
        "-007.5|with a leading zero",
        "00|with a leading zero",
        "1,5|with a comma where a point may stand",
        "1,000.5|with a comma where a point may stand",
        "1_000|with an underscore",
        "0.00000000000000000000000000000000000000000000000000000000000000000000000000000000000000000"
            + "000000000000|too long a number",
        "1e400|too large a number",
        "-1e400|too large a number",
        "1e-400|too small a number"
      })
  void saysWhyItRefuses(String text, String why) {
    assertThat(DecimalNumber.parse(text)).isEqualTo(Parsed.refused(why));
  }
}
