/**
 * What the repository shows of the program: the files under {@code results/} and the output and
 * tables quoted in README.md. {@link coilwright.docs.Regenerate} writes them, tests hold them.
 */
package coilwright.docs;
