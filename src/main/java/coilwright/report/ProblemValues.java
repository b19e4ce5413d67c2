package coilwright.report;

import coilwright.problem.Band;
import coilwright.problem.LoadAsked;
import coilwright.problem.LoadFacts;
import coilwright.problem.Problem;
import coilwright.problem.StressLimit;
import coilwright.problem.Tolerance;
import java.io.IOException;
import java.util.OptionalDouble;

/** Writes the values of a problem file's keys that several kinds of spring have. */
final class ProblemValues {

  private ProblemValues() {}

  /** Loads of force against length, the other facts about their line, and the overtravel. */
  static void loads(Json json, Problem problem) throws IOException {
    LoadFacts facts = problem.facts();
    json.array(
        "loads",
        list -> {
          for (LoadAsked load : facts.loads()) {
            list.braces(body -> load(body, load));
          }
        });
    optional(json, "rate_n_per_mm", facts.rate());
    optional(json, "free_length_mm", facts.freeLength());
    optional(json, "stroke_mm", facts.stroke());
    if (problem.overtravel().isPresent()) {
      json.object(
          "overtravel", body -> body.number("length_mm", problem.overtravel().getAsDouble()));
    }
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

  /** A band; none where neither end is given. */
  static void band(Json json, String key, Band band) throws IOException {
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

  /** A bound; none where there is none. */
  static void bound(Json json, String key, String side, OptionalDouble bound) throws IOException {
    if (bound.isPresent()) {
      json.object(key, body -> body.number(side, bound.getAsDouble()));
    } else {
      json.string(key, "none");
    }
  }

  /** A share the file leaves open depends on the grade: each candidate's checks show it. */
  static void stress(Json json, String key, StressLimit limit) throws IOException {
    if (limit.judged() && limit.share().isEmpty()) {
      json.string(key, "by grade");
    } else {
      bound(json, key, "max", limit.judged() ? limit.share() : OptionalDouble.empty());
    }
  }

  /** A number where it is given. */
  static void optional(Json json, String key, OptionalDouble value) throws IOException {
    if (value.isPresent()) {
      json.number(key, value.getAsDouble());
    }
  }
}
