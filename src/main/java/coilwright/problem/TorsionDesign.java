package coilwright.problem;

import coilwright.material.WireSize;
import coilwright.spring.Hand;

/**
 * The torsion spring that a check judges.
 *
 * @param material id of its grade, catalogue's or own
 * @param wireSize its wire
 * @param meanDiameter D when free [mm]
 * @param coils body coils nb when free [-]
 * @param legs its legs; their angle, where it is asked, is judged
 * @param hand direction of winding
 * @param coating thickness of what covers the wire [mm], zero for bare wire
 */
public record TorsionDesign(
    String material,
    WireSize wireSize,
    double meanDiameter,
    double coils,
    LegsAsked legs,
    Hand hand,
    double coating)
    implements Design {}
