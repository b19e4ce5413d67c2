package coilwright.limit;

import coilwright.problem.LimitName;
import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.spring.TorsionState;
import coilwright.unit.Dimension;

/**
 * The angle between the legs of a given spring against the angle asked, within what a shop keeps.
 *
 * @param asked the angle asked [rad]
 * @param load the load at which it is asked, the first being 1
 */
record LegAngleBound(double asked, int load) implements Limit<TorsionState> {

  private static final Check CHECK =
      new Check(
          LimitName.LEG_ANGLE,
          Side.MAX,
          Dimension.ANGLE,
          "difference from the angle asked at its load, against a shop's tolerance of end positions");
  private static final Citation SOURCE =
      Citation.remembered(
          Source.COMMON_PRACTICE, "position of ends, 5 to 30 deg by the number of coils");

  private static final double[] UP_TO_COILS = {5, 10, 20};
  private static final double[] DEGREES = {5, 10, 15, 30};
  private static final double TURN = 2 * Math.PI;

  @Override
  public Check check() {
    return CHECK;
  }

  @Override
  public Finding judge(TorsionState state) {
    double apart = Math.abs(state.legAngleAt(load) - asked) % TURN;
    return Finding.of(CHECK, Math.min(apart, TURN - apart), tolerance(state.coils()), SOURCE);
  }

  private static double tolerance(double coils) {
    int row = 0;
    while (row < UP_TO_COILS.length && coils > UP_TO_COILS[row]) {
      row++;
    }
    return Math.toRadians(DEGREES[row]);
  }
}
