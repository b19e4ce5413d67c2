package coilwright.problem;

import coilwright.material.DiameterRange;
import coilwright.material.ModulusLaw;
import coilwright.material.StrengthLaw;
import coilwright.unit.Dimension;
import java.util.Optional;

/**
 * Checks what the laws of an own grade give at its thinnest and its thickest wire.
 *
 * @param section the grade's block of keys
 * @param diameters the wire diameters for which its data hold
 */
record OwnLaws(Section section, DiameterRange diameters) {

  /**
   * A power law may leave every plausible strength where its own coefficients do not show it.
   *
   * @param strength the law that the file gives; empty where it is taken from another grade
   */
  void checkStrength(Optional<LawGiven<StrengthLaw>> strength) {
    if (strength.isEmpty()) {
      return;
    }
    for (double d : new double[] {diameters.min(), diameters.max()}) {
      if (d > 0 && d < Double.POSITIVE_INFINITY) {
        double value = strength.get().law().at(d);
        Values.STRENGTH
            .refuses(value, Optional.of(Dimension.STRESS.units().get(0)))
            .ifPresent(remedy -> strengthFault(value, d, remedy));
      }
    }
  }

  private void strengthFault(double value, double diameter, String remedy) {
    section
        .spot(MaterialKeys.TENSILE_STRENGTH)
        .fault(
            Range.number(value) + " MPa at " + Range.number(diameter) + " mm, " + Values.NOT_WIRE,
            remedy);
  }

  /**
   * Stretching a bar takes more than twisting it: E must be above G wherever both are known.
   *
   * @param shear G; empty where it is not known
   * @param elastic E; empty where it is not known
   */
  void checkStiffness(Optional<ModulusLaw> shear, Optional<ModulusLaw> elastic) {
    if (shear.isEmpty() || elastic.isEmpty()) {
      return;
    }
    double largest = Math.min(diameters.max(), Double.MAX_VALUE);
    for (double d : new double[] {Math.max(diameters.min(), Double.MIN_NORMAL), largest}) {
      double g = shear.get().at(d);
      if (!(elastic.get().at(d) > g)) {
        section
            .spot(MaterialKeys.ELASTIC.whole())
            .fault(
                Range.number(elastic.get().at(d)) + " MPa",
                "must be above the shear modulus, " + Range.number(g) + " MPa");
        return;
      }
    }
  }
}
