package coilwright.problem;

import coilwright.material.WireSize;
import coilwright.spring.Hand;

/**
 * The extension spring that a check judges.
 *
 * @param material id of its grade, catalogue's or own
 * @param wireSize its wire
 * @param meanDiameter D [mm]
 * @param coils body coils nb [-]
 * @param initialTension F0 [N], zero or more
 * @param hooks its hooks, of one type, natural or of a given length
 * @param hand direction of winding
 * @param coating thickness of what covers the wire [mm], zero for bare wire
 */
public record ExtensionDesign(
    String material,
    WireSize wireSize,
    double meanDiameter,
    double coils,
    double initialTension,
    HooksAsked hooks,
    Hand hand,
    double coating)
    implements Design {}
