package coilwright.spring;

import coilwright.material.Wire;
import java.util.Optional;

/**
 * All springs of one wire and one end form that meet the loads exactly: one spring for each coil
 * count.
 *
 * @param <S> the state of this kind of spring
 */
public interface Family<S extends State> {

  /** The wire they are made of. */
  Wire wire();

  /** How their ends are formed, as it stands in ids and output. */
  String endForm();

  /** The smallest coil count considered [-], above zero. */
  double fewestCoils();

  /** The largest coil count at which the coil is still wider than its wire [-]. */
  double mostCoils();

  /**
   * The spring with a coil count, unrounded.
   *
   * @param coils n [-], from {@link #fewestCoils()} to {@link #mostCoils()}
   * @return its state
   */
  S at(double coils);

  /**
   * The spring with a coil count as a shop would set it: dimensions rounded to their steps.
   *
   * @param coils n [-]
   * @return its state; empty where rounding leaves no spring, such as a coil not wider than its
   *     wire
   */
  Optional<S> rounded(double coils);

  /**
   * The share by which rounding may move a force or a stress.
   *
   * @param coils n [-]
   * @return a generous estimate [-], zero where nothing is rounded
   */
  double roundingShare(double coils);

  /**
   * How far rounding may move a bound: the coil count by which an unrounded spring may differ from
   * a rounded one and still be judged alike.
   *
   * @param coils n at the bound [-]
   * @return a generous estimate [-], zero where nothing is rounded
   */
  double play(double coils);

  /**
   * The springs that would be made if nothing had to be kept between the greatest load and solid:
   * other ones only where the lengths are left open and follow from that.
   *
   * @return that family; this one where it is no other
   */
  default Family<S> keepingNothing() {
    return this;
  }
}
