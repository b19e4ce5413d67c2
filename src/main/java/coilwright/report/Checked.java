package coilwright.report;

import coilwright.problem.Problem;
import coilwright.search.CompressionCheck;

/**
 * What a check shows.
 *
 * @param problem the problem, with its design
 * @param check what was found
 */
public record Checked(Problem problem, CompressionCheck check) {}
