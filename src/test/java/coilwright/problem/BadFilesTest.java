package coilwright.problem;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Faulty files, each with every message that it earns, word for word. */
class BadFilesTest {

  private static final String DESIGN_BLOCK = Files.DESIGN.substring(Files.DESIGN.indexOf("design"));

  @ParameterizedTest(name = "{0}")
  @MethodSource("cases")
  void saysWhatIsWrong(BadFile file) {
    assertThat(Files.faults(Files.read(file.text(), file.purpose()))).isEqualTo(file.messages());
  }

  @Test
  void thereAreMany() throws IOException {
    assertThat(cases()).hasSizeGreaterThan(250);
  }

  static Stream<BadFile> cases() throws IOException {
    try (InputStream in = BadFilesTest.class.getResourceAsStream("bad-files.txt")) {
      String all = new String(in.readAllBytes(), StandardCharsets.UTF_8);
      String[] parts = all.split("(?m)^=== ");
      return Stream.of(parts).skip(1).map(BadFilesTest::parsed);
    }
  }

  private static BadFile parsed(String part) {
    int line = part.indexOf('\n');
    int rule = part.indexOf("---\n");
    String text =
        part.substring(line + 1, rule)
            .replace("@loads\n", Files.LOADS)
            .replace("@extension\n", Files.EXTENSION)
            .replace("@torsion\n", Files.TORSION)
            .replace("@design\n", Files.DESIGN)
            .replace("@spring\n", DESIGN_BLOCK);
    String grades = String.join(", ", Files.CATALOGUE.gradeIds());
    List<String> messages = new ArrayList<>();
    part.substring(rule + 4)
        .lines()
        .filter(message -> !message.isEmpty())
        .forEach(message -> messages.add(message.replace("<GRADES>", grades)));
    return new BadFile(part.substring(0, line), text, messages);
  }

  record BadFile(String name, String text, List<String> messages) {

    Purpose purpose() {
      return name.startsWith("check") ? Purpose.CHECK : Purpose.SHORTLIST;
    }

    @Override
    public String toString() {
      return name;
    }
  }
}
