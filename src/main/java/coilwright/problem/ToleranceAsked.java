package coilwright.problem;

import coilwright.unit.Dimension;
import coilwright.unit.Quantity;

/**
 * A tolerance as the file gives it, in newtons or as a share of the force.
 *
 * @param plus how far above the force
 * @param minus how far below it
 */
record ToleranceAsked(Quantity plus, Quantity minus) {

  /**
   * The tolerance of a force.
   *
   * @param force F [N]
   * @return how far above and below it [N]
   */
  Tolerance of(double force) {
    return new Tolerance(newtons(plus, force), newtons(minus, force));
  }

  private static double newtons(Quantity part, double force) {
    return part.dimension() == Dimension.SHARE ? part.inner() * force : part.inner();
  }
}
