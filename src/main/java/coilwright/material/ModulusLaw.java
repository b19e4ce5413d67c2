package coilwright.material;

import coilwright.source.Evidence;

/** A modulus of a grade as a function of wire diameter. */
public interface ModulusLaw {

  /**
   * The modulus.
   *
   * @param diameter wire diameter d [mm]
   * @return the modulus [MPa]
   */
  double at(double diameter);

  /**
   * Whether the value at a diameter was seen or is remembered.
   *
   * @param diameter wire diameter d [mm]
   * @return the evidence of the row that decides the value there
   */
  Evidence evidenceAt(double diameter);
}
