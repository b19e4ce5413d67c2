package coilwright.limit;

import coilwright.problem.LimitName;
import coilwright.unit.Dimension;

/**
 * What one bound asks, apart from any spring.
 *
 * @param limit the limit's name
 * @param side which way the bound cuts
 * @param dimension what kind of quantity is judged
 * @param definition which of several possible quantities is meant, in words
 */
public record Check(LimitName limit, Side side, Dimension dimension, String definition) {}
