package coilwright.problem;

import coilwright.material.WireSize;
import coilwright.spring.EndType;
import coilwright.spring.Hand;
import coilwright.spring.Kind;
import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.List;

/** The keys about the one spring that a check judges. */
final class DesignKeys {

  static final ProblemKey<Section> DESIGN =
      ProblemKey.section(
          "design", "in a file for shortlist", "the spring to judge; for check, instead of make");

  static final ProblemKey<String> MATERIAL =
      ProblemKey.of(
          "design.material",
          new TextReader("a grade id"),
          "",
          "id from coilwright materials or own_materials",
          "music-wire");

  static final ProblemKey<WireSize> WIRE_DIAMETER =
      ProblemKey.of("design.wire_diameter", new WireSizeReader(), "", "wire diameter", "1.4 mm");

  static final ProblemKey<Double> MEAN_DIAMETER =
      ProblemKey.of(
          "design.mean_diameter",
          Values.length(),
          "outside_diameter or inside_diameter is given",
          "diameter at the middle of the wire",
          "12.2 mm");

  static final ProblemKey<Double> OUTSIDE_DIAMETER =
      ProblemKey.of(
          "design.outside_diameter",
          Values.length(),
          "mean_diameter or inside_diameter is given",
          "diameter over the coils",
          "13.6 mm");

  static final ProblemKey<Double> INSIDE_DIAMETER =
      ProblemKey.of(
          "design.inside_diameter",
          Values.length(),
          "mean_diameter or outside_diameter is given",
          "diameter inside the coils",
          "10.8 mm");

  static final ProblemKey<Double> ACTIVE_COILS =
      ProblemKey.of(
              "design.active_coils",
              Values.number(Range.ABOVE_ZERO),
              "total_coils is given",
              "coils that deflect",
              "8")
          .only(Kind.COMPRESSION);

  static final ProblemKey<Double> TOTAL_COILS =
      ProblemKey.of(
              "design.total_coils",
              Values.number(Range.ABOVE_ZERO),
              "active_coils is given",
              "all coils, with the dead ones of the ends",
              "10")
          .only(Kind.COMPRESSION);

  static final ProblemKey<Double> BODY_COILS =
      ProblemKey.of(
              "design.body_coils",
              Values.number(Range.ABOVE_ZERO),
              "",
              "coils of the body, without the hooks",
              "21")
          .only(Kind.EXTENSION);

  static final ProblemKey<Double> BODY_COILS_OF_TORSION =
      ProblemKey.of(
              "design.body_coils",
              Values.number(Range.ABOVE_ZERO),
              "",
              "coils of the body without load, without the legs",
              "6.5")
          .only(Kind.TORSION);

  static final ProblemKey<Double> INITIAL_TENSION =
      ProblemKey.of(
              "design.initial_tension",
              Values.quantity(Dimension.FORCE, Range.FROM_ZERO),
              "",
              "force that holds the coils together without load",
              "9 N")
          .only(Kind.EXTENSION);

  static final ProblemKey<Double> FREE_LENGTH =
      ProblemKey.of("design.free_length", Values.length(), "", "length without load", "38.7 mm")
          .only(Kind.COMPRESSION);

  static final ProblemKey<EndType> ENDS =
      ProblemKey.of(
              "design.ends",
              new WordReader<>(List.of(EndType.values()), EndType::id),
              "",
              "how the end coils are formed",
              "squared-ground")
          .only(Kind.COMPRESSION);

  static final ProblemKey<Hand> HAND =
      ProblemKey.of(
          "design.hand",
          new WordReader<>(List.of(Hand.values()), Hand::id),
          "either",
          "direction of winding",
          "right");

  static final ProblemKey<Boolean> SET_REMOVED =
      ProblemKey.of(
              "design.set_removed",
              Values.flag(),
              "false",
              "whether the spring was pressed solid once to raise its strength",
              "false")
          .only(Kind.COMPRESSION);

  static final ProblemKey<Section> COATING =
      ProblemKey.of(
          "design.coating",
          new SectionReader("design.coating"),
          "bare wire",
          "what covers the wire: it adds where coils touch and clear",
          "{thickness: 8 um}");

  static final ProblemKey<Double> COATING_THICKNESS =
      ProblemKey.of(
          "design.coating.thickness", Values.length(), "", "how thick the cover is", "8 um");

  /** The diameters, one of which is given. */
  static final List<ProblemKey<Double>> DIAMETERS =
      List.of(MEAN_DIAMETER, OUTSIDE_DIAMETER, INSIDE_DIAMETER);

  /** The coil counts, one of which is given. */
  static final List<ProblemKey<Double>> COILS = List.of(ACTIVE_COILS, TOTAL_COILS);

  /** All of them. */
  static final List<ProblemKey<?>> ROWS = rows();

  private DesignKeys() {}

  private static List<ProblemKey<?>> rows() {
    List<ProblemKey<?>> rows = new ArrayList<>();
    rows.addAll(List.of(DESIGN, MATERIAL, WIRE_DIAMETER));
    rows.addAll(DIAMETERS);
    rows.addAll(List.of(ACTIVE_COILS, TOTAL_COILS, BODY_COILS, BODY_COILS_OF_TORSION));
    rows.addAll(List.of(FREE_LENGTH, INITIAL_TENSION, ENDS));
    rows.addAll(HookKeys.DESIGN_ROWS);
    rows.addAll(LegKeys.DESIGN.rows());
    rows.addAll(List.of(HAND, SET_REMOVED, COATING, COATING_THICKNESS));
    return List.copyOf(rows);
  }
}
