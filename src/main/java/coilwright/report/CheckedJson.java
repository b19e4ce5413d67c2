package coilwright.report;

import coilwright.limit.Finding;
import coilwright.problem.CompressionDesign;
import coilwright.rank.Cost;
import coilwright.search.Candidate;
import coilwright.spring.CompressionState;
import java.io.IOException;
import java.util.List;

/** A checked spring as JSON. */
final class CheckedJson {

  private final Checked checked;

  private CheckedJson(Checked checked) {
    this.checked = checked;
  }

  /** Writes a check. */
  static String of(Checked checked) {
    return Json.document(new CheckedJson(checked)::writeTo);
  }

  private void writeTo(Json json) throws IOException {
    json.count("format", ShortlistJson.FORMAT);
    json.object(
        "problem", new ProblemJson(checked.problem(), List.of(checked.check().grade().id())));
    if (checked.problem().required().isPresent()) {
      ShortlistJson.required(json, checked.problem().required().get());
    }
    json.flag("holds", checked.check().holds());
    json.object("spring", this::spring);
    json.strings("warnings", Warnings.full(Warnings.of(checked)));
    json.strings("cautions", Cautions.LINES);
  }

  private void spring(Json json) throws IOException {
    if (checked.check().spring().isPresent()) {
      Candidate<CompressionState> spring = checked.check().spring().get();
      new CandidateJson(spring, checked.problem()).writeTo(json);
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
    CompressionDesign design = (CompressionDesign) checked.problem().design().orElseThrow();
    json.fields(DesignFields.ALL, design);
    json.array("checks", list -> list.braces(body -> CandidateJson.check(body, finding)));
    json.string("limiting_check", finding.check().limit().text());
  }
}
