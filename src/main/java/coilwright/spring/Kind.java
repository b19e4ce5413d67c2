package coilwright.spring;

/** The kinds of helical springs made of round wire. */
public enum Kind {
  /** Pushed together along its axis. */
  COMPRESSION("compression"),
  /** Pulled apart along its axis by hooks. */
  EXTENSION("extension"),
  /** Wound up or unwound about its axis by legs. */
  TORSION("torsion");

  private final String id;

  Kind(String id) {
    this.id = id;
  }

  /** The id used in problem files and output. */
  public String id() {
    return id;
  }
}
