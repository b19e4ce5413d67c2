package coilwright.problem;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.function.Predicate;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The rows of the table of keys against the starter file, the reader and the README's table. */
class KeyTableTest {

  /** Rows that exclude one another in one file. */
  private static final List<String> INSTEAD =
      List.of("wire_series:", "outside_diameter:", "inside_diameter:", "total_coils:");

  private static final String STARTER = Starter.compression();

  @Test
  void theStarterIsAValidProblem() {
    Problem problem = Files.problem(STARTER);
    assertThat(problem.required().orElseThrow().rate()).isEqualTo(2.7);
    assertThat(problem.design()).isEmpty();
    assertThat(problem.ownMaterials()).isEmpty();
    assertThat(problem.limits()).isEqualTo(Files.problem(Files.LOADS).limits());
    assertThat(problem.make()).isEqualTo(Files.problem(Files.LOADS).make());
  }

  @Test
  void theStarterIsValidWithEveryKeyInUse() {
    Problem problem = Files.problem(inUse(block -> !block.startsWith("# design:")));
    assertThat(problem.ownMaterials()).hasSize(3);
    assertThat(problem.make().wireSizes()).hasSize(2);
    assertThat(problem.envelope().guides()).isTrue();
  }

  @Test
  void theStarterIsValidForACheckWithEveryKeyInUse() {
    assertThat(Files.checked(inUse(block -> !block.startsWith("make:"))).design()).isPresent();
  }

  @Test
  void theStarterShowsEveryKey() {
    for (ProblemKey<?> key : KeyTable.ROWS) {
      assertThat(STARTER).as(key.path()).containsPattern("[ {]" + key.name() + ":|\n" + key.name());
    }
  }

  @Test
  void theStarterIsPlainAsciiWithinReason() {
    assertThat(STARTER).matches("(?s)[\\x20-\\x7E\\n]*");
    assertThat(STARTER.lines()).allMatch(line -> line.length() <= 160);
  }

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

  /** The starter with every "# " before a key dropped, without blocks and keys that exclude. */
  private static String inUse(Predicate<String> wanted) {
    StringBuilder text = new StringBuilder();
    for (String block : STARTER.split("\n\n")) {
      if (wanted.test(block)) {
        block
            .lines()
            .filter(line -> INSTEAD.stream().noneMatch(line::contains))
            .map(line -> line.replaceFirst("^( *)# ([- ]*[a-z_]+:)", "$1$2"))
            .forEach(line -> text.append(line).append('\n'));
      }
    }
    return text.toString();
  }
}
