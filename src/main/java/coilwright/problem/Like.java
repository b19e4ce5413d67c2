package coilwright.problem;

import coilwright.material.WireGrade;
import java.util.Optional;

/** How the condition of a grade that a file defines names the grade it is like. */
public final class Like {

  private static final String WORD = "like ";

  private Like() {}

  /** The condition of a grade like another. */
  static String words(WireGrade other) {
    return WORD + other.id();
  }

  /**
   * The grade that one is like.
   *
   * @param own a grade that a file defines
   * @return the other's id, or empty where the file names none
   */
  public static Optional<String> of(WireGrade own) {
    return own.condition().startsWith(WORD)
        ? Optional.of(own.condition().substring(WORD.length()))
        : Optional.empty();
  }
}
