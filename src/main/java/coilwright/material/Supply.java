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

  /** The word used in problem files and data. */
  public String word() {
    return word;
  }
}
