package coilwright.problem;

/** How the planes of an extension spring's two hooks lie to each other, seen along the axis. */
public enum LoopPlanes {
  /** In one plane: the body has whole or half coils. */
  IN_LINE("in-line"),
  /** At a right angle: the body has a quarter or three quarters over. */
  RIGHT_ANGLE("right-angle"),
  /** As it comes. */
  ANY("any");

  private final String id;

  LoopPlanes(String id) {
    this.id = id;
  }

  /** The id used in problem files and output. */
  public String id() {
    return id;
  }
}
