package coilwright.spring;

import coilwright.source.Citation;
import coilwright.source.Source;
import java.util.Optional;

/** How the end coils of a compression spring are formed. */
public enum EndType {
  /** Cut off, open, not ground. */
  PLAIN("plain", 0, false, false),
  /** Open and ground flat. */
  PLAIN_GROUND("plain-ground", 1, false, true),
  /** Closed, not ground. */
  SQUARED("squared", 2, true, false),
  /** Closed and ground flat. */
  SQUARED_GROUND("squared-ground", 2, true, true);

  /** Dead coils, solid length and pitch of the four end types. */
  public static final Citation CITATION =
      Citation.seen(Source.MACHINERYS_HANDBOOK, "compression spring formulas, table 3");

  private final String id;
  private final int deadCoils;
  private final boolean closed;
  private final boolean ground;

  EndType(String id, int deadCoils, boolean closed, boolean ground) {
    this.id = id;
    this.deadCoils = deadCoils;
    this.closed = closed;
    this.ground = ground;
  }

  /** The id used in problem files and output. */
  public String id() {
    return id;
  }

  /** Coils at both ends together that do not deflect [-]. */
  public int deadCoils() {
    return deadCoils;
  }

  /** Whether the end coils touch their neighbours. */
  public boolean closed() {
    return closed;
  }

  /** Whether the ends are ground flat. */
  public boolean ground() {
    return ground;
  }

  /**
   * The end type with an id.
   *
   * @param id as in problem files
   * @return the end type, or empty
   */
  public static Optional<EndType> of(String id) {
    for (EndType ends : values()) {
      if (ends.id.equals(id)) {
        return Optional.of(ends);
      }
    }
    return Optional.empty();
  }
}
