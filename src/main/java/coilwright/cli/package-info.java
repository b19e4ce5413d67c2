/**
 * The command line: commands, options, exit statuses.
 *
 * <p>Its noun is {@link coilwright.cli.Program}, which turns arguments into a status. It may import
 * every other room; none imports it. Picocli stays in here.
 *
 * <p>It exists because a program that prints, reads standard input and ends the process cannot be
 * tested in parts: only {@code Main} exits, only {@code Terminal} and {@code WholeFile} write, and
 * everything below returns values.
 */
package coilwright.cli;
