package coilwright.problem;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.spring.Kind;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The starter file: valid as it stands, with every key, and each key may be put to use. */
class StarterTest {

  private static final String STARTER = Starter.of(Kind.COMPRESSION);

  private static final List<ProblemKey<?>> ROWS =
      KeyTable.ROWS.stream().filter(key -> key.kinds().contains(Kind.COMPRESSION)).toList();

  /** A key behind a "# " of its own, in a block that may be behind another. */
  private static final String OFF = "(?s)((?:# )?[ -]*)# ([a-z_]+: .*)";

  @Test
  void isAValidProblem() {
    Problem problem = Files.problem(STARTER);
    assertThat(problem.required().orElseThrow().line().orElseThrow().rate()).isEqualTo(2.7);
    assertThat(problem.design()).isEmpty();
    assertThat(problem.ownMaterials()).isEmpty();
    assertThat(problem.limits()).isEqualTo(Files.problem(Files.LOADS).limits());
    assertThat(problem.make()).isEqualTo(Files.problem(Files.LOADS).make());
  }

  @Test
  void isValidWithItsBlocksInUse() {
    assertThat(Files.problem(using("own_materials")).ownMaterials()).hasSize(3);
    assertThat(Files.checked(using("design")).design()).isPresent();
  }

  @Test
  void isValidWithEveryKeyInUse() {
    Problem problem = Files.problem(allOf(using("own_materials")));
    assertThat(problem.make().wireSizes()).isEmpty();
    assertThat(problem.envelope().guides()).isTrue();
    assertThat(problem.ownMaterials().get(0).density()).isEqualTo(7850);
    assertThat(Files.checked(allOf(using("design"))).design()).isPresent();
  }

  @ParameterizedTest(name = "line {1}")
  @MethodSource("linesOff")
  void isValidWithAnyLineInUse(String text, int line) {
    assertThat(Files.faults(Files.read(withLine(text, line), purpose(text)))).isEmpty();
  }

  static Stream<Object[]> linesOff() {
    List<Object[]> cases = new ArrayList<>();
    for (String text : List.of(STARTER, using("own_materials"), using("design"))) {
      List<String> lines = text.lines().toList();
      for (int line = 0; line < lines.size(); line++) {
        if (lines.get(line).matches(OFF) && !lines.get(line).startsWith("#   ")) {
          cases.add(new Object[] {text, line});
        }
      }
    }
    assertThat(cases).hasSizeGreaterThan(100);
    return cases.stream();
  }

  @Test
  void showsEveryKeyAndItsMeaningOnce() {
    for (ProblemKey<?> key : ROWS) {
      assertThat(STARTER).as(key.path()).containsPattern("[ {]" + key.name() + ":|\n" + key.name());
      if (!key.examples().isEmpty()
          && KeyTable.children(Kind.COMPRESSION, key.parent()).contains(key)) {
        assertThat(STARTER).contains(key.examples());
      }
    }
    for (String name : KeyTable.names(Kind.COMPRESSION, "")) {
      assertThat(STARTER.split("(?m)^(# )?" + name + ":")).as(name).hasSize(2);
    }
  }

  @Test
  void explainsEachKeyThatHasALineOfItsOwn() {
    for (ProblemKey<?> key : ROWS) {
      boolean inside = key.path().matches(".*(tolerance|strength|modulus)(\\[\\])?\\..*");
      boolean bound = ROWS.stream().anyMatch(row -> isValueOf(row, key));
      if (!inside && !bound) {
        assertThat(STARTER).as(key.path()).contains("# " + key.help());
      }
    }
  }

  /** Whether a row's example, on one line, holds a key. */
  private static boolean isValueOf(ProblemKey<?> row, ProblemKey<?> key) {
    return row.path().equals(key.parent()) && !row.examples().isEmpty();
  }

  @Test
  void isPlainAsciiWithinReason() {
    assertThat(STARTER).matches("(?s)[\\x20-\\x7E\\n]*");
    assertThat(STARTER.lines()).allMatch(line -> line.length() <= 170);
  }

  private static Purpose purpose(String text) {
    return text.contains("\ndesign:") ? Purpose.CHECK : Purpose.SHORTLIST;
  }

  /** The starter with a block that is left out put to use; design in the place of make. */
  private static String using(String block) {
    StringBuilder text = new StringBuilder();
    for (String part : STARTER.split("(?<=\n)\n")) {
      boolean wanted = part.startsWith("# " + block + ":");
      if (!block.equals("design") || !part.startsWith("make:")) {
        text.append(wanted ? part.replaceAll("(?m)^# ", "") : part).append('\n');
      }
    }
    return text.toString();
  }

  /** The text with one line put to use, and what excludes its key left out. */
  private static String withLine(String text, int line) {
    String[] lines = text.split("\n");
    lines[line] = lines[line].replaceFirst(OFF, "$1$2");
    String name = lines[line].strip().replaceFirst(":.*", "");
    for (Alternatives some : Alternatives.ALL) {
      List<String> names = some.keys().stream().<String>map(ProblemKey::name).toList();
      for (int i = 0; i < lines.length; i++) {
        String other = lines[i].strip().replaceFirst(":.*", "");
        boolean excluded = some.exclusive() && names.contains(name) && names.contains(other);
        lines[i] = excluded && i != line && !name.equals(other) ? "" : lines[i];
      }
    }
    return String.join("\n", lines) + "\n";
  }

  /** The text with every line put to use but those that exclude one before them. */
  private static String allOf(String text) {
    StringBuilder all = new StringBuilder();
    for (String line : text.split("\n")) {
      boolean off = line.matches(OFF) && !line.startsWith("#   ");
      String name = line.replaceFirst(OFF, "$2").replaceFirst(":.*", "");
      boolean instead =
          Alternatives.ALL.stream()
              .filter(Alternatives::exclusive)
              .flatMap(some -> some.keys().stream().skip(1))
              .anyMatch(key -> key.name().equals(name));
      all.append(off && !instead ? line.replaceFirst(OFF, "$1$2") : line).append('\n');
    }
    return all.toString();
  }
}
