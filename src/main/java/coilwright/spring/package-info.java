/**
 * What a spring is and how it behaves: pure functions, each with its source.
 *
 * <p>Its nouns are {@link coilwright.spring.CompressionSpring}, the {@link
 * coilwright.spring.LoadLine} it must follow, the {@link coilwright.spring.Family} of springs that
 * one wire offers on that line, and the {@link coilwright.spring.State} of one of them at all its
 * loads. It may import {@code material}, {@code source} and {@code unit}.
 *
 * <p>It exists because on a given load line a wire leaves only the number of coils open: every
 * number of a spring is a function of that one, computed here and nowhere else.
 */
package coilwright.spring;
