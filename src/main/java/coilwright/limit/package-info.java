/**
 * Design limits, one at a time.
 *
 * <p>Its nouns are {@link coilwright.limit.Limit}, the {@link coilwright.limit.Finding} that it
 * makes of one spring, and the {@link coilwright.limit.CoilSet} of coil counts that it leaves along
 * a family. It may import {@code problem} and the rooms below it, and the root finders of Commons
 * Math.
 *
 * <p>It exists so that a limit is written once: ranges of coils are the roots of the same margin
 * that judges a finished spring, and so cannot disagree with it.
 */
package coilwright.limit;
