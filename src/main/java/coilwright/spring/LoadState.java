package coilwright.spring;

/**
 * A compression spring at one length.
 *
 * @param length L [mm]
 * @param force F [N]
 * @param deflection s [mm]
 * @param shearStress tau, uncorrected [MPa]
 * @param correctedShearStress tau times the correction factor [MPa]
 */
public record LoadState(
    double length,
    double force,
    double deflection,
    double shearStress,
    double correctedShearStress) {}
