package coilwright.spring;

import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.unit.Require;

/** The body of a torsion spring once its ends are turned against each other. */
public final class WoundBody {

  /** Where the change of the diameter was seen. */
  public static final Citation DIAMETER =
      Citation.seen(Source.MOTT, "chapter 19, mean diameter of a torsion spring at its load");

  /** Where the length was seen. */
  public static final Citation LENGTH =
      Citation.seen(Source.MOTT, "chapter 19, greatest length of a torsion spring");

  private WoundBody() {}

  /**
   * Mean diameter after turning, D nb / (nb + turns): the wire stays as long as it is. A body
   * unwound by as many turns as it has is a coil no more. Machinery's Handbook puts the inside
   * diameter in place of D, which leaves more room by d turns / (nb + turns).
   *
   * @param meanDiameter D when free [mm]
   * @param bodyCoils nb when free [-]
   * @param turns by which the body is wound up; negative where it is unwound [-]
   * @return D [mm]; positive infinity where no turns are left
   * @throws IllegalArgumentException if the diameter or the count is not positive and finite, or
   *     the turns are not finite
   * @see #DIAMETER
   */
  public static double meanDiameter(double meanDiameter, double bodyCoils, double turns) {
    double free = Require.positive(meanDiameter, "mean diameter", "mm");
    double coils = Require.positive(bodyCoils, "body coils", "-");
    double left = coils + Require.finite(turns, "turns of the body", "-");
    return left > 0 ? free * coils / left : Double.POSITIVE_INFINITY;
  }

  /**
   * Length of a body wound close after turning, (nb + 1 + turns) d: each turn lays one more wire
   * beside the others.
   *
   * @param wireDiameter d, its coating included [mm]
   * @param bodyCoils nb when free [-]
   * @param turns by which the body is wound up; negative where it is unwound [-]
   * @return length [mm]; one wire where no turns are left
   * @throws IllegalArgumentException if the diameter or the count is not positive and finite, or
   *     the turns are not finite
   * @see #LENGTH
   */
  public static double length(double wireDiameter, double bodyCoils, double turns) {
    double wires =
        Require.positive(bodyCoils, "body coils", "-")
            + Require.finite(turns, "turns of the body", "-");
    return Require.positive(wireDiameter, "wire diameter", "mm") * (1 + Math.max(0, wires));
  }
}
