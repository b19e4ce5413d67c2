package coilwright.report;

import coilwright.material.WireGrade;
import coilwright.material.WireSeries;
import coilwright.material.WireSize;
import coilwright.problem.Design;
import coilwright.problem.Envelope;
import coilwright.problem.Make;
import coilwright.problem.Problem;
import coilwright.spring.CoilTolerance;
import java.io.IOException;
import java.util.List;

/** The problem as it was understood: nested as in the file, defaults filled in. */
final class ProblemJson implements Json.Part {

  private final Sheet<?> sheet;
  private final Problem problem;
  private final List<String> materials;

  /**
   * Prepares the echo.
   *
   * @param sheet what is particular to the kind of spring
   * @param problem the problem
   * @param materials ids of the grades tried
   */
  ProblemJson(Sheet<?> sheet, Problem problem, List<String> materials) {
    this.sheet = sheet;
    this.problem = problem;
    this.materials = materials;
  }

  @Override
  public void writeTo(Json json) throws IOException {
    json.string("title", problem.title());
    json.string("spring", problem.kind().id());
    json.string("units", problem.units().id());
    sheet.writeLoads(json, problem);
    json.count("springs_in_parallel", problem.facts().springsInParallel());
    json.object("envelope", this::envelope);
    sheet.writeHolding(json, problem);
    if (problem.design().isPresent()) {
      json.object("design", body -> design(body, problem.design().get()));
    } else {
      json.object("make", body -> make(body, problem.make()));
    }
    json.object("limits", body -> sheet.writeLimits(body, problem));
    if (!problem.ownMaterials().isEmpty()) {
      json.array("own_materials", this::ownMaterials);
    }
    json.object("rank", this::rank);
  }

  private void envelope(Json json) throws IOException {
    Envelope space = problem.envelope();
    ProblemValues.optional(json, "bore_mm", space.bore());
    ProblemValues.optional(json, "rod_mm", space.rod());
    ProblemValues.optional(json, "diametral_clearance_mm", space.diametralClearance());
    if (space.clearanceAssumed()) {
      json.string("diametral_clearance", CoilTolerance.citation().place() + " (assumed)");
    }
    ProblemValues.optional(json, "max_outside_diameter_mm", space.maxOutsideDiameter());
    ProblemValues.optional(json, "min_inside_diameter_mm", space.minInsideDiameter());
    ProblemValues.optional(json, "max_free_length_mm", space.maxFreeLength());
    ProblemValues.optional(json, "max_solid_length_mm", space.maxSolidLength());
    sheet.writeSpace(json, problem);
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
    sheet.writeEnds(json, problem);
    json.string("hand", make.hand().id());
    sheet.writeSetRemoved(json, make.setRemoved());
    coating(json, make.coating());
    if (sheet.stepsCoils(problem)) {
      json.number("coil_step", sheet.synthesis().step(problem).size());
    }
    json.number("diameter_step_mm", make.rounding().diameterStep());
    if (sheet.roundsLength(problem)) {
      json.number("length_step_mm", make.rounding().lengthStep());
    }
  }

  private void design(Json json, Design design) throws IOException {
    json.string("material", design.material());
    json.number("wire_diameter_mm", design.wireSize().diameter());
    json.number("mean_diameter_mm", design.meanDiameter());
    sheet.writeDesign(json, design);
    json.string("hand", design.hand().id());
    sheet.writeSetRemoved(json, design.setRemoved());
    coating(json, design.coating());
  }

  private static void coating(Json json, double thickness) throws IOException {
    if (thickness > 0) {
      json.object("coating", body -> body.number("thickness_mm", thickness));
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
}
