package coilwright.problem;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import coilwright.spring.Kind;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;

/** The starter files: valid as they stand, with every key, and each key may be put to use. */
class StarterTest {

  private static final String STARTER = Starter.of(Kind.COMPRESSION);

  /** A key behind a "# " of its own, in a block that may be behind another. */
  private static final String OFF = "(?s)((?:# )?[ -]*)# ([a-z_]+: .*)";

  /** Keys that exclude each other stand no farther apart than this [lines]. */
  private static final int NEAR = 2;

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
  void isAValidProblemOfTheOtherKinds() {
    TensionLine tension =
        Files.problem(Starter.of(Kind.EXTENSION)).extension().orElseThrow().line().orElseThrow();
    assertThat(tension.rate()).isCloseTo(1.8, within(1e-12));
    TorqueLine torque =
        Files.problem(Starter.of(Kind.TORSION)).torsion().orElseThrow().line().orElseThrow();
    assertThat(torque.rate() * Math.PI / 180).isCloseTo(5, within(1e-12));
    assertThat(torque.freeAngle().orElseThrow()).isCloseTo(0, within(1e-12));
  }

  @ParameterizedTest
  @EnumSource(Kind.class)
  void isValidWithItsBlocksInUse(Kind kind) {
    assertThat(Files.problem(using(kind, "own_materials")).ownMaterials()).hasSize(3);
    assertThat(Files.checked(using(kind, "design")).design()).isPresent();
  }

  @ParameterizedTest
  @EnumSource(Kind.class)
  void isValidWithEveryKeyInUse(Kind kind) {
    Problem problem = Files.problem(allOf(using(kind, "own_materials")));
    assertThat(problem.kind()).isEqualTo(kind);
    assertThat(problem.make().wireSizes()).isEmpty();
    assertThat(problem.envelope().guides()).isTrue();
    assertThat(problem.ownMaterials().get(0).density()).isEqualTo(7850);
    String design =
        using(kind, "design").replaceFirst("(?m)^# free_length: .*inside the hooks.*\n", "");
    assertThat(Files.checked(allOf(design)).design()).isPresent();
  }

  @ParameterizedTest(name = "{0}, line {2}")
  @MethodSource("linesOff")
  void isValidWithAnyLineInUse(Kind kind, String text, int line) {
    assertThat(Files.faults(Files.read(withLine(text, line), purpose(text)))).isEmpty();
  }

  static Stream<Object[]> linesOff() {
    List<Object[]> cases = new ArrayList<>();
    for (Kind kind : Kind.values()) {
      for (String text :
          List.of(Starter.of(kind), using(kind, "own_materials"), using(kind, "design"))) {
        List<String> lines = text.lines().toList();
        for (int line = 0; line < lines.size(); line++) {
          boolean off = lines.get(line).matches(OFF) && !lines.get(line).startsWith("#   ");
          if (off && !lines.get(line).contains("only where make.hook_length is free")) {
            cases.add(new Object[] {kind, text, line});
          }
        }
      }
    }
    assertThat(cases).hasSizeGreaterThan(300);
    return cases.stream();
  }

  @ParameterizedTest
  @EnumSource(Kind.class)
  void showsEveryKeyAndItsMeaningOnce(Kind kind) {
    String text = Starter.of(kind);
    for (ProblemKey<?> key : rows(kind)) {
      assertThat(text).as(key.path()).containsPattern("[ {]" + key.name() + ":|\n" + key.name());
      if (!key.examples().isEmpty() && KeyTable.children(kind, key.parent()).contains(key)) {
        assertThat(text).contains(key.examples());
      }
    }
    for (String name : KeyTable.names(kind, "")) {
      assertThat(text.split("(?m)^(# )?" + name + ":")).as(name).hasSize(2);
    }
  }

  @ParameterizedTest
  @EnumSource(Kind.class)
  void explainsEachKeyThatHasALineOfItsOwn(Kind kind) {
    for (ProblemKey<?> key : rows(kind)) {
      boolean inside = key.path().matches(".*(tolerance|strength|modulus)(\\[\\])?\\..*");
      boolean bound = rows(kind).stream().anyMatch(row -> isValueOf(row, key));
      if (!inside && !bound) {
        assertThat(Starter.of(kind)).as(key.path()).contains("# " + key.help());
      }
    }
  }

  /** Whether a row's example, on one line, holds a key. */
  private static boolean isValueOf(ProblemKey<?> row, ProblemKey<?> key) {
    return row.path().equals(key.parent()) && !row.examples().isEmpty();
  }

  @ParameterizedTest
  @EnumSource(Kind.class)
  void isPlainAsciiWithinReason(Kind kind) {
    assertThat(Starter.of(kind)).matches("(?s)[\\x20-\\x7E\\n]*");
    assertThat(Starter.of(kind).lines()).allMatch(line -> line.length() <= 190);
  }

  private static List<ProblemKey<?>> rows(Kind kind) {
    List<ProblemKey<?>> rows = new ArrayList<>(KeyTable.ROWS);
    rows.removeIf(key -> !key.kinds().contains(kind));
    return rows;
  }

  private static Purpose purpose(String text) {
    return text.contains("\ndesign:") ? Purpose.CHECK : Purpose.SHORTLIST;
  }

  /** The starter with a block that is left out put to use; design in the place of make. */
  private static String using(Kind kind, String block) {
    StringBuilder text = new StringBuilder();
    for (String part : Starter.of(kind).split("(?<=\n)\n")) {
      boolean wanted = part.startsWith("# " + block + ":");
      if (!block.equals("design") || !part.startsWith("make:")) {
        text.append(wanted ? part.replaceAll("(?m)^# ", "") : part).append('\n');
      }
    }
    return text.toString();
  }

  /** The text with one line put to use, what it needs too, and what excludes it left out. */
  private static String withLine(String text, int line) {
    String[] lines = text.split("\n");
    lines[line] = lines[line].replaceFirst(OFF, "$1$2");
    String name = lines[line].strip().replaceFirst("^- ", "").replaceFirst(":.*", "");
    String partner = name.equals("force") ? "arm" : name.equals("arm") ? "force" : "-";
    int next = name.equals("force") ? line + 1 : line - 1;
    if (lines[next].strip().startsWith("# " + partner + ":")) {
      lines[next] = lines[next].replaceFirst(OFF, "$1$2");
    }
    for (Alternatives some : Alternatives.ALL) {
      List<String> names = some.keys().stream().<String>map(ProblemKey::name).toList();
      for (int i = 0; i < lines.length; i++) {
        String other = lines[i].strip().replaceFirst(":.*", "");
        boolean excluded = some.exclusive() && names.contains(name) && names.contains(other);
        boolean near = Math.abs(i - line) <= NEAR;
        lines[i] = excluded && near && !name.equals(other) ? "" : lines[i];
      }
    }
    return String.join("\n", lines) + "\n";
  }

  /** The text with every line put to use but those that something else excludes. */
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
      instead |= name.equals("coil_step") && text.contains("legs: {");
      all.append(off && !instead ? line.replaceFirst(OFF, "$1$2") : line).append('\n');
    }
    return all.toString();
  }
}
