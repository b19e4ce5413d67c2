package coilwright.limit;

import coilwright.spring.CompressionState;
import coilwright.spring.LoadState;
import coilwright.spring.ShearStress;
import coilwright.spring.StressCorrection;

/** Which shear stress of a coil is held against an allowable. */
enum StressMeaning {
  /** With the factor for curvature and direct shear. */
  CORRECTED {
    @Override
    double factor(StressCorrection correction, double springIndex) {
      return correction.at(springIndex);
    }

    @Override
    String definition(StressCorrection correction) {
      return "corrected, " + correction.author();
    }
  },
  /** With the factor for direct shear alone. */
  DIRECT_SHEAR {
    @Override
    double factor(StressCorrection correction, double springIndex) {
      return ShearStress.directShearFactor(springIndex);
    }

    @Override
    String definition(StressCorrection correction) {
      return "times 1 + 0.5/C, set removed";
    }
  },
  /** As in a straight bar. */
  UNCORRECTED {
    @Override
    double factor(StressCorrection correction, double springIndex) {
      return 1;
    }

    @Override
    String definition(StressCorrection correction) {
      return "uncorrected";
    }
  };

  /** What the stress of a straight bar is multiplied by [-]. */
  abstract double factor(StressCorrection correction, double springIndex);

  /** In words. */
  abstract String definition(StressCorrection correction);

  /** The stress of a spring at a load [MPa]. */
  double of(CompressionState state, LoadState load) {
    return this == CORRECTED
        ? load.correctedShearStress()
        : load.shearStress() * factor(state.correction(), state.spring().springIndex());
  }
}
