package coilwright.unit;

import java.util.Collection;
import java.util.Locale;
import java.util.Optional;

/** Finds the known word that a misspelt one was meant to be. */
public final class Spelling {

  /** Words longer than this are no misspelling of anything known [signs]. */
  private static final int LONGEST = 40;

  private Spelling() {}

  /**
   * The nearest of the known words: the one with the fewest signs to add, drop, change or swap with
   * a neighbour, letter case aside. A third of the word's signs may differ, at least one. Where
   * none is so near, one that begins like the word or that the word begins with, or one that holds
   * the word, is.
   *
   * @param word as found
   * @param known the words accepted, the first winning a tie
   * @return the nearest, or empty where none is near
   */
  public static Optional<String> nearest(String word, Collection<String> known) {
    if (word.isEmpty() || word.length() > LONGEST) {
      return Optional.empty();
    }
    String nearest = null;
    int least = Math.max(1, word.length() / 3) + 1;
    for (String candidate : known) {
      int distance = distance(word.toLowerCase(Locale.ROOT), candidate.toLowerCase(Locale.ROOT));
      if (distance < least && distance < candidate.length()) {
        least = distance;
        nearest = candidate;
      }
    }
    return nearest != null ? Optional.of(nearest) : akin(word, known);
  }

  private static Optional<String> akin(String word, Collection<String> known) {
    String low = word.toLowerCase(Locale.ROOT);
    return known.stream()
        .filter(candidate -> Math.min(candidate.length(), low.length()) >= 2)
        .filter(
            candidate ->
                low.startsWith(candidate)
                    || candidate.startsWith(low)
                    || low.length() >= 4 && candidate.contains(low))
        .findFirst();
  }

  /**
   * Signs to add, drop, change or swap with a neighbour to turn one word into another (the distance
   * of Damerau and Levenshtein, no sign edited twice).
   *
   * @param a one word
   * @param b the other
   * @return the number of edits
   */
  static int distance(String a, String b) {
    int[][] edits = new int[a.length() + 1][b.length() + 1];
    for (int i = 0; i <= a.length(); i++) {
      for (int j = 0; j <= b.length(); j++) {
        edits[i][j] = i == 0 || j == 0 ? i + j : least(edits, a, b, i, j);
      }
    }
    return edits[a.length()][b.length()];
  }

  private static int least(int[][] edits, String a, String b, int i, int j) {
    boolean same = a.charAt(i - 1) == b.charAt(j - 1);
    int least = edits[i - 1][j - 1] + (same ? 0 : 1);
    least = Math.min(least, Math.min(edits[i - 1][j], edits[i][j - 1]) + 1);
    boolean swapped =
        i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1);
    return swapped ? Math.min(least, edits[i - 2][j - 2] + 1) : least;
  }
}
