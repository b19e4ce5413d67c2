/**
 * The problem file: read into a {@link coilwright.problem.Problem}, or every fault in it.
 *
 * <p>A file passes three gates. {@code SourceText} turns its bytes into text, {@code Document}
 * walks once over parser events and builds {@code Node}s with their places, and {@code
 * ProblemReader} reads those key by key. Every key is one row of {@code KeyTable}, or one for each
 * kind of spring: from it come the keys accepted, the hints, the starter files, the forms of the
 * schema and the table in the README. {@code KindPeek} finds the kind first. Readers report what is
 * wrong to {@code Faults}, return what they can and never throw.
 *
 * <p>It may import {@code spring}, {@code material}, {@code source} and {@code unit}, and parser
 * events of YAML and JSON; data binding is left out, as it stops at the first fault and has no
 * lines to point at.
 */
package coilwright.problem;
