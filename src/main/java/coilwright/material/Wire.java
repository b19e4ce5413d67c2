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
 * @param evidence the weakest evidence among strength, moduli and size; that of the tolerance is
 *     {@link #diameterToleranceEvidence()}, so that a tolerance alone makes no wire one from memory
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

  /** What the wire may differ from its nominal diameter by, either way [mm]; positive. */
  public double diameterTolerance() {
    return grade.diameterTolerance().at(diameter());
  }

  /** Whether {@link #diameterTolerance()} was seen for the grade or is taken for it. */
  public Evidence diameterToleranceEvidence() {
    return grade.diameterTolerance().evidenceAt(diameter());
  }

  /** Density [kg/m^3]. */
  public double density() {
    return grade.density();
  }
}
