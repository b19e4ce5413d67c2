package coilwright.spring;

import java.util.OptionalDouble;

/**
 * A torsion spring at one load.
 *
 * @param angle in the winding direction from the loads' reference [rad]; empty where they have none
 * @param torque M [N mm]
 * @param deflection theta from free, in the direction of loading [rad]
 * @param bendingStress sigma, uncorrected [MPa]
 * @param correctedBendingStress sigma times the correction factor [MPa]
 * @param insideDiameter Di of the bare wire [mm]
 * @param outsideDiameter De of the bare wire [mm]
 * @param bodyLength length of the body, coating included [mm]
 */
public record TorqueState(
    OptionalDouble angle,
    double torque,
    double deflection,
    double bendingStress,
    double correctedBendingStress,
    double insideDiameter,
    double outsideDiameter,
    double bodyLength) {}
