package coilwright.problem;

import java.util.List;
import java.util.OptionalDouble;

/**
 * The keys of facts about a load line beside its loads.
 *
 * @param rate the rate
 * @param zero the place without load; empty where that is no fact about the line
 * @param stroke between the least and the greatest load
 * @param remedy which facts fix a line, for a message
 */
record LineKeys(
    ProblemKey<Double> rate,
    List<ProblemKey<Double>> zero,
    ProblemKey<Double> stroke,
    String remedy) {

  /** Of a compression spring. */
  static final LineKeys COMPRESSION =
      new LineKeys(
          LoadKeys.RATE,
          List.of(LoadKeys.FREE_LENGTH),
          LoadKeys.STROKE,
          "must be two loads at lengths; or one, and rate, free_length or a second force and"
              + " stroke; or rate and free_length; or no length at all, and rate or stroke");

  /** Of an extension spring: with an initial tension, its free length does not fix the line. */
  static final LineKeys EXTENSION =
      new LineKeys(
          LoadKeys.RATE,
          List.of(),
          LoadKeys.STROKE,
          "must be two loads at lengths; or one, and rate or a second force and stroke; or no"
              + " length at all, and rate or two forces and stroke");

  /** Of a torsion spring. */
  static final LineKeys TORSION =
      new LineKeys(
          TorqueKeys.RATE,
          List.of(TorqueKeys.FREE_ANGLE),
          TorqueKeys.STROKE,
          "must be two loads at angles; or one, and rate, free_angle or a second torque and"
              + " stroke; or rate and free_angle; or no angle at all, and rate or stroke");

  /** Whether a fact is, as far as can be told, given misspelt. */
  boolean misspeltIn(Section root) {
    return root.misspells(rate)
        || root.misspells(stroke)
        || zero.stream().anyMatch(root::misspells);
  }

  /**
   * Reads the facts.
   *
   * @param root the file
   * @return the facts
   */
  LineFacts read(Section root) {
    return new LineFacts(
        root.number(rate),
        zero.isEmpty() ? OptionalDouble.empty() : root.number(zero.get(0)),
        root.number(stroke));
  }
}
