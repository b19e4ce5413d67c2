package coilwright.spring;

import coilwright.material.ShippedNumbers;
import coilwright.source.Citation;
import coilwright.unit.Require;
import java.util.ArrayList;
import java.util.List;

/**
 * What the diameter of a coil may deviate by: EN 15800, grade 2, for cold-coiled compression
 * springs. The table is read when it is first asked for.
 */
public final class CoilTolerance {

  private static final List<String> COLUMNS =
      List.of("up_to", "index_4_to_8", "index_8_to_14", "index_14_to_20");
  private static final double[] INDEX_STEPS = {8, 14};

  /** A diameter this little above a row's bound still belongs to the row [-]. */
  private static final double ROUNDING = 1e-12;

  /** Holds the table, so that it is read only once and only when needed. */
  private static final class Grade2 {
    static final ShippedNumbers TABLE =
        ShippedNumbers.lengths(CoilTolerance.class, "coil-diameter-en-15800-grade-2.csv", COLUMNS);
  }

  private CoilTolerance() {}

  /** Where the table is published. */
  public static Citation citation() {
    return Grade2.TABLE.citation();
  }

  /**
   * The deviation either way. Above 200 mm mean diameter the last row holds, below the table the
   * first.
   *
   * @param meanDiameter D [mm]
   * @param wireDiameter d [mm]
   * @return the deviation, plus or minus [mm]
   * @throws IllegalArgumentException if a diameter is not positive and finite
   */
  public static double of(double meanDiameter, double wireDiameter) {
    double mean = Require.positive(meanDiameter, "mean diameter", "mm");
    double index = (1 - ROUNDING) * mean / Require.positive(wireDiameter, "wire diameter", "mm");
    int column = index <= INDEX_STEPS[0] ? 1 : index <= INDEX_STEPS[1] ? 2 : 3;
    List<double[]> rows = Grade2.TABLE.rows();
    for (double[] row : rows) {
      if ((1 - ROUNDING) * mean <= row[0]) {
        return row[column];
      }
    }
    return rows.get(rows.size() - 1)[column];
  }

  /** The greatest deviation of all, either way [mm]. */
  public static double greatest() {
    return of(Double.MAX_VALUE, 1);
  }

  /**
   * The mean diameters near one at which the deviation of a wire's coil steps up.
   *
   * @param meanDiameter D [mm]
   * @param wireDiameter d [mm]
   * @return the diameters [mm] that lie within twice the greatest deviation there
   */
  public static double[] stepsNear(double meanDiameter, double wireDiameter) {
    double near = 2 * of(2 * meanDiameter, meanDiameter / 100);
    return stepsBetween(meanDiameter - near, meanDiameter + near, wireDiameter);
  }

  /**
   * The mean diameters between two at which the deviation of a wire's coil steps up.
   *
   * @param from the smaller mean diameter [mm]
   * @param to the greater [mm]
   * @param wireDiameter d [mm]
   * @return the diameters [mm], the two included
   */
  public static double[] stepsBetween(double from, double to, double wireDiameter) {
    List<Double> steps = new ArrayList<>();
    for (double[] row : Grade2.TABLE.rows()) {
      steps.add(row[0]);
    }
    for (double index : INDEX_STEPS) {
      steps.add(index * wireDiameter);
    }
    return steps.stream()
        .mapToDouble(Double::doubleValue)
        .filter(step -> step >= from && step <= to)
        .toArray();
  }
}
