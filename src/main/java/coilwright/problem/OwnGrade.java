package coilwright.problem;

import coilwright.material.AllowableClass;
import coilwright.material.Catalogue;
import coilwright.material.DiameterRange;
import coilwright.material.GradeSource;
import coilwright.material.ModulusLaw;
import coilwright.material.StrengthLaw;
import coilwright.material.Supply;
import coilwright.material.WireGrade;
import coilwright.material.WireSeries;
import coilwright.source.Evidence;
import coilwright.source.Source;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.stream.Stream;

/**
 * Reads one grade that a file defines.
 *
 * @param section its block of keys
 * @param like the grade that what is left out is taken from; empty where there is none or it is
 *     faulty
 * @param alone whether the file names no such grade: then everything must be given
 * @param catalogue gives the diameter tolerance of a grade that is like no other
 * @param units decide the usual wire series of a grade that is like no other
 */
record OwnGrade(
    Section section,
    Optional<WireGrade> like,
    boolean alone,
    Catalogue catalogue,
    UnitSystem units) {

  /**
   * Reads the grade.
   *
   * @param id its id
   * @return the grade, or empty where it is faulty
   */
  Optional<WireGrade> read(String id) {
    long before = section.spot().faults().count();
    Optional<LawGiven<StrengthLaw>> strength = given(MaterialKeys.TENSILE_STRENGTH);
    Optional<LawGiven<ModulusLaw>> shear = given(MaterialKeys.SHEAR.whole());
    Optional<LawGiven<ModulusLaw>> elastic = given(MaterialKeys.ELASTIC.whole());
    Optional<Double> density = given(MaterialKeys.DENSITY);
    Optional<Double> costIndex = given(MaterialKeys.COST_INDEX);
    Optional<Double> atLoad = given(MaterialKeys.STRESS_AT_LOAD);
    Optional<Double> atSolid = given(MaterialKeys.STRESS_AT_SOLID);
    Optional<DiameterRange> diameters =
        new OwnDiameters(section, like, taken(strength, shear, elastic))
            .read(List.of(end(strength), end(shear), end(elastic)));
    if (section.spot().faults().count() == before && diameters.isPresent()) {
      OwnLaws laws = new OwnLaws(section, diameters.get());
      laws.checkStrength(strength);
      laws.checkStiffness(
          law(shear, WireGrade::shearModulus), law(elastic, WireGrade::elasticModulus));
    }
    if (section.spot().faults().count() > before || !alone && like.isEmpty()) {
      return Optional.empty();
    }
    return Optional.of(
        new WireGrade(
            id,
            id,
            Source.PROBLEM_FILE.shortTitle(),
            like.map(Like::words).orElse(""),
            Supply.ANY,
            true,
            like.map(WireGrade::allowableClass).orElse(AllowableClass.NON_FERROUS),
            law(strength, WireGrade::strength).get(),
            law(shear, WireGrade::shearModulus).get(),
            law(elastic, WireGrade::elasticModulus).get(),
            like.map(WireGrade::diameterTolerance).orElseGet(catalogue::commonTolerance),
            diameters.get(),
            density.orElseGet(() -> like.get().density()),
            like.map(WireGrade::maxServiceTemperature).orElse(OptionalDouble.empty()),
            costIndex.orElseGet(() -> like.get().costIndex()),
            like.map(WireGrade::usualSeries).orElse(List.of(series())),
            share(atLoad, WireGrade::stressAtLoad),
            share(atSolid, WireGrade::stressAtSolid),
            sources()));
  }

  private <T> Optional<T> given(ProblemKey<T> key) {
    boolean needed = alone && key.kinds().contains(section.spot().kind());
    return needed ? section.require(key) : section.read(key);
  }

  private <L> Optional<L> law(Optional<LawGiven<L>> given, Function<WireGrade, L> ofLike) {
    return given.map(LawGiven::law).or(() -> like.map(ofLike));
  }

  /** Moduli end with the diameters only where the other grade is an own one, with a table. */
  private String taken(
      Optional<LawGiven<StrengthLaw>> strength,
      Optional<LawGiven<ModulusLaw>> shear,
      Optional<LawGiven<ModulusLaw>> elastic) {
    if (strength.isEmpty()) {
      return "strength";
    }
    boolean own =
        like.isPresent() && like.get().standard().equals(Source.PROBLEM_FILE.shortTitle());
    return own && (shear.isEmpty() || elastic.isEmpty()) ? "modulus" : "";
  }

  private static double end(Optional<? extends LawGiven<?>> law) {
    return law.map(LawGiven::end).orElse(Double.POSITIVE_INFINITY);
  }

  private OptionalDouble share(Optional<Double> given, Function<WireGrade, OptionalDouble> ofLike) {
    return given
        .map(OptionalDouble::of)
        .orElseGet(() -> like.map(ofLike).orElse(OptionalDouble.empty()));
  }

  private WireSeries series() {
    return units == UnitSystem.INCH ? WireSeries.MUSIC_WIRE_GAUGE : WireSeries.METRIC;
  }

  private List<GradeSource> sources() {
    List<GradeSource> sources = new ArrayList<>();
    source("strength", sources, MaterialKeys.TENSILE_STRENGTH);
    source("moduli", sources, MaterialKeys.SHEAR.whole(), MaterialKeys.ELASTIC.whole());
    source("diameter tolerance", sources);
    if (like.isEmpty()) {
      sources.add(catalogue.commonToleranceSource());
    }
    source("density", sources, MaterialKeys.DENSITY);
    source("service temperature", sources);
    source("cost index", sources, MaterialKeys.COST_INDEX);
    return sources;
  }

  private void source(String what, List<GradeSource> sources, ProblemKey<?>... keys) {
    List<ProblemKey<?>> given = Stream.of(keys).filter(section::has).toList();
    if (!given.isEmpty()) {
      sources.add(new GradeSource(what, Source.PROBLEM_FILE.shortTitle(), Evidence.SEEN));
    }
    if (given.size() < Math.max(1, keys.length)) {
      like.ifPresent(
          grade ->
              grade.sources().stream()
                  .filter(source -> source.what().equals(what))
                  .forEach(sources::add));
    }
  }
}
