package coilwright.material;

import coilwright.unit.Dimension;
import java.util.List;
import java.util.Optional;

/**
 * One plain number of a grade.
 *
 * @param value in the inner unit: kg/m^3, degC or a plain number
 * @param source where it comes from
 */
record GradeProperty(double value, GradeSource source) {

  /** The property [kg/m^3]. */
  static final String DENSITY = "density";

  /** The property [degC]. */
  static final String SERVICE_TEMPERATURE = "service temperature";

  /** The property [-]. */
  static final String COST_INDEX = "cost index";

  private static final List<String> ALL = List.of(DENSITY, SERVICE_TEMPERATURE, COST_INDEX);

  /**
   * Reads a property of a grade.
   *
   * @param table the file of properties
   * @param gradeId the grade
   * @param property {@link #DENSITY}, {@link #SERVICE_TEMPERATURE} or {@link #COST_INDEX}
   * @return the property, or empty where the file has none
   * @throws IllegalStateException naming file, line and column if the file is bad
   */
  static Optional<GradeProperty> of(Table table, String gradeId, String property) {
    GradeProperty found = null;
    for (TableRow row : table.rowsOf("grade", gradeId)) {
      String name = row.oneOf("property", ALL.toArray(String[]::new), word -> word);
      if (name.equals(property)) {
        if (found != null) {
          throw row.fault("property", "found a second " + property + " of " + gradeId);
        }
        GradeSource source = new GradeSource(name, row.place(), row.evidence());
        found = new GradeProperty(value(row, name), source);
      }
    }
    return Optional.ofNullable(found);
  }

  private static double value(TableRow row, String property) {
    String unit = row.text("unit");
    return switch (property) {
      case DENSITY -> row.unit("unit", unit, Dimension.DENSITY).toInner(row.number("value"));
      case SERVICE_TEMPERATURE -> degreesCelsius(row, unit);
      default -> plainNumber(row, unit);
    };
  }

  private static double plainNumber(TableRow row, String unit) {
    if (!unit.equals("-")) {
      throw row.fault("unit", "found \"" + unit + "\", accepted: -");
    }
    return row.number("value");
  }

  private static double degreesCelsius(TableRow row, String unit) {
    return switch (unit) {
      case "degC" -> row.number("value");
      case "degF" -> (row.number("value") - 32) / 1.8;
      default -> throw row.fault("unit", "found \"" + unit + "\", accepted: degC | degF");
    };
  }
}
