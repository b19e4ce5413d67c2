package coilwright.spring;

import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;

/**
 * The centre line of a coil as points in space. Its length and direction are found from the points,
 * not from the formulas of a helix.
 *
 * @param radius R [mm]
 * @param pitch rise of a turn [mm]
 * @param turns how many [-]
 */
record Helix(double radius, double pitch, double turns) {

  private static final double STEP = 1e-4;

  /** The point after some turns [mm]. */
  Vector3D at(double turn) {
    double angle = 2 * Math.PI * turn;
    return new Vector3D(radius * Math.cos(angle), radius * Math.sin(angle), pitch * turn);
  }

  /**
   * Change of the point with turns, by central differences of fourth order [mm per turn]; its norm
   * is the wire of a turn.
   */
  Vector3D velocity(double turn) {
    Vector3D near = at(turn + STEP).subtract(at(turn - STEP));
    Vector3D far = at(turn + 2 * STEP).subtract(at(turn - 2 * STEP));
    return near.scalarMultiply(8).subtract(far).scalarMultiply(1 / (12 * STEP));
  }

  /** Direction of the wire. */
  Vector3D tangent(double turn) {
    return velocity(turn).normalize();
  }

  /** Sum of chords, the error of the first order taken off by halving the chords once [mm]. */
  double length() {
    int chords = (int) Math.ceil(720 * turns);
    double coarse = chords(chords);
    double fine = chords(2 * chords);
    return fine + (fine - coarse) / 3;
  }

  private double chords(int count) {
    double sum = 0;
    Vector3D from = at(0);
    for (int i = 1; i <= count; i++) {
      Vector3D to = at(turns * i / count);
      sum += to.distance(from);
      from = to;
    }
    return sum;
  }
}
