/**
 * Results as text, JSON and CSV.
 *
 * <p>Its nouns are {@link coilwright.report.Shortlist} and {@link coilwright.report.Checked}, what
 * a command shows. It may import {@code rank} and the rooms below it, and the writer of JSON; it
 * returns strings and prints nothing.
 *
 * <p>It exists because rounding, units of text and the names of quantities are for readers: nothing
 * below it rounds for show.
 */
package coilwright.report;
