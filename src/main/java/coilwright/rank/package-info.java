/**
 * Orders of candidates, and the cost proxy that one of them uses. May import {@code search} and
 * everything below it: what is best is a choice over what was found, never part of finding it.
 */
package coilwright.rank;
