package coilwright.problem;

import coilwright.material.Supply;
import coilwright.spring.EndType;
import coilwright.spring.Hand;
import coilwright.spring.Kind;
import coilwright.spring.Method;
import coilwright.spring.Rounding;
import java.util.List;
import java.util.Optional;

/**
 * Reads what may be made, and how.
 *
 * @param ids the grades that may be named
 * @param units decide the defaults of supply and rounding
 * @param method decides which ends may be made
 * @param kind the kind of spring: only compression springs have the ends of {@code make.ends}
 */
record MakeReader(MaterialIds ids, UnitSystem units, Method method, Kind kind) {

  private static final double COIL_STEP = 0.25;
  private static final List<EndType> ENDS = List.of(EndType.SQUARED_GROUND, EndType.SQUARED);

  /**
   * Reads the block; where it is left out, the defaults.
   *
   * @param given its block
   * @return what may be made
   */
  Make read(Optional<Section> given) {
    Supply usual = units == UnitSystem.INCH ? Supply.US : Supply.EN;
    return given.map(section -> read(section, usual)).orElse(defaults(usual));
  }

  private List<EndType> usualEnds() {
    return kind == Kind.COMPRESSION ? ENDS : List.of();
  }

  private Make defaults(Supply supply) {
    Rounding rounding = StepDefaults.of(units).rounding(Optional.empty(), Optional.empty());
    List<String> none = List.of();
    return new Make(
        supply,
        none,
        false,
        none,
        List.of(),
        List.of(),
        usualEnds(),
        Hand.EITHER,
        false,
        0,
        COIL_STEP,
        rounding);
  }

  private Make read(Section section, Supply usual) {
    List<String> materials = section.read(MakeKeys.MATERIALS).orElse(List.of());
    List<String> excluded = section.read(MakeKeys.EXCLUDE_MATERIALS).orElse(List.of());
    boolean all = materials.contains(MaterialIds.ALL);
    checkMaterials(section, materials, excluded);
    Make make =
        new Make(
            section.read(MakeKeys.SUPPLY).orElse(usual),
            all ? List.of() : materials,
            all,
            excluded,
            section.read(MakeKeys.WIRE_SERIES).orElse(List.of()),
            section.read(MakeKeys.WIRE_SIZES).orElse(List.of()),
            section.read(MakeKeys.ENDS).orElse(usualEnds()),
            section.read(MakeKeys.HAND).orElse(Hand.EITHER),
            section.read(MakeKeys.SET_REMOVED).orElse(false),
            section
                .read(MakeKeys.COATING)
                .flatMap(coating -> coating.require(MakeKeys.COATING_THICKNESS))
                .orElse(0.0),
            section.read(MakeKeys.COIL_STEP).orElse(COIL_STEP),
            StepDefaults.of(units)
                .rounding(
                    section.read(MakeKeys.DIAMETER_STEP), section.read(MakeKeys.LENGTH_STEP)));
    checkEnds(section, make.ends());
    if (section.has(MakeKeys.WIRE_SERIES) && section.has(MakeKeys.WIRE_SIZES)) {
      section
          .spot(MakeKeys.WIRE_SIZES)
          .fault("given beside wire_series", "must be one of them: sizes take the place of series");
    }
    return make;
  }

  private void checkEnds(Section section, List<EndType> ends) {
    List<Spot> spots = section.itemSpots(MakeKeys.ENDS);
    for (int i = 0; i < Math.min(ends.size(), spots.size()); i++) {
      ClosedEnds.check(ends.get(i), method, spots.get(i));
    }
  }

  private void checkMaterials(Section section, List<String> materials, List<String> excluded) {
    List<Spot> named = section.itemSpots(MakeKeys.MATERIALS);
    for (int i = 0; i < materials.size(); i++) {
      if (!materials.get(i).equals(MaterialIds.ALL)) {
        ids.check(materials.get(i), named.get(i));
      } else if (materials.size() > 1) {
        named.get(i).fault("all beside other ids", "must stand alone");
      }
    }
    List<Spot> barred = section.itemSpots(MakeKeys.EXCLUDE_MATERIALS);
    for (int i = 0; i < excluded.size(); i++) {
      ids.check(excluded.get(i), barred.get(i));
    }
    if (!materials.isEmpty() && excluded.containsAll(materials)) {
      section
          .spot(MakeKeys.EXCLUDE_MATERIALS)
          .fault("excludes every grade that is named", "must leave one of make.materials");
    }
  }
}
