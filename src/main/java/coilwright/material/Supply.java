package coilwright.material;

/** Whose steel grades and size series are offered. */
public enum Supply {
  /** European steels and the metric series. */
  EN("en"),
  /** American steels and the gauges. */
  US("us"),
  /** Either. */
  ANY("any");

  private final String word;

  Supply(String word) {
    this.word = word;
  }

  /**
   * Whether wire of this supply is offered where another is asked for.
   *
   * @param asked what is asked for
   * @return true if either is {@link #ANY} or both are the same
   */
  public boolean serves(Supply asked) {
    return asked == ANY || this == ANY || this == asked;
  }

  /** The word used in problem files and data. */
  public String word() {
    return word;
  }
}
