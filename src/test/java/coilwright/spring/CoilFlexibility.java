package coilwright.spring;

import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;

/**
 * What a turn of a coil gives way under a load, by the unit-load method: the strain energy of a
 * thin rod, summed along the wire in space.
 *
 * @param coil the centre line
 * @param wireDiameter d [mm]
 * @param shearModulus G [MPa]
 * @param elasticModulus E [MPa]
 */
record CoilFlexibility(
    Helix coil, double wireDiameter, double shearModulus, double elasticModulus) {

  private static final int STATIONS = 360;

  /** Shear energy of a round section over that of an even shear: parabola across the section. */
  private static final double SHEAR_SHAPE = 10.0 / 9;

  /**
   * Movement per unit of load of one turn, in the load's own direction.
   *
   * @param twist by torsion of the wire
   * @param bend by bending of the wire
   * @param stretch by tension along the wire
   * @param slide by shear across the wire
   */
  record Parts(double twist, double bend, double stretch, double slide) {

    double sum() {
      return twist + bend + stretch + slide;
    }

    private Parts plus(Parts more) {
      return new Parts(
          twist + more.twist, bend + more.bend, stretch + more.stretch, slide + more.slide);
    }
  }

  /**
   * The movement of one turn under a force on the axis together with a moment.
   *
   * @param force [N]
   * @param moment [N mm]
   */
  Parts underLoad(Vector3D force, Vector3D moment) {
    Parts sum = new Parts(0, 0, 0, 0);
    for (int i = 0; i < STATIONS; i++) {
      sum = sum.plus(at((i + 0.5) / STATIONS, force, moment));
    }
    return sum;
  }

  /** One station of the midpoint rule, which is exact to rounding for what repeats every turn. */
  private Parts at(double turn, Vector3D force, Vector3D moment) {
    Vector3D place = coil.at(turn);
    Vector3D arm = new Vector3D(-place.getX(), -place.getY(), 0);
    Vector3D here = arm.crossProduct(force).add(moment);
    Vector3D along = coil.tangent(turn);
    double torsion = here.dotProduct(along);
    double bending = here.getNormSq() - torsion * torsion;
    double tension = force.dotProduct(along);
    double shear = force.getNormSq() - tension * tension;
    double wire = coil.velocity(turn).getNorm() / STATIONS;
    double area = Math.PI / 4 * Math.pow(wireDiameter, 2);
    double inertia = Math.PI / 64 * Math.pow(wireDiameter, 4);
    return new Parts(
        wire * torsion * torsion / (shearModulus * 2 * inertia),
        wire * bending / (elasticModulus * inertia),
        wire * tension * tension / (elasticModulus * area),
        wire * SHEAR_SHAPE * shear / (shearModulus * area));
  }
}
