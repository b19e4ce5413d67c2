package coilwright.report;

import coilwright.limit.Finding;
import coilwright.problem.Problem;
import coilwright.search.Candidate;
import coilwright.spring.State;
import java.io.IOException;

/** A spring with its checks as JSON. */
final class CandidateJson {

  private CandidateJson() {}

  /** Everything but the rank. */
  static <S extends State> void write(
      Json json, Sheet<S> sheet, Problem problem, Candidate<S> candidate) throws IOException {
    json.fields(SpringFields.IDENTITY, candidate);
    for (SpringPart<S> part : sheet.parts(problem)) {
      part.writeTo(json, candidate.state());
    }
    json.array(
        "checks",
        list -> {
          for (Finding finding : candidate.findings()) {
            list.braces(body -> check(body, finding));
          }
        });
    json.fields(SpringFields.SUMMARY, candidate);
  }

  /** One bound: its value and margin only where it can fail. */
  static void check(Json json, Finding finding) throws IOException {
    json.fields(CheckFields.NAME, finding);
    json.fields(CheckFields.FOUND, finding);
  }
}
