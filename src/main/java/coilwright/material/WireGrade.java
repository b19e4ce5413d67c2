package coilwright.material;

import coilwright.source.Evidence;
import coilwright.unit.Require;
import java.util.List;
import java.util.OptionalDouble;

/**
 * A grade of spring wire: what it is, how strong and stiff it is at each diameter, and what it
 * weighs and costs.
 *
 * @param id the id used in problem files, such as "music-wire"
 * @param name the trade's name
 * @param standard the standard it is bought to
 * @param condition its class, temper or heat treatment
 * @param supply whose steel it is; {@link Supply#ANY} for what comes with either
 * @param common whether it is tried when a problem file names no grade
 * @param allowableClass which row of the allowable tables applies
 * @param strength minimum tensile strength by diameter
 * @param shearModulus G by diameter
 * @param elasticModulus E by diameter
 * @param diameterTolerance what the wire may differ from its nominal diameter by
 * @param diameters where the strength holds
 * @param density [kg/m^3]
 * @param maxServiceTemperature [degC]; empty where none is cited
 * @param costIndex price per mass relative to hard-drawn wire [-]
 * @param usualSeries the series it is usually stocked in, the first of them first
 * @param stressAtLoad its own static allowable at load as a share of Rm [-], where it has one
 * @param stressAtSolid its own static allowable at solid as a share of Rm [-], where it has one
 * @param sources one line for each kind of data: what it is, its source, seen or memory
 */
public record WireGrade(
    String id,
    String name,
    String standard,
    String condition,
    Supply supply,
    boolean common,
    AllowableClass allowableClass,
    StrengthLaw strength,
    ModulusLaw shearModulus,
    ModulusLaw elasticModulus,
    ToleranceLaw diameterTolerance,
    DiameterRange diameters,
    double density,
    OptionalDouble maxServiceTemperature,
    double costIndex,
    List<WireSeries> usualSeries,
    OptionalDouble stressAtLoad,
    OptionalDouble stressAtSolid,
    List<GradeSource> sources) {

  /** Refuses a density or cost index that is not positive and finite. */
  public WireGrade {
    Require.positive(density, "density of " + id, "kg/m^3");
    Require.positive(costIndex, "cost index of " + id, "-");
    usualSeries = List.copyOf(usualSeries);
    sources = List.copyOf(sources);
  }

  /** Whether the density was seen; all its sources count. */
  public Evidence densityEvidence() {
    Evidence evidence = Evidence.SEEN;
    for (GradeSource source : sources) {
      if (source.what().equals(GradeProperty.DENSITY)) {
        evidence = evidence.and(source.evidence());
      }
    }
    return evidence;
  }

  /**
   * This grade drawn to a size.
   *
   * @param size a size within {@link #diameters()}
   * @return the wire, with its strength and moduli there
   * @throws IllegalArgumentException if the size lies outside the grade's diameters
   */
  public Wire drawnTo(WireSize size) {
    double d = size.diameter();
    if (!diameters.contains(d)) {
      throw new IllegalArgumentException(
          id + ": " + d + " mm is outside " + diameters.min() + " to " + diameters.max() + " mm");
    }
    Evidence evidence =
        size.evidence()
            .and(strength.evidenceAt(d))
            .and(shearModulus.evidenceAt(d))
            .and(elasticModulus.evidenceAt(d));
    return new Wire(this, size, strength.at(d), shearModulus.at(d), elasticModulus.at(d), evidence);
  }
}
