/**
 * Every wire's family against every limit.
 *
 * <p>Its nouns are {@link coilwright.search.Candidate}, a rounded spring that was judged afresh and
 * holds, {@link coilwright.search.Conflict}, the limits that leave a wire none, and the {@link
 * coilwright.search.Answer} of both. It may import {@code limit} and the rooms below it.
 *
 * <p>It exists because an empty list helps nobody: a wire either yields candidates or says which
 * limits cannot hold together.
 */
package coilwright.search;
