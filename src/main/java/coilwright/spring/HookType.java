package coilwright.spring;

import coilwright.source.Citation;
import coilwright.source.Source;
import java.util.Optional;

/** How the ends of an extension spring are formed. */
public enum HookType {
  /** A whole coil bent up, its load on the axis; loops of three quarters of it are usual too. */
  FULL_LOOP(
      "full-loop",
      1,
      Citation.remembered(Source.SHIGLEY, "free length inside full loops"),
      0.75,
      Citation.seen(Source.MACHINERYS_HANDBOOK, "extension springs, 75 to 85 % of inside diameter"),
      1,
      0.5,
      true),
  /** Half a coil bent up, its load on the axis; naturally the middle of what is usual. */
  HALF_LOOP("half-loop", 0.675, Usual.HOOKS, 0.55, Usual.HOOKS, 0.5, 0.25, true),
  /** A whole coil bent up at the side of the body, its load beside the axis. */
  SIDE_LOOP("side-loop", 1, Usual.HOOKS, 1, Usual.HOOKS, 1, 0.5, false),
  /** A loop on a straight piece, its load on the axis. */
  EXTENDED_HOOK("extended-hook", 1.1, Usual.HOOKS, 1.1, Usual.HOOKS, 1, 0.5, true);

  /**
   * The energy of a loop in bending: a half circle under a force on the axis deflects as G/(2E) of
   * a coil does, a quarter circle as half of that.
   */
  public static final Citation ACTIVE_SHARE =
      Citation.seen(Source.FIRST_PRINCIPLES, "energy of a bent loop against that of a coil");

  /** Where lengths of hooks are published. */
  private static final class Usual {
    static final Citation HOOKS =
        Citation.remembered(Source.EN_13906_2, "usual distances of hooks from the body");
  }

  private final String id;
  private final double natural;
  private final Citation naturalCitation;
  private final double least;
  private final Citation leastCitation;
  private final double turns;
  private final double activeTimesModuli;
  private final boolean onAxis;

  HookType(
      String id,
      double natural,
      Citation naturalCitation,
      double least,
      Citation leastCitation,
      double turns,
      double activeTimesModuli,
      boolean onAxis) {
    this.id = id;
    this.natural = natural;
    this.naturalCitation = naturalCitation;
    this.least = least;
    this.leastCitation = leastCitation;
    this.turns = turns;
    this.activeTimesModuli = activeTimesModuli;
    this.onAxis = onAxis;
  }

  /** The id used in problem files and output. */
  public String id() {
    return id;
  }

  /** How far it reaches beyond the body to its inside, as it comes, of the inside diameter [-]. */
  public double naturalShare() {
    return natural;
  }

  /** Where that is published. */
  public Citation naturalCitation() {
    return naturalCitation;
  }

  /** The shortest that can be bent, of the inside diameter [-]. */
  public double leastShare() {
    return least;
  }

  /** Where that is published. */
  public Citation leastCitation() {
    return leastCitation;
  }

  /** Turns of wire in the bent part [-]. */
  public double turns() {
    return turns;
  }

  /**
   * The active coils that it adds where nothing else is said: 0.5 G/E for a loop, 0.25 G/E for half
   * a loop. Sources give 0.1 to 0.5. A straight piece adds nothing.
   *
   * @param shearModulus G [MPa]
   * @param elasticModulus E [MPa]
   * @return active coils of one hook [-]
   */
  public double activeCoils(double shearModulus, double elasticModulus) {
    return activeTimesModuli * shearModulus / elasticModulus;
  }

  /** Whether the load acts along the axis, as the formulas of stress and rate take it to do. */
  public boolean onAxis() {
    return onAxis;
  }

  /**
   * The hook with an id.
   *
   * @param id as in problem files
   * @return the hook, or empty
   */
  public static Optional<HookType> of(String id) {
    for (HookType type : values()) {
      if (type.id.equals(id)) {
        return Optional.of(type);
      }
    }
    return Optional.empty();
  }
}
