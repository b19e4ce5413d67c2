package coilwright.problem;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.spring.Kind;
import java.util.ArrayList;
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
    Spot spot =
        new Spot(node.mark(), key.path().replace("[]", "[0]"), faults).of(key.kinds().get(0));
    assertThat(key.reader().read(value, spot)).isPresent();
    assertThat(faults.list()).isEmpty();
  }

  @Test
  void everyKeyOfTheTableIsAcceptedAndNoOther() {
    for (ProblemKey<?> key : KeyTable.ROWS) {
      for (Kind kind : key.kinds()) {
        assertThat(KeyTable.names(kind, key.parent())).contains(key.name());
        assertThat(faults(kind, key.parent(), key.name())).isEmpty();
        assertThat(faults(kind, key.parent(), key.name() + "_")).hasSize(1);
      }
    }
  }

  @Test
  void aKeyOfAnotherKindIsRefusedAsWhatItIs() {
    int foreign = 0;
    for (ProblemKey<?> key : KeyTable.ROWS) {
      for (Kind kind : Kind.values()) {
        if (!KeyTable.kindsOf(key.parent(), key.name()).contains(kind)) {
          foreign++;
          Fault fault = faults(kind, key.parent(), key.name()).get(0);
          assertThat(fault.found()).startsWith("a key of ").contains(key.kinds().get(0).id());
          assertThat(fault.remedy()).matches("must be left out of an? " + kind.id() + " file");
        }
      }
    }
    assertThat(foreign).isGreaterThan(100);
  }

  @Test
  void aKeyStandsOnceAndInABlockThatStands() {
    for (Kind kind : Kind.values()) {
      List<ProblemKey<?>> rows = new ArrayList<>(KeyTable.ROWS);
      rows.removeIf(key -> !key.kinds().contains(kind));
      List<String> paths = rows.stream().<String>map(ProblemKey::path).toList();
      assertThat(paths).doesNotHaveDuplicates();
      for (ProblemKey<?> key : rows) {
        String parent = key.parent().replaceAll("\\[\\]$", "");
        assertThat(parent.isEmpty() || paths.contains(parent)).as(key.path()).isTrue();
      }
    }
  }

  @Test
  void theTableInMarkdownHasARowForEveryKey() {
    List<String> lines = KeyTable.markdown().lines().toList();
    assertThat(lines.subList(2, lines.size()).stream().map(line -> line.split("`")[1]).distinct())
        .containsExactlyElementsOf(
            KeyTable.ROWS.stream().<String>map(ProblemKey::path).distinct().toList());
    assertThat(lines).doesNotHaveDuplicates();
    assertThat(lines.get(2)).isEqualTo("| `title` | all | text | no title | free text |");
    assertThat(lines)
        .contains(
            "| `envelope.bore` | compression | a length in mm, um, cm, m, in or ft | no bore | hole"
                + " it works in: the coil, grown by compression, clears it |",
            "| `rank.by` | all | mass, margin, cost or robust | mass | lightest, greatest least"
                + " stress margin, cheapest, or greatest least margin first |")
        .anyMatch(line -> line.startsWith("| `stroke` | compression, extension | "))
        .allMatch(line -> line.chars().filter(sign -> sign == '|').count() == 6);
  }

  static Stream<Object[]> examples() {
    return KeyTable.ROWS.stream()
        .flatMap(key -> key.examples().stream().map(example -> new Object[] {key, example}));
  }

  private static List<Fault> faults(Kind kind, String parent, String name) {
    Faults faults = new Faults();
    Node.Mapping mapping =
        new Node.Mapping(
            Mark.FILE, List.of(new Node.Entry(Mark.FILE, name, new Node.Scalar(Mark.FILE, "x"))));
    UnknownKeys.report(mapping, new Spot(Mark.FILE, parent.replace("[]", "[0]"), faults).of(kind));
    return faults.list();
  }
}
