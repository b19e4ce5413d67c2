package coilwright.report;

import coilwright.limit.Finding;
import coilwright.rank.Cost;
import coilwright.search.Candidate;
import coilwright.spring.State;
import java.io.IOException;
import java.util.List;

/**
 * A checked spring as JSON.
 *
 * @param checked what it shows
 * @param <S> the state of the kind of spring
 */
record CheckedJson<S extends State>(Checked<S> checked) implements Json.Part {

  @Override
  public void writeTo(Json json) throws IOException {
    json.count("format", ShortlistJson.FORMAT);
    json.object(
        "problem",
        new ProblemJson(checked.sheet(), checked.problem(), List.of(checked.check().grade().id())));
    checked.sheet().writeRequired(json, checked.problem());
    json.flag("holds", checked.check().holds());
    json.object("spring", this::spring);
    json.strings("warnings", Warnings.full(Warnings.of(checked)));
    json.strings("cautions", Cautions.LINES);
  }

  private void spring(Json json) throws IOException {
    if (checked.check().spring().isPresent()) {
      Candidate<S> spring = checked.check().spring().get();
      CandidateJson.write(json, checked.sheet(), checked.problem(), spring);
      json.array("cost_terms", list -> terms(list, Cost.of(spring.state())));
    } else {
      outOfRange(json, checked.check().outOfRange().orElseThrow());
    }
  }

  private static void terms(Json json, Cost cost) throws IOException {
    for (Cost.Term term : cost.terms()) {
      json.braces(
          body -> {
            body.string("term", term.name());
            body.number("value", term.value());
          });
    }
  }

  private void outOfRange(Json json, Finding finding) throws IOException {
    json.fields(checked.sheet().design(), checked.problem().design().orElseThrow());
    json.array("checks", list -> list.braces(body -> CandidateJson.check(body, finding)));
    json.string("limiting_check", finding.check().limit().text());
  }
}
