package coilwright.spring;

import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.unit.Require;
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
   * Length with all coils touching: nt d where the ends are ground, (nt + 1) d where they are not.
   *
   * @param activeCoils n [-]
   * @param wireDiameter d [mm]
   * @return Ls [mm]
   * @throws IllegalArgumentException if the coils are negative, the diameter is not positive, or
   *     either is not finite
   */
  public double solidLength(double activeCoils, double wireDiameter) {
    Require.notNegative(activeCoils, "active coils", "-");
    Require.positive(wireDiameter, "wire diameter", "mm");
    return (activeCoils + deadCoils + (ground ? 0 : 1)) * wireDiameter;
  }

  /**
   * Pitch of the free spring: what the solid ends leave of the free length, shared by the coils
   * between them.
   *
   * <p>Plain (L0 - d)/n, plain and ground L0/(n + 1), squared (L0 - 3d)/n, squared and ground (L0 -
   * 2d)/n.
   *
   * @param freeLength L0 [mm]
   * @param wireDiameter d [mm]
   * @param activeCoils n [-]
   * @return p [mm]
   * @throws IllegalArgumentException if an argument is not positive and finite
   */
  public double pitch(double freeLength, double wireDiameter, double activeCoils) {
    Require.positive(freeLength, "free length", "mm");
    Require.positive(wireDiameter, "wire diameter", "mm");
    Require.positive(activeCoils, "active coils", "-");
    if (this == PLAIN_GROUND) {
      return freeLength / (activeCoils + 1);
    }
    return (freeLength - (deadCoils + (ground ? 0 : 1)) * wireDiameter) / activeCoils;
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
