package coilwright.problem;

import coilwright.spring.LoadPoint;
import java.util.List;
import java.util.OptionalDouble;

/**
 * What one extension spring must do beyond its initial tension: F = R (L - Lz), where Lz is the
 * length at which the line would come to no force.
 *
 * @param rate R of one spring [N/mm]
 * @param zeroForceLength Lz [mm]; empty where the lengths are left open
 * @param rule which facts fixed them, in words: "two loads at lengths"
 * @param loads the loads of one spring in file order: each with length and force, or with its force
 *     alone where the lengths are left open
 */
public record TensionLine(
    double rate, OptionalDouble zeroForceLength, String rule, List<LoadPoint> loads) {

  /** Copies the list. */
  public TensionLine {
    loads = List.copyOf(loads);
  }
}
