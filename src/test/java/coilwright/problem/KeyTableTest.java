package coilwright.problem;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The rows of the table of keys against the reader and the README's table. */
class KeyTableTest {

  @ParameterizedTest
  @MethodSource("examples")
  void everyExampleIsAccepted(ProblemKey<?> key, String example) {
    Faults faults = new Faults();
    Node node = Document.read("x: " + example, faults).orElseThrow();
    Node value = ((Node.Mapping) node).entries().get(0).value();
    Spot spot = new Spot(node.mark(), key.path().replace("[]", "[0]"), faults);
    assertThat(key.reader().read(value, spot)).isPresent();
    assertThat(faults.list()).isEmpty();
  }

  @Test
  void everyKeyOfTheTableIsAcceptedAndNoOther() {
    for (ProblemKey<?> key : KeyTable.ROWS) {
      assertThat(KeyTable.names(key.parent())).contains(key.name());
      assertThat(unknown(key.parent(), key.name())).isFalse();
      assertThat(unknown(key.parent(), key.name() + "_")).isTrue();
      assertThat(Later.has(key.path())).isFalse();
    }
  }

  @Test
  void aKeyStandsOnceAndInABlockThatStands() {
    List<String> paths = KeyTable.ROWS.stream().<String>map(ProblemKey::path).toList();
    assertThat(paths).doesNotHaveDuplicates();
    for (ProblemKey<?> key : KeyTable.ROWS) {
      String parent = key.parent().replaceAll("\\[\\]$", "");
      assertThat(parent.isEmpty() || paths.contains(parent)).as(key.path()).isTrue();
    }
  }

  @Test
  void theTableInMarkdownHasARowForEveryKey() {
    List<String> lines = KeyTable.markdown().lines().toList();
    assertThat(lines).hasSize(KeyTable.ROWS.size() + 2);
    assertThat(lines.get(2)).isEqualTo("| `title` | text | no title | free text |");
    assertThat(lines)
        .contains(
            "| `envelope.bore` | a length in mm, um, cm, m, in or ft | no bore | hole it works in:"
                + " the coil, grown by compression, clears it |")
        .allMatch(line -> line.chars().filter(sign -> sign == '|').count() == 5);
  }

  static Stream<Object[]> examples() {
    return KeyTable.ROWS.stream()
        .flatMap(key -> key.examples().stream().map(example -> new Object[] {key, example}));
  }

  private static boolean unknown(String parent, String name) {
    Faults faults = new Faults();
    Node.Mapping mapping =
        new Node.Mapping(
            Mark.FILE, List.of(new Node.Entry(Mark.FILE, name, new Node.Scalar(Mark.FILE, "x"))));
    UnknownKeys.report(mapping, new Spot(Mark.FILE, parent.replace("[]", "[0]"), faults));
    return faults.count() > 0;
  }
}
