package coilwright.material;

/** Moduli of a grade that the user describes; their evidence is the certificate, seen. */
public final class ModulusLaws {

  private ModulusLaws() {}

  /**
   * The same modulus at every diameter.
   *
   * @param mpa G or E [MPa]
   * @return the law
   * @throws IllegalArgumentException if the modulus is not positive and finite
   */
  public static ModulusLaw constant(double mpa) {
    return OwnSteps.constant(mpa);
  }

  /**
   * Steps, each up to and including its diameter; above the last there is no modulus, and the law
   * refuses the diameter.
   *
   * @param upTo the diameters, rising [mm]
   * @param modulus G or E of each step [MPa], as many
   * @return the law
   * @throws IllegalArgumentException if the arrays differ in length, are empty, do not rise or hold
   *     what is not positive
   */
  public static ModulusLaw steps(double[] upTo, double[] modulus) {
    return OwnSteps.of(upTo, modulus);
  }
}
