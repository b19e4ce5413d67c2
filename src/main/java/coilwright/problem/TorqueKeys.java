package coilwright.problem;

import coilwright.spring.Kind;
import coilwright.unit.Dimension;
import coilwright.unit.Quantity;
import java.util.List;

/** The keys about the straight line of torque against angle, of torsion springs. */
final class TorqueKeys {

  static final ProblemKey<Double> ANGLE =
      of(
          "loads[].angle",
          Values.quantity(Dimension.ANGLE, Range.ANY),
          "",
          "angle under the load, counted in the winding direction from any one reference",
          "30 deg",
          "120 deg");

  static final ProblemKey<Double> TORQUE =
      of(
          "loads[].torque",
          Values.quantity(Dimension.TORQUE, Range.ABOVE_ZERO),
          "",
          "torque of the load, or force and arm; torque or angle may be left out where other facts"
              + " give it",
          "150 N*mm",
          "600 N*mm");

  static final ProblemKey<Double> FORCE =
      of(
          "loads[].force",
          Values.quantity(Dimension.FORCE, Range.ABOVE_ZERO),
          "torque is given",
          "force at an arm, instead of torque",
          "7.5 N");

  static final ProblemKey<Double> ARM =
      of("loads[].arm", Values.length(), "torque is given", "arm at which the force acts", "20 mm");

  static final ProblemKey<ToleranceAsked> TOLERANCE =
      of(
          "loads[].tolerance",
          new ToleranceReader(Dimension.TORQUE),
          "nothing is asked",
          "what the buyer accepts around the torque",
          "10 %",
          "{plus: 30 N*mm, minus: 20 N*mm}");

  static final ProblemKey<Quantity> PLUS =
      of(
          "loads[].tolerance.plus",
          new QuantityReader(Range.FROM_ZERO, Dimension.TORQUE, Dimension.SHARE),
          "",
          "how far above the torque",
          "30 N*mm");

  static final ProblemKey<Quantity> MINUS =
      of(
          "loads[].tolerance.minus",
          new QuantityReader(Range.FROM_ZERO, Dimension.TORQUE, Dimension.SHARE),
          "",
          "how far below the torque",
          "20 N*mm");

  static final ProblemKey<Boolean> LOADING =
      of(
          "loading",
          new WordReader<>(List.of(true, false), closing -> closing ? "closing" : "opening"),
          "closing",
          "whether the loads wind the spring up or unwind it",
          "closing");

  static final ProblemKey<Double> RATE =
      of(
          "rate",
          Values.quantity(Dimension.ANGULAR_RATE, Range.ABOVE_ZERO),
          LoadKeys.RATE.omitted(),
          LoadKeys.RATE.help(),
          "5 N*mm/deg");

  static final ProblemKey<Double> FREE_ANGLE =
      of(
          "free_angle",
          Values.quantity(Dimension.ANGLE, Range.ANY),
          "follows from the loads",
          "likewise: the angle without torque, in the loads' reference",
          "0 deg");

  static final ProblemKey<Double> STROKE =
      of(
          "stroke",
          Values.quantity(Dimension.ANGLE, Range.ABOVE_ZERO),
          "follows from the loads",
          "from the least load to the greatest; the loads need no angles then",
          "90 deg");

  /** All of them. */
  static final List<ProblemKey<?>> ROWS =
      List.of(ANGLE, TORQUE, FORCE, ARM, TOLERANCE, PLUS, MINUS, LOADING, RATE, FREE_ANGLE, STROKE);

  private TorqueKeys() {}

  private static <T> ProblemKey<T> of(
      String path, ValueReader<T> reader, String omitted, String help, String... examples) {
    return ProblemKey.of(path, reader, omitted, help, examples).only(Kind.TORSION);
  }
}
