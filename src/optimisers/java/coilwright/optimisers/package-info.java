/**
 * The search against general-purpose optimisers, on equal terms: every method asks the same judge,
 * which is the program's own limits. Built and run only by the profile {@code optimisers}.
 */
package coilwright.optimisers;
