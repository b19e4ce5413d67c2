/**
 * Wire: the grades, how strong, stiff, heavy and dear each is, and the sizes it is drawn to.
 *
 * <p>Its nouns are {@link coilwright.material.WireGrade} and {@link coilwright.material.Wire}, a
 * grade drawn to a size; {@link coilwright.material.Catalogue} holds those that the program ships,
 * one cited table to a file, in the publication's own units and order. May import {@code source}
 * and {@code unit}.
 *
 * <p>It exists so that a number about wire has one place, a publication and a word on whether it
 * was seen there; no other room knows a strength or a gauge.
 */
package coilwright.material;
