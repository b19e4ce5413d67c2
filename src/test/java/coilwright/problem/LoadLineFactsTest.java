package coilwright.problem;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import coilwright.spring.LoadPoint;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Which facts fix the load line, and which load line that is. */
class LoadLineFactsTest {

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "[{length: 32 mm, force: 18 N}, {length: 22 mm, force: 45 N}]||two loads at lengths",
        "[{length: 22 mm, force: 45 N}, {length: 32 mm, force: 18 N}]||two loads at lengths",
        "[{length: 32 mm, force: 18 N}]|rate: 2.7 N/mm|a load and the rate",
        "[{length: 32 mm, force: 18 N}]|free_length: 38.666666666666667 mm|a load and the free length",
        "[{length: 32 mm, force: 18 N}, {length: 22 mm, force: 45 N}]|rate: 2.7 N/mm|two loads at lengths",
        "[{length: 32 mm, force: 18 N}, {length: 22 mm, force: 45 N}]|free_length: 38.7 mm|two loads at lengths",
        "[{length: 32 mm, force: 18 N}, {length: 22 mm, force: 45 N}]|rate: 2.6975 N/mm|two loads at lengths",
        "[{length: 32 mm, force: 18 N}, {length: 22 mm, force: 45 N}]|rate: 2.7025 N/mm|two loads at lengths",
        "[{length: 32 mm, force: 18 N}, {length: 27 mm, force: 31.52 N}, {length: 22 mm, force: 45 N}]||two loads at lengths",
        "[{length: 32 mm, force: 18 N}, {force: 45 N}]|stroke: 10 mm|a load and the stroke between the forces",
        "[{force: 18 N}, {length: 22 mm, force: 45 N}]|stroke: 10 mm|a load and the stroke between the forces",
        "[{force: 18 N}, {length: 22 mm, force: 45 N}, {force: 30 N}]|stroke: 10 mm|a load and the stroke between the forces",
        "[{length: 32 mm, force: 18 N}, {length: 22 mm}]|rate: 2.7 N/mm|a load and the rate",
        "[{length: 32 mm, force: 18 N}, {force: 45 N}]|rate: 2.7 N/mm|a load and the rate",
        "[{length: 32 mm, force: 18 N}, {length: 22 mm}]|free_length: 38.666666666666667 mm|a load and the free length",
        "[{length: 22 mm, force: 45 N}]|stroke: 16.666666666666667 mm|a load and the stroke from the free length to the force",
        "[{length: 22 mm}]|{rate: 2.7 N/mm, free_length: 38.666666666666667 mm}|the rate and the free length",
        "[{force: 45 N}]|{rate: 2.7 N/mm, free_length: 38.666666666666667 mm}|the rate and the free length",
        "[{force: 18 N}, {force: 45 N}]|{stroke: 10 mm, free_length: 38.666666666666667 mm}|the stroke between the forces and the free length",
        "[{length: 32 mm, force: 18 N}, {length: 22 mm, force: 45 N}]|stroke: 10.009 mm|two loads at lengths",
      })
  void fixesTheLine(String loads, String fact, String rule) {
    String text = "spring: compression\nloads: " + loads + "\n" + lines(fact);
    Requirement required = Files.problem(text).required().orElseThrow();
    assertThat(required.rule()).isEqualTo(rule);
    assertThat(required.rate()).isCloseTo(2.7, within(1e-12));
    assertThat(required.freeLength().orElseThrow()).isCloseTo(38 + 2.0 / 3, within(1e-12));
  }

  /** One fact, or several in braces, each on a line of its own. */
  private static String lines(String facts) {
    return facts == null ? "" : facts.replaceAll("[{}]", "").replace(", ", "\n") + "\n";
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "[{force: 18 N}, {force: 45 N}]|stroke: 10 mm|the stroke between the forces",
        "[{force: 45 N}, {force: 18 N}]|stroke: 10 mm|the stroke between the forces",
        "[{force: 18 N}, {force: 45 N}]|rate: 2.7 N/mm|the rate",
        "[{force: 18 N}, {force: 45 N}]|{rate: 2.7 N/mm, stroke: 10 mm}|the rate",
        "[{force: 45 N}]|stroke: 16.666666666666667 mm|the stroke from the free length to the force",
        "[{force: 45 N}]|rate: 2.7 N/mm|the rate",
      })
  void leavesTheLengthsOpen(String loads, String fact, String rule) {
    String text = "spring: compression\nloads: " + loads + "\n" + lines(fact);
    Requirement required = Files.problem(text).required().orElseThrow();
    assertThat(required.rule()).isEqualTo(rule);
    assertThat(required.rate()).isCloseTo(2.7, within(1e-12));
    assertThat(required.freeLength()).isEmpty();
    assertThat(required.line()).isEmpty();
    assertThat(required.greatestDeflection().orElseThrow()).isCloseTo(45 / 2.7, within(1e-12));
  }

  @Test
  void springsSideBySideShareTheForcesOfAStroke() {
    String text =
        "spring: compression\nloads: [{force: 18 N}, {force: 45 N}]\nstroke: 10 mm\n"
            + "springs_in_parallel: 2\n";
    Requirement required = Files.problem(text).required().orElseThrow();
    assertThat(required.rate()).isCloseTo(1.35, within(1e-12));
    assertThat(required.loads().get(1).force().orElseThrow()).isEqualTo(22.5);
    assertThat(required.loads().get(1).deflection().orElseThrow())
        .isCloseTo(45 / 2.7, within(1e-12));
  }

  @Test
  void whatALoadLeavesOutIsCompleted() {
    String text =
        "spring: compression\nloads: [{length: 32 mm, force: 18 N}, {force: 45 N}]\nstroke: 10 mm\n";
    Requirement required = Files.problem(text).required().orElseThrow();
    assertThat(required.loads().get(1).length()).isEmpty();
    assertThat(required.completed().get(1).length().orElseThrow()).isCloseTo(22, within(1e-12));
  }

  @Test
  void anOvertravelIsRead() {
    assertThat(Files.problem(Files.LOADS + "overtravel: {length: 0.8 in}\n").overtravel())
        .hasValue(0.8 * 25.4);
    assertThat(Files.problem(Files.LOADS).overtravel()).isEmpty();
  }

  @Test
  void justBeyondATenthOfAPercentDisagrees() {
    assertThat(Files.shortlist(Files.LOADS + "rate: 2.6972 N/mm\n").faults()).hasSize(1);
    assertThat(Files.shortlist(Files.LOADS + "rate: 2.7028 N/mm\n").faults()).hasSize(1);
  }

  @Test
  void unitsMayMix() {
    String text =
        """
        spring: compression
        loads: [{length: 1 in, force: 4 lbf}]
        rate: 10 lbf/in
        """;
    Requirement required = Files.problem(text).required().orElseThrow();
    assertThat(required.rate()).isCloseTo(1.7512683524647637, within(1e-15));
    assertThat(required.freeLength().orElseThrow()).isCloseTo(1.4 * 25.4, within(1e-12));
  }

  @Test
  void aCheckNeedsNoLine() {
    Problem problem = check("[{length: 22 mm}]", "");
    assertThat(problem.required()).isEmpty();
    assertThat(problem.facts().loads())
        .containsExactly(
            new LoadAsked(OptionalDouble.of(22), OptionalDouble.empty(), Optional.empty()));
    assertThat(check("[{force: 20 N, tolerance: 5 %}]", "").facts().loads())
        .containsExactly(
            new LoadAsked(
                OptionalDouble.empty(), OptionalDouble.of(20), Optional.of(new Tolerance(1, 1))));
    assertThat(check("[{length: 22 mm, force: 45 N}]", "").required()).isEmpty();
    assertThat(check("[{length: 22 mm}, {force: 20 N}]", "free_length: 38 mm").required())
        .isEmpty();
  }

  @Test
  void aCheckThatFixesTheLineKeepsTheLoadsAsAsked() {
    Problem problem =
        check(
            "[{length: 22 mm}, {force: 20 N}]",
            "rate: 2 N/mm\nfree_length: 38 mm\nsprings_in_parallel: 2");
    Requirement required = problem.required().orElseThrow();
    assertThat(required.rule()).isEqualTo("the rate and the free length");
    assertThat(required.rate()).isEqualTo(1);
    assertThat(required.loads())
        .containsExactly(
            new LoadPoint(OptionalDouble.of(22), OptionalDouble.empty()),
            new LoadPoint(OptionalDouble.empty(), OptionalDouble.of(10)));
  }

  private static Problem check(String loads, String facts) {
    String design = Files.DESIGN.substring(Files.DESIGN.indexOf("design"));
    return Files.checked("spring: compression\nloads: " + loads + "\n" + facts + "\n" + design);
  }
}
