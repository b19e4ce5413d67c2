package coilwright.report;

import coilwright.limit.Finding;
import coilwright.problem.Problem;
import coilwright.search.Candidate;
import coilwright.spring.CompressionState;
import coilwright.spring.LoadState;
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
    json.fields(CompressionFields.IDENTITY, candidate);
    json.fields(CompressionQuantities.SPRING, state);
    json.fields(CompressionFields.group(problem), state);
    json.fields(CompressionFields.BASIS, state);
    json.array("loads", this::loads);
    if (state.overtravel().isPresent()) {
      json.object(
          "overtravel", body -> body.fields(CompressionQuantities.LOAD, state.overtravel().get()));
    }
    json.object("solid", body -> body.fields(CompressionFields.SOLID, state.solid()));
    json.fields(CompressionFields.GROWTH, state);
    json.object("buckling", this::buckling);
    json.array("checks", this::checks);
    json.fields(CompressionFields.SUMMARY, candidate);
  }

  private void loads(Json json) throws IOException {
    for (LoadState load : state.loads()) {
      json.braces(body -> body.fields(CompressionQuantities.LOAD, load));
    }
  }

  /** Null says that it can never buckle; any other value that does not apply is left out. */
  private void buckling(Json json) throws IOException {
    Field<CompressionState> critical = CompressionQuantities.CRITICAL_DEFLECTION;
    if (Double.isInfinite(state.criticalDeflection())) {
      json.nothing(critical.key(OutputUnits.METRIC));
    } else {
      critical.writeTo(json, state);
    }
    CompressionFields.stable(problem).writeTo(json, state);
  }

  private void checks(Json json) throws IOException {
    for (Finding finding : candidate.findings()) {
      json.braces(body -> check(body, finding));
    }
  }

  /** One bound: its value and margin only where it can fail. */
  static void check(Json json, Finding finding) throws IOException {
    json.fields(CheckFields.NAME, finding);
    json.fields(CheckFields.FOUND, finding);
  }
}
