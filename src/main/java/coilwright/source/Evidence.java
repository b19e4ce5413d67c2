package coilwright.source;

/** How a value reached this project. */
public enum Evidence {
  /** The value was seen on a page of the publication or of one that reproduces it. */
  SEEN("seen"),
  /** The value was written down from memory and is not yet confirmed against the publication. */
  MEMORY("memory");

  private final String word;

  Evidence(String word) {
    this.word = word;
  }

  /** The word used in data files and output: "seen" or "memory". */
  public String word() {
    return word;
  }

  /**
   * The weaker of two: what rests on several values is only as good as the worst of them.
   *
   * @param other the other evidence
   * @return {@link #MEMORY} if either is
   */
  public Evidence and(Evidence other) {
    return this == MEMORY ? MEMORY : other;
  }

  /**
   * Reads {@link #word()} back.
   *
   * @param word "seen" or "memory"
   * @return the evidence
   * @throws IllegalArgumentException for any other word
   */
  public static Evidence of(String word) {
    for (Evidence evidence : values()) {
      if (evidence.word.equals(word)) {
        return evidence;
      }
    }
    throw new IllegalArgumentException("\"" + word + "\"; accepted: seen, memory");
  }
}
