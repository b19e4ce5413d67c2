package coilwright.problem;

import coilwright.spring.Kind;
import java.util.ArrayList;
import java.util.List;

/** The keys that say what the file is about. */
final class HeadKeys {

  static final ProblemKey<String> TITLE =
      ProblemKey.of(
          "title", new TextReader("text"), "no title", "free text", "Feed-water check valve");

  static final ProblemKey<Kind> SPRING =
      ProblemKey.of(
          "spring",
          new WordReader<>(List.of(Kind.values()), Kind::id),
          "",
          "the kind of spring",
          Kind.COMPRESSION.id());

  static final ProblemKey<UnitSystem> UNITS =
      ProblemKey.of(
          "units",
          new WordReader<>(List.of(UnitSystem.values()), UnitSystem::id),
          "metric",
          "how text is shown, and the defaults of supply and rounding; inputs may mix",
          "metric");

  /** All of them. */
  static final List<ProblemKey<?>> ROWS = rows();

  private HeadKeys() {}

  private static List<ProblemKey<?>> rows() {
    List<ProblemKey<?>> rows = new ArrayList<>();
    rows.add(TITLE.only(Kind.COMPRESSION));
    rows.add(TITLE.only(Kind.EXTENSION).shown("Shade-cloth tensioner"));
    rows.add(TITLE.only(Kind.TORSION).shown("Gate-latch return"));
    for (Kind kind : Kind.values()) {
      rows.add(SPRING.only(kind).shown(kind.id()));
    }
    rows.add(UNITS);
    return List.copyOf(rows);
  }
}
