package coilwright.limit;

import coilwright.problem.LimitName;
import coilwright.spring.Family;
import coilwright.spring.State;

/**
 * One bound of a design limit, written once: checks, candidates, what ruled a wire out and the coil
 * counts a limit leaves all come from {@link #judge}.
 *
 * @param <S> the state of the kind of spring it judges
 */
public interface Limit<S extends State> {

  /** What the bound asks, apart from any spring: every finding's check. */
  Check check();

  /** The limit's name. Two bounds of one limit share it. */
  default LimitName name() {
    return check().limit();
  }

  /**
   * Whether a designer may drop this bound. A limit that may be dropped can have a bound that may
   * not: the free length asked is a wish, but no extension spring is longer than under load.
   */
  default boolean removable() {
    return name().removable();
  }

  /**
   * Judges a spring.
   *
   * @param state the spring at its loads
   * @return value, bound and whether it holds
   */
  Finding judge(S state);

  /**
   * Coil counts at which the margin may turn or jump along a family. Between two neighbours the
   * margin must be monotone.
   *
   * @param family the family
   * @return coil counts [-], in any order, inside the family's range or not
   */
  default double[] turns(Family<S> family) {
    return new double[0];
  }

  /**
   * Where between two coil counts the bound is expected from a closed form, to look there first. It
   * never decides on which side the limit holds.
   *
   * @param family the family
   * @param from a coil count on one side of the bound [-]
   * @param to a greater one on the other side [-]
   * @return the coil count [-]; NaN where no closed form is at hand
   */
  default double expected(Family<S> family, double from, double to) {
    return Double.NaN;
  }

  /**
   * Whether the margin goes with the coil count in a straight line, as lengths of coils that touch
   * do. Else it is taken to go with a power of it, as diameters and stresses do. It tells where to
   * look for a bound first, never on which side the limit holds.
   */
  default boolean straight() {
    return false;
  }

  /**
   * How many times more than a force or a stress rounding may move the margin: more than once where
   * what is judged is the small difference of large numbers.
   *
   * @param state a spring at the place in question
   * @return the ratio [-]; where the bound is zero, in the margin's own unit
   */
  default double sensitivity(S state) {
    return 1;
  }

  /**
   * Whether the limit looks only at what rounding does to a spring: every unrounded spring of a
   * family holds it.
   */
  default boolean onlyAfterRounding() {
    return false;
  }

  /**
   * The springs that would be made if this limit were not asked: other ones only where the limit
   * shapes them.
   *
   * @param family the family searched
   * @return the family that takes its place, or the same one
   */
  default Family<S> dropped(Family<S> family) {
    return family;
  }
}
