package coilwright.report;

import coilwright.problem.CompressionDesign;
import coilwright.problem.Design;
import coilwright.problem.DesignLimits;
import coilwright.problem.Problem;
import coilwright.problem.Requirement;
import coilwright.unit.Dimension;
import java.io.IOException;
import java.util.OptionalDouble;

/** What of a problem only compression springs have, as JSON. */
final class CompressionProblemJson {

  private CompressionProblemJson() {}

  /** The load line of one spring, where it is fixed. */
  static void required(Json json, Problem problem) throws IOException {
    if (problem.required().isEmpty()) {
      return;
    }
    Requirement required = problem.required().get();
    json.object(
        "required",
        body -> {
          body.number("rate_n_per_mm", required.rate());
          ProblemValues.optional(body, "free_length_mm", required.freeLength());
          body.string("rule", required.rule());
        });
  }

  /** What of a checked spring is not common to all kinds. */
  static void design(Json json, Design design) throws IOException {
    CompressionDesign spring = (CompressionDesign) design;
    json.number("active_coils", spring.coils());
    json.number("free_length_mm", spring.freeLength());
    json.string("ends", spring.ends().id());
  }

  /** The limits. */
  static void limits(Json json, DesignLimits limits) throws IOException {
    ProblemValues.band(json, "spring_index", limits.springIndex());
    ProblemValues.band(json, "active_coils", limits.activeCoils());
    ProblemValues.bound(json, "pitch_angle", "max_deg", degrees(limits.maxPitchAngle()));
    if (limits.clashAllowance().isPresent()) {
      json.number("clash_allowance", limits.clashAllowance().getAsDouble());
    } else {
      json.string("clash_allowance", limits.gapSum() ? "sum of gaps" : "none");
    }
    json.string("stress_basis", limits.method().id());
    json.string("stress_correction", limits.stressCorrection().id());
    ProblemValues.stress(json, "stress_at_load", limits.stressAtLoad());
    ProblemValues.stress(json, "stress_at_solid", limits.stressAtSolid());
    json.string("buckling", limits.buckling().id());
    ProblemValues.bound(json, "surge_frequency", "min_hz", limits.minSurgeFrequency());
  }

  private static OptionalDouble degrees(OptionalDouble angle) {
    return angle.isPresent()
        ? OptionalDouble.of(OutputUnits.plain(Dimension.ANGLE, angle.getAsDouble()))
        : angle;
  }
}
