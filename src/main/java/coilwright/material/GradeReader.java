package coilwright.material;

import coilwright.source.Evidence;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;

/** Builds a grade from its row and from the tables that the row names, and opens no others. */
final class GradeReader {

  private final Function<String, Table> tables;

  /**
   * A reader.
   *
   * @param tables the table with a name
   */
  GradeReader(Function<String, Table> tables) {
    this.tables = tables;
  }

  /**
   * The grade of a row.
   *
   * @param row a row of the file of grades
   * @return the grade
   * @throws IllegalStateException naming file, line and column if a file is bad
   */
  WireGrade read(TableRow row) {
    String id = row.text("id");
    GradeStrength strength = GradeStrength.of(tables.apply(row.text("strength")), id);
    GradeModuli moduli = GradeModuli.of(tables.apply(row.text("moduli")), id);
    GradeTolerance tolerance =
        GradeTolerance.of(tables.apply(row.text("tolerance")), toleranceBasis(row));
    Optional<GradeProperty> temperature = property(id, GradeProperty.SERVICE_TEMPERATURE);
    GradeProperty density = needed(row, id, GradeProperty.DENSITY);
    GradeProperty cost = needed(row, id, GradeProperty.COST_INDEX);
    List<GradeSource> sources = new ArrayList<>(strength.sources());
    sources.add(moduli.source());
    sources.add(tolerance.source());
    sources.add(density.source());
    temperature.map(GradeProperty::source).ifPresent(sources::add);
    sources.add(cost.source());
    return new WireGrade(
        id,
        row.text("name"),
        row.text("standard"),
        row.text("condition"),
        supply(row),
        common(row),
        row.oneOf("allowable_class", AllowableClass.values(), GradeReader::word),
        strength.law(),
        moduli.shear(),
        moduli.elastic(),
        tolerance.law(),
        strength.diameters(),
        density.value(),
        temperature.map(each -> OptionalDouble.of(each.value())).orElse(OptionalDouble.empty()),
        cost.value(),
        series(row),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        sources);
  }

  /** Whether the grade of a row is tried when a problem file names none. */
  static boolean common(TableRow row) {
    return row.oneOf("common", new Boolean[] {true, false}, String::valueOf);
  }

  /** Whose steel the grade of a row is. */
  static Supply supply(TableRow row) {
    return row.oneOf("supply", Supply.values(), Supply::word);
  }

  private static Evidence toleranceBasis(TableRow row) {
    return row.oneOf("tolerance_evidence", Evidence.values(), Evidence::word);
  }

  private Optional<GradeProperty> property(String id, String property) {
    return GradeProperty.of(tables.apply("properties"), id, property);
  }

  private GradeProperty needed(TableRow row, String id, String property) {
    return property(id, property)
        .orElseThrow(() -> row.fault("id", "properties.csv has no " + property + " of " + id));
  }

  private static List<WireSeries> series(TableRow row) {
    return Arrays.stream(row.text("usual_series").split(" "))
        .map(
            id ->
                WireSeries.of(id)
                    .orElseThrow(() -> row.fault("usual_series", "found \"" + id + "\"")))
        .toList();
  }

  private static String word(AllowableClass allowable) {
    return allowable.name().toLowerCase(Locale.ROOT).replace('_', '-');
  }
}
