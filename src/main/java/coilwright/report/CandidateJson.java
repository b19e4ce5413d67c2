package coilwright.report;

import coilwright.limit.Finding;
import coilwright.material.Wire;
import coilwright.problem.BucklingRule;
import coilwright.problem.Problem;
import coilwright.search.Candidate;
import coilwright.spring.CompressionState;
import coilwright.spring.LoadState;
import coilwright.unit.Dimension;
import java.io.IOException;

/** A compression spring with its checks as JSON. */
final class CandidateJson {

  private final Candidate<CompressionState> candidate;
  private final CompressionState state;
  private final Problem problem;

  CandidateJson(Candidate<CompressionState> candidate, Problem problem) {
    this.candidate = candidate;
    this.state = candidate.state();
    this.problem = problem;
  }

  /** Everything but the rank. */
  void writeTo(Json json) throws IOException {
    identity(json);
    for (Quantity<CompressionState> quantity : CompressionQuantities.SPRING) {
      json.number(quantity.key(), quantity.plain(state));
    }
    int parallel = problem.facts().springsInParallel();
    if (parallel > 1) {
      json.number("group_mass_g", OutputUnits.plain(Dimension.MASS, state.mass() * parallel));
    }
    json.string("data", state.wire().evidence().word());
    json.string("seats", state.seating().id());
    json.array("loads", this::loads);
    if (state.overtravel().isPresent()) {
      json.object("overtravel", body -> load(body, state.overtravel().get()));
    }
    json.object("solid", this::solid);
    json.number(
        "outside_diameter_at_solid_mm",
        OutputUnits.plain(Dimension.LENGTH, state.outsideDiameterAtSolid()));
    json.object("buckling", this::buckling);
    json.array("checks", this::checks);
    if (candidate.leastMargin().isPresent()) {
      json.number("least_margin", candidate.leastMargin().getAsDouble());
    }
    if (candidate.limiting().isPresent()) {
      json.string("limiting_check", candidate.limiting().get().check().limit().text());
    }
  }

  private void identity(Json json) throws IOException {
    Wire wire = state.wire();
    json.string("id", CompressionQuantities.id(candidate));
    json.string("material", wire.grade().id());
    if (wire.size().series().isPresent()) {
      json.string("wire_series", wire.size().series().get().id());
    }
    json.string("wire_size", wire.size().label());
    json.string("ends", state.endForm());
  }

  private void loads(Json json) throws IOException {
    for (LoadState load : state.loads()) {
      json.braces(body -> load(body, load));
    }
  }

  private static void load(Json json, LoadState load) throws IOException {
    for (Quantity<LoadState> quantity : CompressionQuantities.LOAD) {
      json.number(quantity.key(), quantity.plain(load));
    }
  }

  private void solid(Json json) throws IOException {
    json.number("force_n", state.solid().force());
    json.number("shear_stress_mpa", state.solid().shearStress());
    json.number("corrected_shear_stress_mpa", state.solid().correctedShearStress());
  }

  private void buckling(Json json) throws IOException {
    double critical = state.criticalDeflection();
    if (Double.isFinite(critical)) {
      json.number("critical_deflection_mm", critical);
    } else {
      json.nothing("critical_deflection_mm");
    }
    boolean atSolid = problem.limits().buckling() == BucklingRule.AT_SOLID;
    json.flag("stable", state.stableAt(atSolid ? state.solid() : state.extreme()));
  }

  private void checks(Json json) throws IOException {
    for (Finding finding : candidate.findings()) {
      json.braces(body -> check(body, finding));
    }
  }

  /** One bound: its value and margin only where it can fail. */
  static void check(Json json, Finding finding) throws IOException {
    Dimension dimension = finding.check().dimension();
    json.string("limit", finding.check().limit().text());
    json.string("side", finding.check().side().id());
    json.number("value", OutputUnits.plain(dimension, finding.value()));
    json.number("bound", OutputUnits.plain(dimension, finding.bound()));
    json.string("unit", OutputUnits.plainSymbol(dimension));
    json.string("definition", finding.check().definition());
    if (finding.hasMargin()) {
      json.number("margin", finding.margin());
    } else if (finding.canFail()) {
      json.number("slack", OutputUnits.plain(dimension, finding.slack()));
    }
    json.flag("holds", finding.holds());
    json.string("source", finding.source().text());
  }
}
