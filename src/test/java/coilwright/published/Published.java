package coilwright.published;

import coilwright.unit.Dimension;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Stream;
import org.assertj.core.data.Percentage;

/**
 * One row of a file of published check values; its text, which names a test, begins with the
 * citation.
 *
 * @param file the file it stands in
 * @param cells column to cell, in the file's order
 */
public record Published(PublishedFile file, Map<String, String> cells) {

  /** A double carries a converted, printed number no better than this [%]. */
  private static final double ROUNDING = 1e-9;

  /** The rows of a file under {@code src/test/resources/published}. */
  public static Stream<Published> rows(String path) {
    return rows(PublishedFile.at(path));
  }

  /**
   * The rows of every file of a group that have a column: files of one group may differ in kind.
   *
   * @param group as in the header line {@code # group}
   * @param column a column that the wanted kind has and other kinds have not
   * @return the rows, in the order of the files
   */
  public static Stream<Published> ofGroup(String group, Column column) {
    return PublishedFile.all().stream()
        .filter(file -> file.group().equals(group))
        .flatMap(Published::rows)
        .filter(row -> row.has(column));
  }

  private static Stream<Published> rows(PublishedFile file) {
    return file.rows().stream().map(cells -> new Published(file, cells));
  }

  /** Whether the row has a cell in a column. */
  public boolean has(Column column) {
    return cells.containsKey(column.title());
  }

  /** The cell in a column, as printed. */
  public String text(Column column) {
    return cells.get(column.title());
  }

  /** The number in a column, as printed. */
  public double number(Column column) {
    return Double.parseDouble(text(column));
  }

  /** A quantity in the unit that the header names for the column, made inner. */
  public double inner(Column column, Dimension dimension) {
    return dimension.unit(unitOf(column)).orElseThrow().toInner(number(column));
  }

  /** The tolerance as a share. */
  public double tolerance() {
    return number(Column.TOLERANCE) / 100;
  }

  /** The tolerance with the rounding of the arithmetic, for an assertion. */
  public Percentage closeness() {
    return Percentage.withPercentage(number(Column.TOLERANCE) + ROUNDING);
  }

  @Override
  public String toString() {
    return file.entry("source") + ", " + file.entry("locator") + ": " + cells.values();
  }

  private String unitOf(Column column) {
    for (String entry : file.entry("units").split(",")) {
      String pair = entry.strip();
      if (pair.startsWith(column.title() + " ")) {
        return pair.substring(column.title().length() + 1);
      }
    }
    throw new IllegalArgumentException(file.path() + ": no unit for column " + column.title());
  }

  /** The columns that tests read, each titled as its name in lower case. */
  public enum Column {
    /** The id of a wire series. */
    SERIES,
    /** A size as its series writes it. */
    LABEL,
    /** The id of a grade. */
    GRADE,
    /** Wire diameter of a material row. */
    DIAMETER,
    /** Where a law begins to hold. */
    DIAMETER_MIN,
    /** Where a law ceases to hold. */
    DIAMETER_MAX,
    /** Minimum tensile strength. */
    STRENGTH,
    /** Greatest tensile strength. */
    MAXIMUM,
    /** What the strength of a row is apart from that of the shipped one. */
    WIDTH,
    /** E. */
    ELASTIC_MODULUS,
    /** G. */
    SHEAR_MODULUS,
    /** Which modulus is meant, E or G. */
    MODULUS,
    /** The printed value, where its column has no name of its own. */
    VALUE,
    /** Mass per volume. */
    DENSITY,
    /** A coefficient, as the file's locator explains. */
    A,
    /** A coefficient. */
    B,
    /** A coefficient. */
    C,
    /** A coefficient. */
    E,
    /** A coefficient. */
    F,
    /** A coefficient. */
    M,
    /** Wire diameter of a spring. */
    WIRE_DIAMETER,
    /** Mean coil diameter. */
    MEAN_DIAMETER,
    /** Spring index. */
    INDEX,
    /** Active coils. */
    ACTIVE_COILS,
    /** Total coils. */
    TOTAL_COILS,
    /** Coils at the ends that do not deflect. */
    DEAD_COILS,
    /** Free length. */
    FREE_LENGTH,
    /** End type, by its id. */
    ENDS,
    /** Seating, by its id. */
    SEATING,
    /** Stress correction, by its id, or none. */
    CORRECTION,
    /** Force. */
    FORCE,
    /** Deflection. */
    DEFLECTION,
    /** Stress. */
    STRESS,
    /** Angular rate. */
    RATE,
    /** Torque. */
    TORQUE,
    /** Turns of one leg against the other, or of the body. */
    TURNS,
    /** Constant of a rate. */
    CONSTANT,
    /** Whose constant. */
    BASIS,
    /** Coils of the body of a torsion spring. */
    BODY_COILS,
    /** Length of both legs. */
    LEGS,
    /** First natural frequency. */
    FREQUENCY,
    /** Mass. */
    MASS,
    /** Which quantity the value is. */
    QUANTITY,
    /** Coils that a rule adds to the active ones. */
    COILS_BEYOND,
    /** Wire diameters that a rule adds. */
    WIRES,
    /** Class of static allowables. */
    CLASS,
    /** Tolerance [%]. */
    TOLERANCE;

    private String title() {
      return name().toLowerCase(Locale.ROOT);
    }
  }
}
