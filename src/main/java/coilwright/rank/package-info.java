/**
 * Orders of candidates, the cost proxy that one of them uses, and the lines of a list: springs that
 * are alike in one, and no material in too many. May import {@code search} and everything below it:
 * what is best is a choice over what was found, never part of finding it.
 */
package coilwright.rank;
