package coilwright.search;

import coilwright.material.AllowableClass;
import coilwright.material.DiameterRange;
import coilwright.material.ModulusLaws;
import coilwright.material.StrengthLaw;
import coilwright.material.StrengthLaws;
import coilwright.material.Supply;
import coilwright.material.WireGrade;
import coilwright.spring.SampleWire;
import java.util.List;
import java.util.OptionalDouble;

/**
 * A grade of a problem's own in the making: a cold-drawn carbon steel of no particular standard.
 *
 * @param id its id
 * @param strength Rm by diameter
 * @param shearModulus G [MPa]
 * @param elasticModulus E [MPa]
 * @param diameters where it has data [mm]
 * @param density [kg/m^3]
 * @param costIndex [-]
 * @param stressAtLoad its own share at load [-], where it has one
 * @param stressAtSolid its own share at solid [-], where it has one
 */
public record GradeDraft(
    String id,
    StrengthLaw strength,
    double shearModulus,
    double elasticModulus,
    DiameterRange diameters,
    double density,
    double costIndex,
    OptionalDouble stressAtLoad,
    OptionalDouble stressAtSolid) {

  /** A steel of one strength [MPa] at every diameter. */
  public static GradeDraft of(String id, double tensileStrength) {
    return new GradeDraft(
        id,
        StrengthLaws.constant(tensileStrength),
        80_000,
        200_000,
        new DiameterRange(0, Double.POSITIVE_INFINITY),
        7850,
        1,
        OptionalDouble.empty(),
        OptionalDouble.empty());
  }

  /** With another strength. */
  public GradeDraft strength(StrengthLaw law) {
    return new GradeDraft(
        id,
        law,
        shearModulus,
        elasticModulus,
        diameters,
        density,
        costIndex,
        stressAtLoad,
        stressAtSolid);
  }

  /** With other moduli [MPa]. */
  public GradeDraft moduli(double g, double e) {
    return new GradeDraft(
        id, strength, g, e, diameters, density, costIndex, stressAtLoad, stressAtSolid);
  }

  /** With data for some diameters only [mm]. */
  public GradeDraft diameters(double min, double max) {
    return new GradeDraft(
        id,
        strength,
        shearModulus,
        elasticModulus,
        new DiameterRange(min, max),
        density,
        costIndex,
        stressAtLoad,
        stressAtSolid);
  }

  /** With another density [kg/m^3] and cost index [-]. */
  public GradeDraft weight(double heavy, double dear) {
    return new GradeDraft(
        id,
        strength,
        shearModulus,
        elasticModulus,
        diameters,
        heavy,
        dear,
        stressAtLoad,
        stressAtSolid);
  }

  /** With stress shares of its own [-]. */
  public GradeDraft shares(double atLoad, double atSolid) {
    return new GradeDraft(
        id,
        strength,
        shearModulus,
        elasticModulus,
        diameters,
        density,
        costIndex,
        OptionalDouble.of(atLoad),
        OptionalDouble.of(atSolid));
  }

  /** The grade. */
  public WireGrade grade() {
    return new WireGrade(
        id,
        id,
        "",
        "",
        Supply.ANY,
        false,
        AllowableClass.COLD_DRAWN_CARBON,
        strength,
        ModulusLaws.constant(shearModulus),
        ModulusLaws.constant(elasticModulus),
        SampleWire.TOLERANCE,
        diameters,
        density,
        OptionalDouble.empty(),
        costIndex,
        List.of(),
        stressAtLoad,
        stressAtSolid,
        List.of());
  }
}
