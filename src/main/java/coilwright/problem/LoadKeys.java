package coilwright.problem;

import coilwright.spring.Kind;
import coilwright.unit.Dimension;
import coilwright.unit.Quantity;
import java.util.List;

/**
 * The keys about the straight line of force against length, of compression and extension springs.
 */
final class LoadKeys {

  private static final Kind[] STRAIGHT = {Kind.COMPRESSION, Kind.EXTENSION};

  static final ProblemKey<List<Section>> LOADS =
      ProblemKey.of(
          "loads",
          new SectionListReader("loads[]"),
          "",
          "facts about the load line: any two independent ones fix it");

  static final ProblemKey<Double> LENGTH =
      ProblemKey.of(
              "loads[].length",
              Values.length(),
              "",
              "length under the load; length or force may be left out where other facts give it",
              "32 mm",
              "22 mm")
          .only(Kind.COMPRESSION);

  static final ProblemKey<Double> LENGTH_INSIDE_HOOKS =
      ProblemKey.of(
              "loads[].length",
              Values.length(),
              "",
              "length under the load, inside the hooks; length or force may be left out where other facts"
                  + " give it",
              "50 mm",
              "65 mm")
          .only(Kind.EXTENSION);

  static final ProblemKey<Double> FORCE =
      ProblemKey.of(
              "loads[].force",
              Values.quantity(Dimension.FORCE, Range.ABOVE_ZERO),
              "",
              "force at that length",
              "18 N",
              "45 N")
          .only(STRAIGHT);

  static final ProblemKey<ToleranceAsked> TOLERANCE =
      ProblemKey.of(
              "loads[].tolerance",
              new ToleranceReader(Dimension.FORCE),
              "nothing is asked",
              "what the buyer accepts around the force",
              "10 %",
              "{plus: 3 N, minus: 2 N}")
          .only(STRAIGHT);

  static final ProblemKey<Quantity> PLUS =
      ProblemKey.of(
              "loads[].tolerance.plus",
              new QuantityReader(Range.FROM_ZERO, Dimension.FORCE, Dimension.SHARE),
              "",
              "how far above the force",
              "3 N")
          .only(STRAIGHT);

  static final ProblemKey<Quantity> MINUS =
      ProblemKey.of(
              "loads[].tolerance.minus",
              new QuantityReader(Range.FROM_ZERO, Dimension.FORCE, Dimension.SHARE),
              "",
              "how far below the force",
              "2 N")
          .only(STRAIGHT);

  static final ProblemKey<Double> RATE =
      ProblemKey.of(
              "rate",
              Values.quantity(Dimension.RATE, Range.ABOVE_ZERO),
              "follows from the loads",
              "another fact about the load line; must agree with the others within 0.1 %",
              "2.7 N/mm")
          .only(Kind.COMPRESSION);

  static final ProblemKey<Double> FREE_LENGTH =
      ProblemKey.of(
              "free_length",
              Values.length(),
              "follows from the loads",
              "likewise: the length without load",
              "38.67 mm")
          .only(Kind.COMPRESSION);

  static final ProblemKey<Double> FREE_LENGTH_INSIDE_HOOKS =
      ProblemKey.of(
              "free_length",
              Values.length(),
              "follows from body and hooks",
              "length without load, inside the hooks; only where make.hook_length is free",
              "45 mm")
          .only(Kind.EXTENSION);

  static final ProblemKey<Double> STROKE =
      ProblemKey.of(
              "stroke",
              Values.length(),
              "follows from the loads",
              "from the least load to the greatest; without lengths the shortest are found",
              "10 mm")
          .only(Kind.COMPRESSION);

  static final ProblemKey<Section> OVERTRAVEL =
      ProblemKey.of(
              "overtravel",
              new SectionReader("overtravel"),
              "none",
              "assembly or abuse beyond the loads: stress, solid, buckling hold",
              "{length: 20 mm}")
          .only(Kind.COMPRESSION);

  static final ProblemKey<Section> OVERTRAVEL_PULLED =
      ProblemKey.of(
              "overtravel",
              new SectionReader("overtravel"),
              "none",
              "assembly or abuse beyond the loads: stress, extended length hold",
              "{length: 70 mm}")
          .only(Kind.EXTENSION);

  static final ProblemKey<Double> OVERTRAVEL_LENGTH =
      ProblemKey.of(
              "overtravel.length",
              Values.length(),
              "",
              "length it is pressed to; no force",
              "20 mm")
          .only(Kind.COMPRESSION);

  static final ProblemKey<Double> OVERTRAVEL_PULLED_LENGTH =
      ProblemKey.of(
              "overtravel.length",
              Values.length(),
              "",
              "length inside the hooks it is pulled to; no force",
              "70 mm")
          .only(Kind.EXTENSION);

  static final ProblemKey<Integer> SPRINGS_IN_PARALLEL =
      ProblemKey.of(
          "springs_in_parallel",
          Values.count(),
          "1",
          "equal springs side by side that share the loads and the rate",
          "1");

  /** All of them but the last. */
  static final List<ProblemKey<?>> ROWS =
      List.of(
          LOADS,
          LENGTH,
          LENGTH_INSIDE_HOOKS,
          FORCE,
          TOLERANCE,
          PLUS,
          MINUS,
          RATE,
          RATE.only(Kind.EXTENSION).shown("1.8 N/mm"),
          FREE_LENGTH,
          FREE_LENGTH_INSIDE_HOOKS,
          STROKE,
          STROKE.only(Kind.EXTENSION).shown("15 mm"),
          OVERTRAVEL,
          OVERTRAVEL_PULLED,
          OVERTRAVEL_LENGTH,
          OVERTRAVEL_PULLED_LENGTH);

  private LoadKeys() {}
}
