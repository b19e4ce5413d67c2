package coilwright.problem;

import java.util.List;

/**
 * A table of steps by wire diameter.
 *
 * @param upTo the greatest diameter of each step, rising [mm]
 * @param values the value of each step, as many
 */
record Steps(List<Double> upTo, List<Double> values) {

  /** Copies the lists. */
  Steps {
    upTo = List.copyOf(upTo);
    values = List.copyOf(values);
  }

  /** The greatest diameter of each step [mm]. */
  double[] diameters() {
    return upTo.stream().mapToDouble(Double::doubleValue).toArray();
  }

  /** The value of each step. */
  double[] heights() {
    return values.stream().mapToDouble(Double::doubleValue).toArray();
  }

  /** Where the table ends [mm]. */
  double end() {
    return upTo.get(upTo.size() - 1);
  }
}
