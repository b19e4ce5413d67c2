package coilwright.problem;

import coilwright.material.StrengthLaw;
import coilwright.spring.Kind;
import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.List;

/** The keys about grades that the file itself defines. */
final class MaterialKeys {

  /** Where what is left out comes from. */
  static final String OF_LIKE = "taken from like";

  static final ProblemKey<List<Section>> OWN_MATERIALS =
      ProblemKey.of(
          "own_materials",
          new SectionListReader("own_materials[]"),
          "no own grades",
          "a certificate in hand, or a grade the catalogue lacks");

  static final ProblemKey<String> ID =
      ProblemKey.of(
          "own_materials[].id",
          new IdReader(),
          "",
          "a new id",
          "coil-lot-2608",
          "coil-lot-2609",
          "coil-lot-2610");

  static final ProblemKey<String> LIKE =
      ProblemKey.of(
          "own_materials[].like",
          new TextReader("a grade id"),
          "everything else must be given",
          "whatever is not given is taken from this grade",
          "music-wire",
          "music-wire",
          "music-wire");

  static final ProblemKey<LawGiven<StrengthLaw>> TENSILE_STRENGTH =
      ProblemKey.of(
          "own_materials[].tensile_strength",
          new StrengthReader(),
          OF_LIKE,
          "a constant, {a, m} for a/d^m with d in mm, or a table of steps",
          "1900 MPa",
          "{a: 2211 MPa, m: 0.145}",
          "[{up_to: 1 mm, strength: 2100 MPa}, {up_to: 3 mm, strength: 1900 MPa}]");

  static final ProblemKey<Double> STRENGTH_A =
      ProblemKey.of(
          "own_materials[].tensile_strength.a", Values.strength(), "", "a in a/d^m", "2211 MPa");

  static final ProblemKey<Double> STRENGTH_M =
      ProblemKey.of(
          "own_materials[].tensile_strength.m",
          Values.number(new Range(0, true, 1, true)),
          "",
          "m in a/d^m",
          "0.145");

  static final ProblemKey<Double> STRENGTH_UP_TO =
      ProblemKey.of(
          "own_materials[].tensile_strength[].up_to",
          Values.length(),
          "",
          "greatest wire diameter of the step, itself included",
          "1 mm");

  static final ProblemKey<Double> STRENGTH_STEP =
      ProblemKey.of(
          "own_materials[].tensile_strength[].strength",
          Values.strength(),
          "",
          "tensile strength up to there",
          "2100 MPa");

  static final ProblemKey<Section> DIAMETERS =
      ProblemKey.of(
          "own_materials[].diameters",
          new SectionReader("own_materials[].diameters"),
          "those of like, or of the table of strength",
          "outside them the grade has no strength and is not offered",
          "{min: 0.5 mm, max: 6 mm}");

  static final ProblemKey<Double> DIAMETERS_MIN =
      ProblemKey.of(
          "own_materials[].diameters.min", Values.length(), OF_LIKE, "thinnest wire", "0.5 mm");

  static final ProblemKey<Double> DIAMETERS_MAX =
      ProblemKey.of(
          "own_materials[].diameters.max", Values.length(), OF_LIKE, "thickest wire", "6 mm");

  static final ModulusKeys SHEAR =
      ModulusKeys.of(
          "own_materials[].shear_modulus", Range.within(5_000, 150_000), "80 GPa", "81 GPa");

  static final ModulusKeys ELASTIC =
      ModulusKeys.of(
          "own_materials[].elastic_modulus", Range.within(10_000, 450_000), "200 GPa", "203 GPa");

  static final ProblemKey<Double> DENSITY =
      ProblemKey.of(
          "own_materials[].density",
          Values.ofWire(Dimension.DENSITY, Range.within(1_000, 20_000)),
          OF_LIKE,
          "mass per volume",
          "7850 kg/m^3");

  static final ProblemKey<Double> COST_INDEX =
      ProblemKey.of(
          "own_materials[].cost_index",
          Values.number(Range.ABOVE_ZERO),
          OF_LIKE,
          "price per mass relative to hard-drawn wire",
          "2.0");

  static final ProblemKey<Double> STRESS_AT_LOAD =
      ProblemKey.of(
              "own_materials[].stress_at_load",
              Values.shareOfStrength(),
              OF_LIKE,
              "its own allowable share of tensile strength; limits override it",
              "45 %")
          .only(Kind.COMPRESSION);

  static final ProblemKey<Double> STRESS_AT_SOLID =
      ProblemKey.of(
              "own_materials[].stress_at_solid",
              Values.shareOfStrength(),
              OF_LIKE,
              "likewise at solid",
              "45 %")
          .only(Kind.COMPRESSION);

  /**
   * What is taken from another grade where it is not given; without such a grade, all of it must.
   */
  static final List<ProblemKey<?>> TAKEN =
      List.of(
          TENSILE_STRENGTH,
          SHEAR.whole(),
          ELASTIC.whole(),
          DENSITY,
          COST_INDEX,
          STRESS_AT_LOAD,
          STRESS_AT_SOLID);

  /** All of them. */
  static final List<ProblemKey<?>> ROWS = rows();

  private MaterialKeys() {}

  private static List<ProblemKey<?>> rows() {
    List<ProblemKey<?>> rows = new ArrayList<>();
    rows.addAll(List.of(OWN_MATERIALS, ID, LIKE, TENSILE_STRENGTH, STRENGTH_A, STRENGTH_M));
    rows.addAll(List.of(STRENGTH_UP_TO, STRENGTH_STEP, DIAMETERS, DIAMETERS_MIN, DIAMETERS_MAX));
    rows.addAll(SHEAR.rows());
    rows.addAll(ELASTIC.rows());
    rows.addAll(List.of(DENSITY, COST_INDEX, STRESS_AT_LOAD, STRESS_AT_SOLID));
    return List.copyOf(rows);
  }
}
