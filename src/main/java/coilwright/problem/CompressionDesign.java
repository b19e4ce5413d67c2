package coilwright.problem;

import coilwright.material.WireSize;
import coilwright.spring.EndType;
import coilwright.spring.Hand;

/**
 * The compression spring that a check judges.
 *
 * @param material id of its grade, catalogue's or own
 * @param wireSize its wire
 * @param meanDiameter D [mm]
 * @param coils active coils n [-]
 * @param freeLength L0 [mm]
 * @param ends how its ends are formed
 * @param hand direction of winding
 * @param setRemoved whether the spring was pressed solid once before use
 * @param coating thickness of what covers the wire [mm], zero for bare wire
 */
public record CompressionDesign(
    String material,
    WireSize wireSize,
    double meanDiameter,
    double coils,
    double freeLength,
    EndType ends,
    Hand hand,
    boolean setRemoved,
    double coating)
    implements Design {}
