package coilwright.material;

import coilwright.source.Evidence;

/** Minimum tensile strength of a grade as a function of wire diameter. */
public interface StrengthLaw {

  /**
   * The minimum tensile strength.
   *
   * @param diameter wire diameter d [mm], within the grade's {@link DiameterRange}
   * @return Rm [MPa]
   */
  double at(double diameter);

  /**
   * Whether the value at a diameter was seen or is remembered.
   *
   * @param diameter wire diameter d [mm]
   * @return the weakest evidence among the rows that decide the value there
   */
  Evidence evidenceAt(double diameter);
}
