package coilwright.report;

import coilwright.limit.CoilSet;
import coilwright.problem.LimitName;
import coilwright.problem.Requirement;
import coilwright.search.Conflict;
import java.io.IOException;
import java.util.Map;

/** A shortlist as JSON. */
final class ShortlistJson {

  /** The version of the output: raised when a meaning changes. */
  static final int FORMAT = 1;

  private final Shortlist shortlist;

  private ShortlistJson(Shortlist shortlist) {
    this.shortlist = shortlist;
  }

  /** Writes a shortlist. */
  static String of(Shortlist shortlist) {
    return Json.document(new ShortlistJson(shortlist)::writeTo);
  }

  private void writeTo(Json json) throws IOException {
    json.count("format", FORMAT);
    json.object("problem", new ProblemJson(shortlist.problem(), shortlist.materials()));
    required(json, shortlist.problem().required().orElseThrow());
    json.object("search", this::search);
    json.array("candidates", this::candidates);
    json.array("rejected", this::rejected);
    json.array("conflicts", this::conflicts);
    json.strings("warnings", Warnings.full(Warnings.of(shortlist)));
    json.strings("cautions", Cautions.LINES);
  }

  /** The load line of one spring. */
  static void required(Json json, Requirement required) throws IOException {
    json.object(
        "required",
        body -> {
          body.number("rate_n_per_mm", required.rate());
          if (required.freeLength().isPresent()) {
            body.number("free_length_mm", required.freeLength().getAsDouble());
          }
          body.string("rule", required.rule());
        });
  }

  private void search(Json json) throws IOException {
    json.count("wires", shortlist.answer().wires());
    json.count("feasible_wires", shortlist.answer().feasible().size());
    json.count("candidates", shortlist.answer().candidates());
  }

  private void candidates(Json json) throws IOException {
    for (int i = 0; i < shortlist.shown().size(); i++) {
      int rank = i + 1;
      CandidateJson candidate = new CandidateJson(shortlist.shown().get(i), shortlist.problem());
      json.braces(
          body -> {
            body.count("rank", rank);
            candidate.writeTo(body);
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

  private static void conflict(Json json, Conflict conflict) throws IOException {
    json.string("material", conflict.wire().grade().id());
    if (conflict.wire().size().series().isPresent()) {
      json.string("wire_series", conflict.wire().size().series().get().id());
    }
    json.string("wire_size", conflict.wire().size().label());
    json.string("ends", conflict.endForm());
    json.string("reason", Reasons.of(conflict));
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
