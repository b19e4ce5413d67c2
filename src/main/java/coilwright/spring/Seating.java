package coilwright.spring;

import java.util.Optional;

/** How the two ends of a compression spring are held against tilting and sideways motion. */
public enum Seating {
  /** Both ends on parallel plates that guide each other. */
  FIXED_FIXED("fixed-fixed", 0.5),
  /**
   * One end on a plate, the other on a pivot. The rounded 0.7 of EN 13906-1: for a spring so short
   * that it hardly can buckle, a free length under five mean diameters, it puts the critical
   * deflection too high, by 6 % at four.
   */
  FIXED_PINNED("fixed-pinned", 0.7),
  /** Both ends on pivots. */
  PINNED_PINNED("pinned-pinned", 1),
  /** One end on a plate, the other free to move sideways. */
  FIXED_FREE("fixed-free", 2);

  private final String id;
  private final double factor;

  Seating(String id, double factor) {
    this.id = id;
    this.factor = factor;
  }

  /** The id used in problem files and output. */
  public String id() {
    return id;
  }

  /** The seating factor nu (EN 13906-1) or alpha (US handbooks) [-]. */
  public double factor() {
    return factor;
  }

  /**
   * The usual seating of an end type: ground closed ends stand on parallel plates, any other end
   * can tilt.
   *
   * @param ends the end type
   * @return fixed-fixed for squared and ground ends, else pinned-pinned
   */
  public static Seating usualFor(EndType ends) {
    return ends == EndType.SQUARED_GROUND ? FIXED_FIXED : PINNED_PINNED;
  }

  /**
   * The seating with an id.
   *
   * @param id as in problem files
   * @return the seating, or empty
   */
  public static Optional<Seating> of(String id) {
    for (Seating seating : values()) {
      if (seating.id.equals(id)) {
        return Optional.of(seating);
      }
    }
    return Optional.empty();
  }
}
