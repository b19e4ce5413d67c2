package coilwright.report;

import coilwright.limit.CoilSet;
import coilwright.problem.LimitName;
import coilwright.search.Candidate;
import coilwright.search.Conflict;
import coilwright.spring.State;
import java.io.IOException;
import java.util.Map;

/**
 * A shortlist as JSON.
 *
 * @param shortlist what it shows
 * @param <S> the state of the kind of spring
 */
record ShortlistJson<S extends State>(Shortlist<S> shortlist) implements Json.Part {

  /** The version of the output: raised when a meaning changes. */
  static final int FORMAT = 1;

  @Override
  public void writeTo(Json json) throws IOException {
    json.count("format", FORMAT);
    json.object(
        "problem", new ProblemJson(shortlist.sheet(), shortlist.problem(), shortlist.materials()));
    shortlist.sheet().writeRequired(json, shortlist.problem());
    json.object("search", this::search);
    json.array("candidates", this::candidates);
    json.array("rejected", this::rejected);
    json.array("conflicts", this::conflicts);
    json.strings("warnings", Warnings.full(Warnings.of(shortlist)));
    json.strings("cautions", Cautions.LINES);
  }

  private void search(Json json) throws IOException {
    json.count("wires", shortlist.answer().wires());
    json.count("feasible_wires", shortlist.answer().feasible().size());
    json.count("candidates", shortlist.answer().candidates());
  }

  private void candidates(Json json) throws IOException {
    for (int i = 0; i < shortlist.shown().size(); i++) {
      int rank = i + 1;
      Candidate<S> candidate = shortlist.shown().get(i);
      json.braces(
          body -> {
            body.count("rank", rank);
            CandidateJson.write(body, shortlist.sheet(), shortlist.problem(), candidate);
          });
    }
  }

  private void rejected(Json json) throws IOException {
    for (Map.Entry<LimitName, Integer> entry : shortlist.answer().ruledOut().entrySet()) {
      json.braces(
          body -> {
            body.string("limit", entry.getKey().text());
            body.count("wires", entry.getValue());
          });
    }
  }

  private void conflicts(Json json) throws IOException {
    for (Conflict conflict : shortlist.answer().conflicts()) {
      json.braces(body -> conflict(body, conflict));
    }
  }

  private void conflict(Json json, Conflict conflict) throws IOException {
    json.string("material", conflict.wire().grade().id());
    if (conflict.wire().size().series().isPresent()) {
      json.string("wire_series", conflict.wire().size().series().get().id());
    }
    json.string("wire_size", conflict.wire().size().label());
    json.string("ends", conflict.endForm());
    json.string("reason", Reasons.of(conflict, shortlist.sheet()::ends));
    json.array(
        "limits",
        list -> {
          for (Conflict.Part part : conflict.parts()) {
            list.braces(body -> part(body, part));
          }
        });
  }

  private static void part(Json json, Conflict.Part part) throws IOException {
    json.string("limit", part.limit().text());
    CoilSet coils = part.coils();
    if (coils.intervals().size() == 1 && coils.greatest() == Double.POSITIVE_INFINITY) {
      json.number("coils_min", coils.least());
    } else if (coils.intervals().size() == 1 && coils.least() == 0) {
      json.number("coils_max", coils.greatest());
    } else {
      json.array(
          "coils",
          list -> {
            for (CoilSet.Interval interval : coils.intervals()) {
              list.numbers(interval.from(), interval.to());
            }
          });
    }
  }
}
