package coilwright.material;

import coilwright.source.Evidence;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.UnaryOperator;

/**
 * The wire grades and sizes that the program knows, read from the cited tables it ships. A table is
 * read when it is first needed and then kept; not for use by several threads at once.
 */
public final class Catalogue {

  private static final String COMMON_TOLERANCE = "tolerance-en-10218-2";

  private final UnaryOperator<String> textOf;
  private List<String> ids = List.of();
  private final Map<String, Table> tables = new HashMap<>();
  private final Map<String, WireGrade> grades = new HashMap<>();
  private final Map<WireSeries, List<WireSize>> sizes = new EnumMap<>(WireSeries.class);
  private final GradeReader reader = new GradeReader(this::table);

  /**
   * A catalogue over any store of files.
   *
   * @param textOf the contents of the file with a name
   */
  Catalogue(UnaryOperator<String> textOf) {
    this.textOf = textOf;
  }

  /** The catalogue; tables are read when first asked for. */
  public static Catalogue load() {
    return new Catalogue(Catalogue::shipped);
  }

  /**
   * Ids of all grades, in the catalogue's order.
   *
   * @return the ids
   * @throws IllegalStateException naming file, line and column if the file of grades is bad
   */
  public List<String> gradeIds() {
    if (ids.isEmpty()) {
      List<String> read = new ArrayList<>();
      table("grades").rows().forEach(row -> read.add(row.text("id")));
      ids = List.copyOf(read);
    }
    return ids;
  }

  /**
   * Ids of the grades that are tried when a problem file names none; no file but that of the grades
   * is read.
   *
   * @param supply whose steel is wanted
   * @return the ids, in the catalogue's order
   * @throws IllegalStateException naming file, line and column if the file of grades is bad
   */
  public List<String> commonIds(Supply supply) {
    List<String> common = new ArrayList<>();
    for (TableRow row : table("grades").rows()) {
      if (GradeReader.common(row) && GradeReader.supply(row).serves(supply)) {
        common.add(row.text("id"));
      }
    }
    return common;
  }

  /**
   * The grade with an id.
   *
   * @param id one of {@link #gradeIds()}
   * @return the grade
   * @throws IllegalArgumentException if there is none
   * @throws IllegalStateException naming file, line and column if a file of the grade is bad
   */
  public WireGrade grade(String id) {
    if (!gradeIds().contains(id)) {
      throw new IllegalArgumentException(
          "no wire grade \"" + id + "\"; there are " + String.join(", ", gradeIds()));
    }
    return grades.computeIfAbsent(id, this::read);
  }

  /**
   * The sizes of a series, rising.
   *
   * @param series the series
   * @return its sizes
   * @throws IllegalStateException naming file, line and column if the file of the series is bad
   */
  public List<WireSize> sizes(WireSeries series) {
    return sizes.computeIfAbsent(series, key -> SizeReader.read(key, rows(key)));
  }

  /**
   * Where each size of a series comes from.
   *
   * @param series the series
   * @return one line for each of {@link #sizes}, in the same order
   */
  public List<String> sizeSources(WireSeries series) {
    return rows(series).stream().map(TableRow::place).toList();
  }

  private List<TableRow> rows(WireSeries series) {
    return SizeReader.rising(series.files().stream().map(this::table).toList());
  }

  /**
   * The diameter tolerance that stands for wire whose own is not known.
   *
   * @return the tolerance of EN 10218-2, whose table covers the most sizes, taken as remembered
   * @throws IllegalStateException naming file, line and column if its file is bad
   */
  public ToleranceLaw commonTolerance() {
    return GradeTolerance.of(table(COMMON_TOLERANCE), Evidence.MEMORY).law();
  }

  /** Where {@link #commonTolerance()} comes from. */
  public GradeSource commonToleranceSource() {
    return GradeTolerance.of(table(COMMON_TOLERANCE), Evidence.MEMORY).source();
  }

  /**
   * Whether a buyer may take one grade for another: they are the same, or a pair that the table of
   * equivalents names. Pairs do not chain.
   *
   * @param id a grade
   * @param other another
   * @return whether they are equivalent
   * @throws IllegalStateException naming file, line and column if the file of equivalents is bad
   */
  public boolean equivalent(String id, String other) {
    if (id.equals(other)) {
      return true;
    }
    for (TableRow row : table("equivalents").rows()) {
      String first = row.text("grade");
      String second = row.text("other");
      if (first.equals(id) && second.equals(other) || first.equals(other) && second.equals(id)) {
        return true;
      }
    }
    return false;
  }

  /**
   * A table as the file holds it.
   *
   * @param name the file's name without ".csv"
   * @return the table
   */
  Table table(String name) {
    return tables.computeIfAbsent(name, key -> Table.of(key + ".csv", textOf.apply(key + ".csv")));
  }

  private WireGrade read(String id) {
    List<TableRow> rows = table("grades").rowsOf("id", id);
    if (rows.size() > 1) {
      throw rows.get(1).fault("id", "found \"" + id + "\" a second time");
    }
    return reader.read(rows.get(0));
  }

  /**
   * The contents of a file that ships with the program.
   *
   * @param file its name
   * @return its text
   * @throws IllegalStateException if it does not ship
   */
  static String shipped(String file) {
    try (InputStream in = Catalogue.class.getResourceAsStream(file)) {
      if (in == null) {
        throw new IllegalStateException("catalogue file " + file + " is missing");
      }
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException("catalogue file " + file + " cannot be read", e);
    }
  }
}
