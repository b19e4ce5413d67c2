package coilwright.spring;

/** The direction a spring is wound in. */
public enum Hand {
  /** Wound like a left-hand thread. */
  LEFT("left"),
  /** Wound like a right-hand thread. */
  RIGHT("right"),
  /** As the supplier likes. */
  EITHER("either");

  private final String id;

  Hand(String id) {
    this.id = id;
  }

  /** The id used in problem files and output. */
  public String id() {
    return id;
  }
}
