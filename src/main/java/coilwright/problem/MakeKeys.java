package coilwright.problem;

import coilwright.material.Supply;
import coilwright.material.WireSeries;
import coilwright.material.WireSize;
import coilwright.spring.EndType;
import coilwright.spring.Hand;
import coilwright.spring.Kind;
import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.List;

/** The keys about what a shop may make the spring of, and how. */
final class MakeKeys {

  static final ProblemKey<Section> MAKE =
      ProblemKey.section("make", "the defaults", "what may be made; for shortlist only");

  static final ProblemKey<Supply> SUPPLY =
      ProblemKey.of(
          "make.supply",
          new WordReader<>(List.of(Supply.values()), Supply::word),
          "en for metric, us for inch",
          "whose steel grades and size series",
          "en");

  static final ProblemKey<List<String>> MATERIALS =
      ProblemKey.of(
          "make.materials",
          Values.list(new TextReader("a grade id or all")),
          "the common grades of the supply whose data were seen",
          "grade ids, own ones too, or all",
          "[music-wire]");

  static final ProblemKey<List<String>> EXCLUDE_MATERIALS =
      ProblemKey.of(
          "make.exclude_materials",
          Values.list(new TextReader("a grade id")),
          "none excluded",
          "ids never tried",
          "[hard-drawn]");

  static final ProblemKey<List<WireSeries>> WIRE_SERIES =
      ProblemKey.of(
          "make.wire_series",
          Values.list(new WordReader<>(List.of(WireSeries.values()), WireSeries::id)),
          "the usual one of each grade",
          "whose wire sizes are tried",
          "[metric]");

  static final ProblemKey<List<WireSize>> WIRE_SIZES =
      ProblemKey.of(
          "make.wire_sizes",
          new ListReader<>(new WireSizeReader(), size -> Math.rint(size.diameter() * 1e7)),
          "the sizes of the series",
          "a list of sizes instead of series",
          "[1.6 mm, 0.063 in]");

  static final ProblemKey<List<EndType>> ENDS =
      ProblemKey.of(
              "make.ends",
              Values.list(new WordReader<>(List.of(EndType.values()), EndType::id)),
              "squared-ground and squared",
              "how the end coils are formed",
              "[squared-ground]")
          .only(Kind.COMPRESSION);

  static final ProblemKey<Hand> HAND =
      ProblemKey.of(
          "make.hand",
          new WordReader<>(List.of(Hand.values()), Hand::id),
          "either",
          "direction of winding",
          "either");

  static final ProblemKey<Boolean> SET_REMOVED =
      ProblemKey.of(
              "make.set_removed",
              Values.flag(),
              "false",
              "whether the spring is pressed solid once to raise its strength",
              "false")
          .only(Kind.COMPRESSION);

  static final ProblemKey<Section> COATING =
      ProblemKey.of(
          "make.coating",
          new SectionReader("make.coating"),
          "bare wire",
          "what covers the wire: it adds where coils touch and clear",
          "{thickness: 8 um}");

  static final ProblemKey<Double> COATING_THICKNESS =
      ProblemKey.of(
          "make.coating.thickness", Values.length(), "", "how thick the cover is", "8 um");

  static final ProblemKey<Double> COIL_STEP =
      ProblemKey.of(
              "make.coil_step",
              Values.number(Range.ABOVE_ZERO),
              "0.25",
              "active coils are multiples of this",
              "0.25")
          .only(Kind.COMPRESSION);

  static final ProblemKey<Double> BODY_COIL_STEP =
      ProblemKey.of(
              "make.coil_step",
              Values.number(Range.ABOVE_ZERO),
              "0.25",
              "body coils are multiples of this",
              "0.25")
          .only(Kind.EXTENSION);

  static final ProblemKey<Double> BODY_COIL_STEP_OF_TORSION =
      ProblemKey.of(
              "make.coil_step",
              Values.number(Range.ABOVE_ZERO),
              "0.25; whole coils and a fraction where legs.angle is given",
              "body coils are multiples of this; never beside legs.angle",
              "0.25")
          .only(Kind.TORSION);

  static final ProblemKey<Double> DIAMETER_STEP =
      ProblemKey.of(
          "make.diameter_step",
          Values.quantity(Dimension.LENGTH, Range.FROM_ZERO),
          "0.01 mm (inch: 0.0005 in), a tenth for mean diameters below 5 mm",
          "step of the mean diameter; 0 mm: none",
          "0.01 mm");

  static final ProblemKey<Double> LENGTH_STEP =
      ProblemKey.of(
              "make.length_step",
              Values.quantity(Dimension.LENGTH, Range.FROM_ZERO),
              "0.1 mm (inch: 0.005 in), a tenth for mean diameters below 5 mm",
              "step of the free length; 0 mm: none",
              "0.1 mm")
          .only(Kind.COMPRESSION, Kind.EXTENSION);

  /** All of them. */
  static final List<ProblemKey<?>> ROWS = rows();

  private MakeKeys() {}

  private static List<ProblemKey<?>> rows() {
    List<ProblemKey<?>> rows = new ArrayList<>();
    rows.addAll(List.of(MAKE, SUPPLY, MATERIALS, EXCLUDE_MATERIALS, WIRE_SERIES, WIRE_SIZES, ENDS));
    rows.addAll(HookKeys.MAKE_ROWS);
    rows.addAll(LegKeys.MAKE.rows());
    rows.addAll(List.of(HAND, SET_REMOVED, COATING, COATING_THICKNESS, COIL_STEP));
    rows.addAll(List.of(BODY_COIL_STEP, BODY_COIL_STEP_OF_TORSION, DIAMETER_STEP, LENGTH_STEP));
    return List.copyOf(rows);
  }
}
