/**
 * Publications: what the program relies on, the place in it, and whether that place was seen.
 *
 * <p>Its noun is {@link coilwright.source.Citation}. May import {@code unit} only.
 *
 * <p>It exists so that every formula and every row of data can say where it comes from, and reports
 * can print it.
 */
package coilwright.source;
