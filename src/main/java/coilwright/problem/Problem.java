package coilwright.problem;

import coilwright.material.WireGrade;
import coilwright.spring.Kind;
import coilwright.spring.Seating;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A problem file, read and found valid, defaults filled in.
 *
 * @param title free text; empty where the file gives none
 * @param kind the kind of spring
 * @param units how text is shown
 * @param facts what the file says about the line of force against length; for a torsion spring, how
 *     many share the loads and nothing else
 * @param required the load line and loads of one compression spring; empty for the other kinds, and
 *     in a file for checking that does not fix the line
 * @param overtravel a length it must survive beyond its loads [mm], or empty
 * @param envelope the space
 * @param seats how the ends are held; empty where the usual seating of each end type applies
 * @param make what may be made; the defaults where the file has a {@code design} block
 * @param design the spring to check; empty in a file for a shortlist
 * @param limits the limits that every kind has, and those of compression springs
 * @param extension what only extension springs have; empty for the other kinds
 * @param torsion what only torsion springs have; empty for the other kinds
 * @param ownMaterials grades the file defines
 * @param rankBy the order
 * @param top how many lines of the ranked list are shown
 */
public record Problem(
    String title,
    Kind kind,
    UnitSystem units,
    LoadFacts facts,
    Optional<Requirement> required,
    OptionalDouble overtravel,
    Envelope envelope,
    Optional<Seating> seats,
    Make make,
    Optional<Design> design,
    DesignLimits limits,
    Optional<ExtensionAsked> extension,
    Optional<TorsionAsked> torsion,
    List<WireGrade> ownMaterials,
    RankBy rankBy,
    int top) {

  /** Copies the list. */
  public Problem {
    ownMaterials = List.copyOf(ownMaterials);
  }

  /** Whether the spring to check, or any to be made, is pressed solid once before use. */
  public boolean setRemoved() {
    return design.map(Design::setRemoved).orElse(make.setRemoved());
  }

  /** Thickness of what covers the wire of the spring to check, or of any to be made [mm]. */
  public double coating() {
    return design.map(Design::coating).orElse(make.coating());
  }

  /**
   * The same problem with another order.
   *
   * @param by the order
   * @param most how many lines of the ranked list are shown
   * @return the problem
   */
  public Problem ranked(RankBy by, int most) {
    return new Problem(
        title,
        kind,
        units,
        facts,
        required,
        overtravel,
        envelope,
        seats,
        make,
        design,
        limits,
        extension,
        torsion,
        ownMaterials,
        by,
        most);
  }
}
