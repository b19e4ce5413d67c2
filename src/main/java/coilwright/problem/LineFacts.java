package coilwright.problem;

import java.util.OptionalDouble;

/**
 * Facts about a load line beside its loads, for the whole group of springs.
 *
 * @param rate R [N/mm or N mm/rad], where given
 * @param zero the place without load [mm or rad], where given
 * @param stroke between the least and the greatest load, likewise, where given
 */
record LineFacts(OptionalDouble rate, OptionalDouble zero, OptionalDouble stroke) {}
