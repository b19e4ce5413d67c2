package coilwright.report;

import coilwright.material.WireGrade;
import coilwright.material.WireSeries;
import coilwright.material.WireSize;
import coilwright.problem.Band;
import coilwright.problem.CompressionDesign;
import coilwright.problem.DesignLimits;
import coilwright.problem.Envelope;
import coilwright.problem.LoadAsked;
import coilwright.problem.Make;
import coilwright.problem.Problem;
import coilwright.problem.StressLimit;
import coilwright.problem.Tolerance;
import coilwright.spring.CoilTolerance;
import coilwright.spring.EndType;
import coilwright.unit.Dimension;
import java.io.IOException;
import java.util.List;
import java.util.OptionalDouble;

/** The problem as it was understood: nested as in the file, defaults filled in. */
final class ProblemJson implements Json.Part {

  private final Problem problem;
  private final List<String> materials;

  /**
   * Prepares the echo.
   *
   * @param problem the problem
   * @param materials ids of the grades tried
   */
  ProblemJson(Problem problem, List<String> materials) {
    this.problem = problem;
    this.materials = materials;
  }

  @Override
  public void writeTo(Json json) throws IOException {
    json.string("title", problem.title());
    json.string("spring", "compression");
    json.string("units", problem.units().id());
    loads(json);
    json.object("envelope", this::envelope);
    if (problem.seats().isPresent()) {
      json.string("seats", problem.seats().get().id());
    }
    if (problem.design().isPresent()) {
      json.object("design", body -> design(body, (CompressionDesign) problem.design().get()));
    } else {
      json.object("make", body -> make(body, problem.make()));
    }
    json.object("limits", body -> limits(body, problem.limits()));
    if (!problem.ownMaterials().isEmpty()) {
      json.array("own_materials", this::ownMaterials);
    }
    json.object("rank", this::rank);
  }

  private void loads(Json json) throws IOException {
    json.array(
        "loads",
        list -> {
          for (LoadAsked load : problem.facts().loads()) {
            list.braces(body -> load(body, load));
          }
        });
    optional(json, "rate_n_per_mm", problem.facts().rate());
    optional(json, "free_length_mm", problem.facts().freeLength());
    optional(json, "stroke_mm", problem.facts().stroke());
    if (problem.overtravel().isPresent()) {
      json.object(
          "overtravel", body -> body.number("length_mm", problem.overtravel().getAsDouble()));
    }
    json.count("springs_in_parallel", problem.facts().springsInParallel());
  }

  private static void load(Json json, LoadAsked load) throws IOException {
    optional(json, "length_mm", load.length());
    optional(json, "force_n", load.force());
    if (load.tolerance().isPresent()) {
      Tolerance tolerance = load.tolerance().get();
      json.object(
          "tolerance",
          body -> {
            body.number("plus_n", tolerance.plus());
            body.number("minus_n", tolerance.minus());
          });
    }
  }

  private void envelope(Json json) throws IOException {
    Envelope space = problem.envelope();
    optional(json, "bore_mm", space.bore());
    optional(json, "rod_mm", space.rod());
    optional(json, "diametral_clearance_mm", space.diametralClearance());
    if (space.clearanceAssumed()) {
      json.string("diametral_clearance", CoilTolerance.citation().place() + " (assumed)");
    }
    optional(json, "max_outside_diameter_mm", space.maxOutsideDiameter());
    optional(json, "min_inside_diameter_mm", space.minInsideDiameter());
    optional(json, "max_free_length_mm", space.maxFreeLength());
    optional(json, "max_solid_length_mm", space.maxSolidLength());
  }

  private void make(Json json, Make make) throws IOException {
    json.string("supply", make.supply().word());
    json.strings("materials", materials);
    if (!make.excludeMaterials().isEmpty()) {
      json.strings("exclude_materials", make.excludeMaterials());
    }
    if (!make.wireSeries().isEmpty()) {
      json.strings("wire_series", make.wireSeries().stream().map(WireSeries::id).toList());
    }
    if (!make.wireSizes().isEmpty()) {
      json.strings("wire_sizes", make.wireSizes().stream().map(WireSize::label).toList());
    }
    json.strings("ends", make.ends().stream().map(EndType::id).toList());
    json.string("hand", make.hand().id());
    json.flag("set_removed", make.setRemoved());
    coating(json, make.coating());
    json.number("coil_step", make.coilStep());
    json.number("diameter_step_mm", make.rounding().diameterStep());
    json.number("length_step_mm", make.rounding().lengthStep());
  }

  private static void design(Json json, CompressionDesign design) throws IOException {
    json.string("material", design.material());
    json.number("wire_diameter_mm", design.wireSize().diameter());
    json.number("mean_diameter_mm", design.meanDiameter());
    json.number("active_coils", design.coils());
    json.number("free_length_mm", design.freeLength());
    json.string("ends", design.ends().id());
    json.string("hand", design.hand().id());
    json.flag("set_removed", design.setRemoved());
    coating(json, design.coating());
  }

  private static void coating(Json json, double thickness) throws IOException {
    if (thickness > 0) {
      json.object("coating", body -> body.number("thickness_mm", thickness));
    }
  }

  private static void limits(Json json, DesignLimits limits) throws IOException {
    band(json, "spring_index", limits.springIndex());
    band(json, "active_coils", limits.activeCoils());
    bound(json, "pitch_angle", "max_deg", degrees(limits.maxPitchAngle()));
    if (limits.clashAllowance().isPresent()) {
      json.number("clash_allowance", limits.clashAllowance().getAsDouble());
    } else {
      json.string("clash_allowance", limits.gapSum() ? "sum of gaps" : "none");
    }
    json.string("stress_basis", limits.method().id());
    json.string("stress_correction", limits.stressCorrection().id());
    stress(json, "stress_at_load", limits.stressAtLoad());
    stress(json, "stress_at_solid", limits.stressAtSolid());
    json.string("buckling", limits.buckling().id());
    bound(json, "surge_frequency", "min_hz", limits.minSurgeFrequency());
  }

  private static OptionalDouble degrees(OptionalDouble angle) {
    return angle.isPresent()
        ? OptionalDouble.of(OutputUnits.plain(Dimension.ANGLE, angle.getAsDouble()))
        : angle;
  }

  private static void band(Json json, String key, Band band) throws IOException {
    if (band.min().isEmpty() && band.max().isEmpty()) {
      json.string(key, "none");
      return;
    }
    json.object(
        key,
        body -> {
          optional(body, "min", band.min());
          optional(body, "max", band.max());
        });
  }

  private static void bound(Json json, String key, String side, OptionalDouble bound)
      throws IOException {
    if (bound.isPresent()) {
      json.object(key, body -> body.number(side, bound.getAsDouble()));
    } else {
      json.string(key, "none");
    }
  }

  /** A share the file leaves open depends on the grade: each candidate's checks show it. */
  private static void stress(Json json, String key, StressLimit limit) throws IOException {
    if (limit.judged() && limit.share().isEmpty()) {
      json.string(key, "by grade");
    } else {
      bound(json, key, "max", limit.judged() ? limit.share() : OptionalDouble.empty());
    }
  }

  private void ownMaterials(Json json) throws IOException {
    for (WireGrade grade : problem.ownMaterials()) {
      json.braces(new OwnGradeJson(grade));
    }
  }

  private void rank(Json json) throws IOException {
    json.string("by", problem.rankBy().id());
    json.count("top", problem.top());
  }

  private static void optional(Json json, String key, OptionalDouble value) throws IOException {
    if (value.isPresent()) {
      json.number(key, value.getAsDouble());
    }
  }
}
