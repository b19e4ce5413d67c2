package coilwright.material;

import coilwright.source.Citation;
import coilwright.unit.Dimension;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;

/**
 * The lengths in a published table that ships with the program, held to the same rules as the
 * tables of wire: a source and its evidence for every row, units in the header.
 *
 * @param citation the publication and the place in it
 * @param rows one array for each row, with a length for each column asked for [mm]
 */
public record ShippedNumbers(Citation citation, List<double[]> rows) {

  /** Copies the list. */
  public ShippedNumbers {
    rows = List.copyOf(rows);
  }

  /**
   * Reads a table.
   *
   * @param beside a class of the package that the file ships with
   * @param file the file's name
   * @param columns the columns wanted
   * @return their lengths
   * @throws IllegalStateException naming file, line and column if the file is missing or bad
   */
  public static ShippedNumbers lengths(Class<?> beside, String file, List<String> columns) {
    Table table = Table.of(file, text(beside, file));
    return new ShippedNumbers(
        table.rows().get(0).citation(),
        table.rows().stream().map(row -> lengths(row, columns)).toList());
  }

  private static double[] lengths(TableRow row, List<String> columns) {
    double[] lengths = new double[columns.size()];
    for (int i = 0; i < lengths.length; i++) {
      lengths[i] = row.quantity(columns.get(i), Dimension.LENGTH);
    }
    return lengths;
  }

  private static String text(Class<?> beside, String file) {
    try (InputStream in = beside.getResourceAsStream(file)) {
      if (in == null) {
        throw new IllegalStateException("file " + file + " is missing");
      }
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException("file " + file + " cannot be read", e);
    }
  }
}
