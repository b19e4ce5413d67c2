package coilwright.spring;

/**
 * An extension spring at one length. The stresses are NaN where they are not assessed: where the
 * load is beside the axis.
 *
 * @param length L inside the hooks [mm]
 * @param force F [N]
 * @param deflection L - L0 [mm]
 * @param shearStress tau of the body, uncorrected, initial tension included [MPa]
 * @param correctedShearStress tau times the correction factor [MPa]
 * @param hookBendingStress greatest tensile stress of the loop [MPa]
 * @param hookTorsionStress greatest shear stress of the side bend [MPa]
 */
public record ExtensionLoad(
    double length,
    double force,
    double deflection,
    double shearStress,
    double correctedShearStress,
    double hookBendingStress,
    double hookTorsionStress) {}
