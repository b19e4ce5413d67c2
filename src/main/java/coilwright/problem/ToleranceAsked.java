package coilwright.problem;

import coilwright.unit.Dimension;
import coilwright.unit.Quantity;

/**
 * A tolerance as the file gives it, as a force or torque or as a share of it.
 *
 * @param plus how far above the load
 * @param minus how far below it
 */
record ToleranceAsked(Quantity plus, Quantity minus) {

  /**
   * The tolerance of a load.
   *
   * @param load the force [N] or torque [N mm]
   * @return how far above and below it, likewise
   */
  Tolerance of(double load) {
    return new Tolerance(inner(plus, load), inner(minus, load));
  }

  private static double inner(Quantity part, double load) {
    return part.dimension() == Dimension.SHARE ? part.inner() * load : part.inner();
  }
}
