package coilwright.problem;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.spring.Kind;
import java.nio.charset.StandardCharsets;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Whatever a file holds, reading it ends soon, with a problem or with faults in plain words. */
class RobustnessTest {

  private static final int LARGE = 100_000;

  private static final String[] PIECES = {
    ":",
    "-",
    "[",
    "]",
    "{",
    "}",
    ",",
    "\"",
    "'",
    "&a",
    "*a",
    "!t",
    "#",
    "|",
    ">",
    "%",
    "@",
    "`",
    "\n",
    "\r",
    "\t",
    "  ",
    "?",
    "---\n",
    "...\n",
    "none",
    "0",
    "-1",
    "1e999",
    "all",
    "null",
    "~",
    "\uD83C\uDF31",
    "\u2028",
    "\u0085",
    "\uFEFF",
    "<<: ",
    "010",
    "mm",
    "N"
  };

  @ParameterizedTest
  @EnumSource(Purpose.class)
  void anyMutationIsReadOrRefused(Purpose purpose) {
    Random random = new Random(20260);
    String[] seeds = {
      FullFileTest.FULL,
      Files.DESIGN,
      Starter.of(Kind.COMPRESSION).replace("# ", ""),
      Starter.of(Kind.EXTENSION).replace("# ", ""),
      Starter.of(Kind.TORSION).replace("# ", "")
    };
    for (int i = 0; i < 1000; i++) {
      String text = mutated(seeds[i % seeds.length], random);
      Reading reading = Files.read(text, purpose);
      for (String fault : Files.faults(reading)) {
        assertThat(fault).doesNotContainPattern("Exception|jackson|yaml\\.|coilwright\\.|\n");
      }
    }
  }

  @Test
  void anyBytesAreReadOrRefused() {
    Random random = new Random(20261);
    byte[] full = FullFileTest.FULL.getBytes(StandardCharsets.UTF_8);
    for (int i = 0; i < 400; i++) {
      byte[] bytes = full.clone();
      for (int j = 0; j < 1 + random.nextInt(4); j++) {
        bytes[random.nextInt(bytes.length)] = (byte) random.nextInt(256);
      }
      Files.faults(ProblemReader.read(bytes, Purpose.SHORTLIST, Files.CATALOGUE));
    }
  }

  @Test
  void largeFilesAreReadToTheEnd() {
    large("x: 1\n");
    large("k%d: 1\n");
    large("- ");
    large("[");
    large("{a: ");
    large("\"");
    large("? ");
    large("a: &a%d *a\n");
    large("#");
    large("1");
    large("\n");
    large("{\"a\":");
    large("a%d: |\n x\n");
  }

  @Test
  void longListsAreReadToTheEnd() {
    judged(Files.LOADS + "make: {materials: [" + repeated("m%d,", 10_000) + "]}\n");
    judged(Files.LOADS + "own_materials: [" + repeated("{id: a%d, like: b%d},", 4_000) + "]\n");
    judged(
        Files.LOADS + "own_materials: [" + repeated("{id: a%d, like: hard-drawn},", 3_000) + "]\n");
    judged(
        "spring: compression\nloads: ["
            + repeated("{length: %d.5 mm, force: 1 N},", 3_000)
            + "]\n");
    judged(Files.LOADS + "rate: " + "1".repeat(100_000) + " N/mm\n");
    judged(Files.LOADS + "rate: " + "a".repeat(100_000) + "\n");
  }

  private static void large(String piece) {
    String text = repeated(piece, LARGE / piece.length());
    judged(text);
  }

  private static void judged(String text) {
    Reading reading = Files.shortlist(text);
    String shown = text.substring(0, Math.min(40, text.length()));
    assertThat(reading.faults()).as(shown).hasSizeLessThanOrEqualTo(51);
    assertThat(reading.problem().isPresent()).as(shown).isEqualTo(reading.faults().isEmpty());
  }

  private static String repeated(String piece, int times) {
    StringBuilder text = new StringBuilder();
    for (int i = 0; i < times && text.length() < SourceText.LARGEST - 100; i++) {
      text.append(piece.replace("%d", Integer.toString(i)));
    }
    return text.toString();
  }

  private static String mutated(String seed, Random random) {
    StringBuilder text = new StringBuilder(seed);
    for (int i = 0; i < 1 + random.nextInt(3); i++) {
      int at = random.nextInt(text.length());
      int cut = random.nextInt(4) == 0 ? random.nextInt(30) : random.nextInt(3);
      text.delete(at, Math.min(text.length(), at + cut));
      if (random.nextInt(3) > 0) {
        text.insert(Math.min(at, text.length()), PIECES[random.nextInt(PIECES.length)]);
      }
    }
    return text.toString();
  }
}
