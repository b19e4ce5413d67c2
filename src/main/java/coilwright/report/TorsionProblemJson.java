package coilwright.report;

import coilwright.problem.Design;
import coilwright.problem.LegsAsked;
import coilwright.problem.Problem;
import coilwright.problem.Tolerance;
import coilwright.problem.TorqueAsked;
import coilwright.problem.TorqueLine;
import coilwright.problem.TorsionAsked;
import coilwright.unit.Dimension;
import java.io.IOException;
import java.util.List;
import java.util.OptionalDouble;

/** What of a problem only torsion springs have, as JSON. */
final class TorsionProblemJson {

  /** What is left to say of one whose grade has no data for its wire. */
  static final List<Field<Design>> DESIGN =
      List.of(
          Word.users("material", Design::material),
          Word.users("wire_size", design -> design.wireSize().label()),
          Quantities.of(
              "wire_diameter", "", Dimension.LENGTH, 3, design -> design.wireSize().diameter()),
          Quantities.of("mean_diameter", "", Dimension.LENGTH, 3, Design::meanDiameter),
          Quantities.number("body_coils", "", 3, Design::coils));

  private TorsionProblemJson() {}

  /** The load line of one spring, where it is fixed. */
  static void required(Json json, TorsionAsked asked) throws IOException {
    if (asked.line().isEmpty()) {
      return;
    }
    TorqueLine line = asked.line().get();
    json.object(
        "required",
        body -> {
          number(body, "rate", Dimension.ANGULAR_RATE, OptionalDouble.of(line.rate()));
          number(body, "free_angle", Dimension.ANGLE, line.freeAngle());
          body.string("rule", line.rule());
        });
  }

  /** Which way they go, the loads, and the other facts about their line. */
  static void loads(Json json, TorsionAsked asked) throws IOException {
    json.string("loading", asked.closing() ? "closing" : "opening");
    json.array(
        "loads",
        list -> {
          for (TorqueAsked load : asked.loads()) {
            list.braces(body -> load(body, load));
          }
        });
    number(json, "rate", Dimension.ANGULAR_RATE, asked.facts().rate());
    number(json, "free_angle", Dimension.ANGLE, asked.facts().freeAngle());
    number(json, "stroke", Dimension.ANGLE, asked.facts().stroke());
  }

  private static void load(Json json, TorqueAsked load) throws IOException {
    number(json, "angle", Dimension.ANGLE, load.point().angle());
    number(json, "torque", Dimension.TORQUE, load.point().torque());
    if (load.tolerance().isPresent()) {
      Tolerance tolerance = load.tolerance().get();
      json.object(
          "tolerance",
          body -> {
            body.number("plus_n_mm", tolerance.plus());
            body.number("minus_n_mm", tolerance.minus());
          });
    }
  }

  /** The legs. */
  static void legs(Json json, LegsAsked legs) throws IOException {
    json.object(
        "legs",
        body -> {
          body.number("first_mm", legs.first());
          body.number("second_mm", legs.second());
          number(body, "angle", Dimension.ANGLE, legs.angle());
          if (legs.angle().isPresent()) {
            body.count("at_load", legs.atLoad());
          }
        });
  }

  /** The limits. */
  static void limits(Json json, Problem problem) throws IOException {
    ProblemValues.band(json, "spring_index", problem.limits().springIndex());
    ProblemValues.band(json, "active_coils", problem.limits().activeCoils());
    json.string("stress_basis", problem.limits().method().id());
    TorsionAsked asked = problem.torsion().orElseThrow();
    ProblemValues.stress(json, "bending_stress_at_load", asked.bendingStress());
    json.number("rate_constant", asked.rateConstant());
  }

  private static void number(Json json, String stem, Dimension dimension, OptionalDouble value)
      throws IOException {
    if (value.isPresent()) {
      json.number(
          stem + OutputUnits.suffix(dimension), OutputUnits.plain(dimension, value.getAsDouble()));
    }
  }
}
