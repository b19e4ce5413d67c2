package coilwright.problem;

import java.util.OptionalDouble;

/**
 * The straight legs of a torsion spring.
 *
 * @param first length of the first [mm], zero or more
 * @param second length of the second [mm], zero or more
 * @param angle from the first leg to the second, seen along the axis and counted in the winding
 *     direction, wanted at a load [rad]; empty where none is asked
 * @param atLoad the load at which it is wanted, the first load being 1
 */
public record LegsAsked(double first, double second, OptionalDouble angle, int atLoad) {}
