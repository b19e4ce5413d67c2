package coilwright.spring;

import java.util.OptionalDouble;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;

/**
 * A spring as a column that bends, shears and shortens, after Haringx: the load crosses a leaning
 * section at its own angle, and what is left of the column carries stiffness in proportion to its
 * length.
 *
 * <p>Along the pressed column y' = psi + (V + F psi)/S, B psi' = M, M' = -V - F y', with the
 * lateral force V the same everywhere. It buckles where the conditions at both ends leave a
 * solution that is not zero, found by shooting from one end.
 */
final class HaringxColumn {

  private static final int STEPS = 100;
  private static final int SCAN = 400;

  private static final double[] TILT = {0, 1, 0, 0};
  private static final double[] MOMENT = {0, 0, 1, 0};
  private static final double[] SIDE_FORCE = {0, 0, 0, 1};

  private final double freeLength;

  /**
   * Movement of all the coils together per unit of an axial force, a tilting moment, a side force.
   */
  private final double axial;

  private final double tilting;
  private final double sideways;

  /**
   * A column of round wire whose turns are taken for flat, as in the law; what its turns give way
   * is summed along the wire in space.
   *
   * @param coils active coils n [-]
   * @param freeLength L0 [mm]
   * @param turn one flat turn
   */
  HaringxColumn(double coils, double freeLength, CoilFlexibility turn) {
    this.freeLength = freeLength;
    this.axial = coils * turn.underLoad(Vector3D.PLUS_K, Vector3D.ZERO).twist();
    CoilFlexibility.Parts tilt = turn.underLoad(Vector3D.ZERO, Vector3D.PLUS_I);
    this.tilting = coils * (tilt.twist() + tilt.bend());
    this.sideways = coils * turn.underLoad(Vector3D.PLUS_I, Vector3D.ZERO).bend();
  }

  /**
   * The least deflection at which the column buckles, as a share of L0; empty where there is none.
   */
  OptionalDouble critical(Seating seating) {
    UnivariateFunction closing = share -> closing(share, seating);
    double from = 1e-6;
    for (int i = 1; i < SCAN; i++) {
      double to = (double) i / SCAN;
      if (closing.value(from) * closing.value(to) <= 0) {
        return OptionalDouble.of(new BrentSolver(1e-13).solve(100, closing, from, to));
      }
      from = to;
    }
    return OptionalDouble.empty();
  }

  /**
   * Zero where what the near end leaves open can meet the far end's conditions: no sideways
   * movement and no tilt or no moment; at a free end no moment, there being no side force.
   */
  private double closing(double share, Seating seating) {
    double length = freeLength * (1 - share);
    Rigidity column = new Rigidity(length / tilting, length / sideways, freeLength * share / axial);
    double[] first = seating == Seating.PINNED_PINNED ? TILT : MOMENT;
    double[] one = shoot(column, length, first);
    if (seating == Seating.FIXED_FREE) {
      return one[2];
    }
    double[] other = shoot(column, length, SIDE_FORCE);
    int held = seating == Seating.FIXED_FIXED ? 1 : 2;
    return one[0] * other[held] - one[held] * other[0];
  }

  /** Runge-Kutta along the column from {y, psi, M, V}. */
  private static double[] shoot(Rigidity column, double length, double[] start) {
    double[] state = start;
    double step = length / STEPS;
    for (int i = 0; i < STEPS; i++) {
      double[] k1 = column.slopes(state);
      double[] k2 = column.slopes(moved(state, k1, step / 2));
      double[] k3 = column.slopes(moved(state, k2, step / 2));
      double[] k4 = column.slopes(moved(state, k3, step));
      double[] mean = new double[4];
      for (int j = 0; j < 4; j++) {
        mean[j] = (k1[j] + 2 * k2[j] + 2 * k3[j] + k4[j]) / 6;
      }
      state = moved(state, mean, step);
    }
    return state;
  }

  private static double[] moved(double[] state, double[] slopes, double by) {
    double[] moved = new double[state.length];
    for (int j = 0; j < state.length; j++) {
      moved[j] = state[j] + by * slopes[j];
    }
    return moved;
  }

  /**
   * The pressed column.
   *
   * @param bending B [N mm^2]
   * @param shear S [N]
   * @param load F [N]
   */
  private record Rigidity(double bending, double shear, double load) {

    private double[] slopes(double[] state) {
      double lean = state[1] + (state[3] + load * state[1]) / shear;
      return new double[] {lean, state[2] / bending, -state[3] - load * lean, 0};
    }
  }
}
