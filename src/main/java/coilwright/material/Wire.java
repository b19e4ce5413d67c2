package coilwright.material;

import coilwright.source.Evidence;
import coilwright.unit.Require;

/**
 * A grade drawn to a size, with the properties it has there.
 *
 * @param grade the grade
 * @param size the size
 * @param tensileStrength minimum tensile strength Rm [MPa]
 * @param shearModulus G [MPa]
 * @param elasticModulus E [MPa]
 * @param evidence the weakest evidence among strength, moduli and size
 */
public record Wire(
    WireGrade grade,
    WireSize size,
    double tensileStrength,
    double shearModulus,
    double elasticModulus,
    Evidence evidence) {

  /** Refuses properties that are not positive and finite. */
  public Wire {
    Require.positive(tensileStrength, "tensile strength", "MPa");
    Require.positive(shearModulus, "shear modulus", "MPa");
    Require.positive(elasticModulus, "elastic modulus", "MPa");
  }

  /** Wire diameter d [mm]. */
  public double diameter() {
    return size.diameter();
  }

  /** Density [kg/m^3]. */
  public double density() {
    return grade.density();
  }
}
