package coilwright.problem;

import java.util.List;

/** The keys that say what the file is about. */
final class HeadKeys {

  static final ProblemKey<String> TITLE =
      ProblemKey.of(
          "title", new TextReader("text"), "no title", "free text", "Feed-water check valve");

  static final ProblemKey<String> SPRING =
      ProblemKey.of(
          "spring",
          new WordReader<>(List.of("compression"), word -> word, "extension", "torsion"),
          "",
          "the kind of spring",
          "compression");

  static final ProblemKey<UnitSystem> UNITS =
      ProblemKey.of(
          "units",
          new WordReader<>(List.of(UnitSystem.values()), UnitSystem::id),
          "metric",
          "how text is shown, and the defaults of supply and rounding; inputs may mix",
          "metric");

  /** All of them. */
  static final List<ProblemKey<?>> ROWS = List.of(TITLE, SPRING, UNITS);

  private HeadKeys() {}
}
