package coilwright.material;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

/** How a line is cut into cells. */
class CsvLineTest {

  @Test
  void cellsStandBetweenCommas() {
    cut("a,b", "a", "b");
    cut("a", "a");
    cut("", "");
    cut(",", "", "");
    cut("a,,b,", "a", "", "b", "");
  }

  @Test
  void quotesKeepCommasAndDoubledQuotes() {
    cut("\"a, b\",c", "a, b", "c");
    cut("a,\"\"", "a", "");
    cut("\"say \"\"so\"\"\",b", "say \"so\"", "b");
    cut("\"\"\"\"", "\"");
  }

  private static void cut(String line, String... cells) {
    assertThat(CsvLine.cells(line)).containsExactly(cells);
  }
}
