package coilwright.problem;

import coilwright.spring.StressCorrection;
import java.util.OptionalDouble;

/**
 * The limits a spring must hold, defaults filled in.
 *
 * @param springIndex C [-]
 * @param activeCoils n [-]
 * @param maxPitchAngle [rad], or empty
 * @param clashAllowance travel left before solid as a share of the greatest deflection [-], or
 *     empty
 * @param stressCorrection which factor corrects the stress
 * @param stressAtLoad the bound at the most compressed load
 * @param stressAtSolid the bound at solid
 * @param buckling where stability is judged
 * @param minSurgeFrequency [Hz], or empty
 */
public record DesignLimits(
    Band springIndex,
    Band activeCoils,
    OptionalDouble maxPitchAngle,
    OptionalDouble clashAllowance,
    StressCorrection stressCorrection,
    StressLimit stressAtLoad,
    StressLimit stressAtSolid,
    BucklingRule buckling,
    OptionalDouble minSurgeFrequency) {}
