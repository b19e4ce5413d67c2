package coilwright.report;

import coilwright.material.GradeSource;
import coilwright.material.Wire;
import coilwright.material.WireGrade;
import coilwright.material.WireSeries;
import coilwright.material.WireSize;
import coilwright.unit.Dimension;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;

/** The values of grades and wires, each declared once for JSON and CSV. */
final class GradeFields {

  /** What a grade is. */
  static final List<Field<WireGrade>> GRADE =
      List.of(
          Word.ours("id", WireGrade::id),
          Word.ours("name", WireGrade::name),
          Word.ours("standard", WireGrade::standard),
          Word.ours("condition", WireGrade::condition),
          Word.ours("supply", grade -> grade.supply().word()),
          new Flag<>("common", WireGrade::common),
          Word.ours("allowable_class", grade -> grade.allowableClass().words()),
          of("min_wire_diameter", Dimension.LENGTH, grade -> grade.diameters().min()),
          of("max_wire_diameter", Dimension.LENGTH, grade -> grade.diameters().max()),
          of("density", Dimension.DENSITY, WireGrade::density),
          of(
              "max_service_temperature_degc",
              Dimension.NUMBER,
              grade -> grade.maxServiceTemperature().orElse(Double.NaN)),
          of("cost_index", Dimension.NUMBER, WireGrade::costIndex));

  /** A size of a series. */
  static final List<Field<WireSize>> SIZE =
      List.of(
          new Word<>("wire_series", false, size -> size.series().map(WireSeries::id)),
          Word.ours("wire_size", WireSize::label),
          of("wire_diameter", Dimension.LENGTH, WireSize::diameter));

  /** What a grade drawn to a size has there. */
  static final List<Field<Wire>> WIRE =
      List.of(
          of("wire_diameter_tolerance", Dimension.LENGTH, Wire::diameterTolerance),
          of("tensile_strength", Dimension.STRESS, Wire::tensileStrength),
          of("shear_modulus", Dimension.STRESS, Wire::shearModulus),
          of("elastic_modulus", Dimension.STRESS, Wire::elasticModulus),
          Word.ours("data", wire -> wire.evidence().word()));

  /** How well founded a size is. */
  static final List<Field<WireSize>> EVIDENCE =
      List.of(Word.ours("data", size -> size.evidence().word()));

  /** Where one kind of a grade's data comes from. */
  static final List<Field<GradeSource>> SOURCE =
      List.of(
          Word.ours("what", GradeSource::what),
          Word.ours("source", GradeSource::text),
          Word.ours("data", source -> source.evidence().word()));

  private GradeFields() {}

  private static <T> Quantity<T> of(String stem, Dimension dimension, ToDoubleFunction<T> of) {
    return Quantities.of(stem, "", dimension, 3, of);
  }

  /** A list as one cell. */
  static Word<WireGrade> list(String key, Function<WireGrade, List<String>> of) {
    return new Word<>(key, false, grade -> Optional.of(String.join("; ", of.apply(grade))));
  }
}
