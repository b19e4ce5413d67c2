package coilwright.material;

import coilwright.source.Evidence;
import java.util.ArrayList;
import java.util.List;

/** Step tables from numbers that the user gives; all of them count as seen. */
final class OwnSteps {

  private OwnSteps() {}

  /**
   * One step without end.
   *
   * @param mpa the value [MPa]
   * @return the table
   */
  static StepTable constant(double mpa) {
    return of(new double[] {Double.POSITIVE_INFINITY}, new double[] {mpa});
  }

  /**
   * The steps.
   *
   * @param upTo the diameters, rising [mm]
   * @param value the value of each step [MPa], as many
   * @return the table
   * @throws IllegalArgumentException if the arrays differ in length, are empty, do not rise or hold
   *     what is not positive
   */
  static StepTable of(double[] upTo, double[] value) {
    if (upTo.length != value.length) {
      throw new IllegalArgumentException(
          upTo.length + " diameters do not go with " + value.length + " values");
    }
    List<DiameterRow> rows = new ArrayList<>();
    for (int i = 0; i < upTo.length; i++) {
      rows.add(new DiameterRow(upTo[i], value[i], Evidence.SEEN));
    }
    return new StepTable(rows);
  }
}
