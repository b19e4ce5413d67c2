package coilwright.problem;

import java.util.OptionalDouble;

/**
 * The space a spring must fit; each bound is empty where the file does not give it.
 *
 * @param bore hole it works in [mm]
 * @param rod shaft through it [mm]
 * @param diametralClearance between coil and bore, and coil and rod [mm]; where it is empty the
 *     tolerance of the coil diameter stands in
 * @param maxOutsideDiameter nominal, free state [mm]
 * @param minInsideDiameter nominal, free state [mm]
 * @param maxFreeLength [mm]
 * @param maxSolidLength [mm]
 */
public record Envelope(
    OptionalDouble bore,
    OptionalDouble rod,
    OptionalDouble diametralClearance,
    OptionalDouble maxOutsideDiameter,
    OptionalDouble minInsideDiameter,
    OptionalDouble maxFreeLength,
    OptionalDouble maxSolidLength) {

  /** Whether a bore or a rod keeps the spring straight. */
  public boolean guides() {
    return bore.isPresent() || rod.isPresent();
  }

  /** Whether the tolerance of the coil diameter is taken for the clearance. */
  public boolean clearanceAssumed() {
    return guides() && diametralClearance.isEmpty();
  }
}
