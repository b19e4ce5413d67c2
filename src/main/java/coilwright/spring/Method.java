package coilwright.spring;

import coilwright.material.Wire;
import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.unit.Require;

/**
 * Whose rules reckon what is a convention rather than mechanics: the solid length, the growth of
 * the coil, and the travel kept before solid.
 */
public enum Method {
  /** US handbooks: nominal wire, ends held from turning, a share of the deflection kept. */
  HANDBOOK("handbook", EndType.CITATION, "nominal wire diameter", Coil.GROWTH, "ends held") {
    @Override
    double closed(EndType ends, double activeCoils, Wire wire, double coating) {
      return ends.solidLength(activeCoils, wire.diameter() + 2 * coating);
    }

    @Override
    double outside(double meanDiameter, double pitch, double wire) {
      return Coil.meanDiameterAtSolid(meanDiameter, pitch, wire) + wire;
    }
  },
  /** EN 13906-1: greatest wire, ends free to turn, a sum of gaps kept; closed ends only. */
  EN_13906(
      "en-13906",
      Citation.remembered(Source.EN_13906_1, "solid length of cold-coiled springs, closed ends"),
      "greatest wire diameter",
      Coil.GROWTH_FREE,
      "ends free to turn") {
    @Override
    double closed(EndType ends, double activeCoils, Wire wire, double coating) {
      if (!ends.closed()) {
        throw new IllegalArgumentException(ends.id() + " ends under " + id());
      }
      double greatest = wire.diameter() + wire.diameterTolerance() + 2 * coating;
      double unground = ends.ground() ? 0 : UNGROUND;
      return (activeCoils + ends.deadCoils() + unground) * greatest;
    }

    @Override
    double outside(double meanDiameter, double pitch, double wire) {
      return meanDiameter + wire + Coil.growthFreeToTurn(meanDiameter, pitch, wire);
    }
  };

  /** Wires by which ends that are not ground lengthen a solid spring under EN 13906-1 [-]. */
  private static final double UNGROUND = 1.5;

  private final String id;
  private final Citation solid;
  private final String solidMeans;
  private final Citation growth;
  private final String growthMeans;

  Method(String id, Citation solid, String solidMeans, Citation growth, String growthMeans) {
    this.id = id;
    this.solid = solid;
    this.solidMeans = solidMeans;
    this.growth = growth;
    this.growthMeans = growthMeans;
  }

  abstract double closed(EndType ends, double activeCoils, Wire wire, double coating);

  abstract double outside(double meanDiameter, double pitch, double wire);

  /** The id used in problem files and output. */
  public String id() {
    return id;
  }

  /** Where the solid length is published. */
  public Citation solidCitation() {
    return solid;
  }

  /** With which wire the solid length is reckoned, in words. */
  public String solidMeans() {
    return solidMeans;
  }

  /** Where the growth of the coil is published. */
  public Citation growthCitation() {
    return growth;
  }

  /** How the ends are taken to be held while the coil grows, in words. */
  public String growthMeans() {
    return growthMeans;
  }

  /**
   * Length with all coils touching.
   *
   * @param ends how the ends are formed; closed under EN 13906-1
   * @param activeCoils n [-]
   * @param wire the wire
   * @param coating thickness of its coating [mm]
   * @return Ls or Lc [mm]
   * @throws IllegalArgumentException if the method has no rule for the ends, or the coating is
   *     negative or not finite
   */
  public double solidLength(EndType ends, double activeCoils, Wire wire, double coating) {
    return closed(ends, activeCoils, wire, Require.notNegative(coating, "coating", "mm"));
  }

  /**
   * Outside diameter over the coating when pressed to solid.
   *
   * @param meanDiameter D when free [mm]
   * @param pitch p when free [mm]
   * @param wireDiameter d [mm]
   * @param coating thickness of its coating [mm]
   * @return De at solid [mm]
   * @throws IllegalArgumentException if a diameter is not positive and finite, the pitch not
   *     finite, or the coating negative
   */
  public double outsideDiameterAtSolid(
      double meanDiameter, double pitch, double wireDiameter, double coating) {
    double wire = wireDiameter + 2 * Require.notNegative(coating, "coating", "mm");
    return outside(meanDiameter, pitch, wire);
  }
}
