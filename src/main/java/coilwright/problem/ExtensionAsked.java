package coilwright.problem;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What a problem asks that only extension springs have.
 *
 * @param line the loads; empty only in a file for checking that does not fix the line
 * @param freeLength L0 inside the hooks, where the file gives it [mm]
 * @param hooks the hooks
 * @param preferredTension whether the initial tension must lie in the published preferred range;
 *     else it must not be negative
 * @param stressInBody the bound on the body's stress at the greatest load
 * @param hookBending the bound on the bending stress of the hooks
 * @param hookTorsion the bound on the torsion stress of the hooks
 * @param maxExtendedLength greatest length inside the hooks at the greatest load [mm], or empty
 * @param pin diameter of a pin that must pass the hook [mm], or empty
 */
public record ExtensionAsked(
    Optional<TensionLine> line,
    OptionalDouble freeLength,
    HooksAsked hooks,
    boolean preferredTension,
    StressLimit stressInBody,
    StressLimit hookBending,
    StressLimit hookTorsion,
    OptionalDouble maxExtendedLength,
    OptionalDouble pin) {}
