package coilwright.problem;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Assertions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What a file must be before anything in it has a meaning. */
class FileFormTest {

  private static final String YAML_REMEDY =
      "check indentation (by spaces), colons, brackets and quotes here and on the line above";
  private static final String JSON_REMEDY =
      "check commas, colons, brackets and quotes here and on the line above";

  @Test
  void anEmptyFileSaysWhatBelongsInIt() {
    for (String nothing : List.of("", "\n\n", "# only a remark\n", "---\n", "{}", "\uFEFF")) {
      assertThat(faults(nothing))
          .as(nothing)
          .hasSize(1)
          .allMatch(fault -> fault.matches("file( \\(line \\d\\))?: empty; must be a block.*"));
    }
  }

  @Test
  void aFileMustBeABlockOfKeys() {
    assertThat(faults("- 18 N\n"))
        .singleElement()
        .asString()
        .startsWith("file (line 1): a list; must be a block of keys: title, spring, units, loads");
    assertThat(faults("18 N\n")).singleElement().asString().startsWith("file (line 1): 18 N; must");
  }

  @Test
  void oneMebibyteIsTheMost() {
    String most = Files.LOADS + "#" + "x".repeat(SourceText.LARGEST - Files.LOADS.length() - 1);
    assertThat(Files.shortlist(most).faults()).isEmpty();
    assertThat(faults(most + "x"))
        .containsExactly("file: larger than 1 MiB; must be at most 1048576 bytes");
  }

  @Test
  void byteOrderMarkAndCarriageReturnsMakeNoDifference() {
    Problem plain = Files.problem(FullFileTest.FULL);
    Problem marked = Files.problem("\uFEFF" + FullFileTest.FULL.replace("\n", "\r\n"));
    assertThat(marked).hasToString(plain.toString());
    assertThat(faults("\uFEFF" + (Files.LOADS + "rate: 0 N/mm\n").replace("\n", "\r\n")))
        .containsExactly("rate (line 7): 0 N/mm; must be above 0 N/mm");
  }

  @Test
  void malformedBytesAreAFault() {
    byte[] bytes = (Files.LOADS + "title: vent \u00e9\n").getBytes(StandardCharsets.ISO_8859_1);
    assertThat(faults(bytes))
        .containsExactly(
            "file (line 7): byte 0xE9 at offset 107 is not UTF-8; must be saved as UTF-8 text");
    byte[] wide = Files.LOADS.getBytes(StandardCharsets.UTF_16);
    assertThat(faults(wide))
        .containsExactly(
            "file (line 1): byte 0xFE at offset 0 is not UTF-8; must be saved as UTF-8 text");
    byte[] cut = Arrays.copyOf("title: \u00e9".getBytes(StandardCharsets.UTF_8), 8);
    assertThat(faults(cut)).singleElement().asString().contains("offset 7 is not UTF-8");
  }

  @Test
  void textBeyondAsciiIsAccepted() {
    assertThat(
            Files.problem(Files.LOADS + "title: L\u00fcftung \uD83C\uDF31 \u6e29\u5ba4\n").title())
        .isEqualTo("L\u00fcftung \uD83C\uDF31 \u6e29\u5ba4");
  }

  @ParameterizedTest
  @CsvSource({"0, 0000", "7, 0007", "27, 001B", "127, 007F", "155, 009B", "65535, FFFF"})
  void controlCharactersAreAFault(int sign, String code) {
    assertThat(faults(Files.LOADS + "title: x" + (char) sign + "\n"))
        .containsExactly("file (line 7): control character U+" + code + "; must be left out");
  }

  @Test
  void tabsDoNotIndent() {
    assertThat(faults("spring: compression\nenvelope:\n\trod: 8 mm\n"))
        .containsExactly("file (line 3): a tab in the indentation; " + YAML_REMEDY);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "title: a: b|1",
        "a: [1, 2|2",
        "a: 'open|2",
        "a: 1\\n b: 2|2",
        "a: @x|1",
        "a: 1\\n]|2",
        "? [a]\\n: 1|1",
        "*x : 1|1",
        "a: *|1",
        "a: %x|1",
        "a: \"\\q\"|1",
        "- a\\nb: 1|2",
      })
  void aSyntaxErrorStandsAlone(String text, int line) {
    assertThat(faults(text.replace("\\n", "\n") + "\n"))
        .containsExactly("file (line " + line + "): not readable as YAML; " + YAML_REMEDY);
  }

  @Test
  void aSyntaxErrorStandsAloneWhateverCameBefore() {
    assertThat(faults("a: &x 1\nb: *x\na: 2\nc: [\n"))
        .containsExactly("file (line 5): not readable as YAML; " + YAML_REMEDY);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "{\"a\": 1,}|1",
        "{\\n\"a\": 010}|2",
        "{\\n\\n'a': 1}|3",
        "{\"a\": NaN}|1",
        "{\"a\": 1|2",
        "{a: 1}|1",
        "{\"a\": 1} x|1",
        "{\"a\": /* b */ 1}|1",
      })
  void aSyntaxErrorInJsonStandsAlone(String text, int line) {
    assertThat(faults(text.replace("\\n", "\n") + "\n"))
        .containsExactly("file (line " + line + "): not readable as JSON; " + JSON_REMEDY);
  }

  @Test
  void anchorsAliasesAndTagsAreRefusedAndTheRestIsRead() {
    assertThat(
            faults(
                """
                spring: !kind compression
                loads:
                  - &first {length: 32 mm, force: &f 18 N}
                  - length: 22 mm
                    force: *f
                title: !!str x
                envelope: &e
                  rod: 0 mm
                &k seats: fixed-free
                limits: &none
                """))
        .containsExactly(
            "spring (line 1): a tag (!); must be left out",
            "loads[0] (line 3): an anchor (&); must be left out",
            "loads[0].force (line 3): an anchor (&); must be left out",
            "loads[1].force (line 5): an alias (*); must be written out",
            "title (line 6): a tag (!); must be left out",
            "envelope (line 7): an anchor (&); must be left out",
            "envelope.rod (line 8): 0 mm; must be above 0 mm",
            "seats (line 9): an anchor (&); must be left out",
            "limits (line 10): an anchor (&); must be left out");
  }

  @Test
  void signsOfAnchorsInTextAreText() {
    assertThat(Files.problem(Files.LOADS + "title: \"*x & !y\"\n").title()).isEqualTo("*x & !y");
    assertThat(Files.problem("title: \uD83C\uDF31 &x\n" + Files.LOADS).title())
        .isEqualTo("\uD83C\uDF31 &x");
  }

  @Test
  void anAliasBombDoesNotGoOff() {
    StringBuilder bomb = new StringBuilder(Files.LOADS).append("a0: &a0 [x, x]\n");
    for (int i = 1; i < 60; i++) {
      bomb.append("a" + i + ": &a" + i + " [*a" + (i - 1) + ", *a" + (i - 1) + "]\n");
    }
    Assertions.assertTimeout(
        Duration.ofSeconds(20), () -> assertThat(faults(bomb.toString())).hasSize(51));
  }

  @Test
  void oneDocumentOnly() {
    String second = "file (line 8): a second document begins; must hold one document";
    assertThat(faults(Files.LOADS + "---\nseats: fixed-free\n")).containsExactly(second);
    assertThat(faults(Files.LOADS + "---\n")).containsExactly(second);
    assertThat(faults("{\"spring\": \"x\"} {}")).hasSize(3);
    assertThat(Files.shortlist("%YAML 1.2\n---\n" + Files.LOADS + "...\n").faults()).isEmpty();
  }

  @Test
  void nestingIsBounded() {
    assertThat(faults("a: " + "[".repeat(100_000)))
        .containsExactly("file (line 1): nested too deep; a problem file needs five levels");
    assertThat(faults("{\"a\": " + "[".repeat(100_000)))
        .containsExactly("file (line 1): nested too deep; a problem file needs five levels");
  }

  @Test
  void theFirstFiftyFaultsAreShownAndTheRestCounted() {
    StringBuilder text = new StringBuilder(Files.LOADS);
    for (int i = 0; i < 70; i++) {
      text.append("key").append(i).append(": 1\n");
    }
    List<String> faults = faults(text.toString());
    assertThat(faults).hasSize(51);
    assertThat(faults.get(0)).startsWith("key0 (line 7): unknown key");
    assertThat(faults.get(49)).startsWith("key49 (line 56): unknown key");
    assertThat(faults.get(50)).isEqualTo("file: 20 more faults are not shown; correct these first");
  }

  private static List<String> faults(String text) {
    return Files.faults(Files.shortlist(text));
  }

  private static List<String> faults(byte[] bytes) {
    return Files.faults(ProblemReader.read(bytes, Purpose.SHORTLIST, Files.CATALOGUE));
  }
}
