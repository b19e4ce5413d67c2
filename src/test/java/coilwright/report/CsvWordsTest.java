package coilwright.report;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;

/** Cells and lines as RFC 4180 has them, and words that a spreadsheet cannot take for formulas. */
class CsvWordsTest {

  @Test
  void cellsAreQuotedWhereTheyMustBe() {
    Csv csv = new Csv();
    csv.line(List.of("plain", "a b", "a,b", "say \"when\"", "two\nlines", "cr\r", "'", ""));
    csv.line(List.of("1.5"));
    assertThat(csv.text())
        .isEqualTo("plain,a b,\"a,b\",\"say \"\"when\"\"\",\"two\nlines\",\"cr\r\",',\n1.5\n");
  }

  @Test
  void numbersHaveTheDigitsOfJson() {
    assertThat(Csv.number(1.4)).isEqualTo("1.4");
    assertThat(Csv.number(-0.25)).isEqualTo("-0.25");
    assertThat(Csv.number(2e-3)).isEqualTo("0.002");
    assertThat(Csv.number(1e7)).isEqualTo("1.0E7");
    assertThat(Csv.number(2.0E-3 / 3)).isEqualTo("6.666666666666666E-4");
    assertThat(Csv.number(Double.NaN)).isEmpty();
    assertThat(Csv.number(Double.POSITIVE_INFINITY)).isEmpty();
  }

  @Test
  void whatBeginsLikeAFormulaGetsAnApostrophe() {
    typed("=1+1", "'=1+1");
    typed("+1", "'+1");
    typed("-1", "'-1");
    typed("@cmd", "'@cmd");
    typed("\tx", "' x");
    typed("\r=x", "' =x");
    typed(" =x", "' =x");
    typed("\u0001=x", "' =x");
  }

  @Test
  void otherWordsStayAsTypedButForControlCharacters() {
    typed("a=b", "a=b");
    typed("1-2", "1-2");
    typed("'=x", "'=x");
    typed("a\tb\nc", "a b c");
    typed("", "");
  }

  private static void typed(String word, String cell) {
    assertThat(Csv.typed(word)).isEqualTo(cell);
  }
}
