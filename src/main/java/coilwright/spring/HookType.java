package coilwright.spring;

/** How the ends of an extension spring are formed. */
public enum HookType {
  /** A whole coil bent up, its load on the axis. */
  FULL_LOOP("full-loop"),
  /** Half a coil bent up, its load on the axis. */
  HALF_LOOP("half-loop"),
  /** A whole coil bent up at the side of the body, its load beside the axis. */
  SIDE_LOOP("side-loop"),
  /** A loop on a straight piece, its load on the axis. */
  EXTENDED_HOOK("extended-hook");

  private final String id;

  HookType(String id) {
    this.id = id;
  }

  /** The id used in problem files and output. */
  public String id() {
    return id;
  }
}
