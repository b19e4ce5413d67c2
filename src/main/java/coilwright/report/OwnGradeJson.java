package coilwright.report;

import coilwright.material.DiameterRow;
import coilwright.material.PowerLaw;
import coilwright.material.StepTable;
import coilwright.material.WireGrade;
import coilwright.problem.Like;
import java.io.IOException;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A grade that the file defines, as it was understood. A strength or modulus stands as a file may
 * give it: a number, {a, m} of a/d^m with d in mm, or steps. What was taken from the other grade in
 * another form, as a table to interpolate or a formula, is left to {@code like}.
 */
final class OwnGradeJson implements Json.Part {

  private final WireGrade grade;

  OwnGradeJson(WireGrade grade) {
    this.grade = grade;
  }

  @Override
  public void writeTo(Json json) throws IOException {
    json.string("id", grade.id());
    Optional<String> like = Like.of(grade);
    if (like.isPresent()) {
      json.string("like", like.get());
    }
    law(json, "tensile_strength_mpa", grade.strength(), "strength_mpa");
    json.object(
        "diameters",
        range -> {
          range.number("min_mm", grade.diameters().min());
          range.number("max_mm", grade.diameters().max());
        });
    law(json, "shear_modulus_mpa", grade.shearModulus(), "modulus_mpa");
    law(json, "elastic_modulus_mpa", grade.elasticModulus(), "modulus_mpa");
    json.number("density_kg_per_m3", grade.density());
    json.number("cost_index", grade.costIndex());
    share(json, "stress_at_load", grade.stressAtLoad());
    share(json, "stress_at_solid", grade.stressAtSolid());
  }

  private static void law(Json json, String key, Object law, String step) throws IOException {
    if (law instanceof PowerLaw power) {
      json.object(
          key,
          body -> {
            body.number("a", power.a());
            body.number("m", power.m());
          });
    } else if (law instanceof StepTable table) {
      steps(json, key, table.rows(), step);
    }
  }

  private static void steps(Json json, String key, List<DiameterRow> rows, String step)
      throws IOException {
    if (rows.size() == 1 && rows.get(0).diameter() == Double.POSITIVE_INFINITY) {
      json.number(key, rows.get(0).value());
      return;
    }
    json.array(
        key,
        list -> {
          for (DiameterRow row : rows) {
            list.braces(
                body -> {
                  body.number("up_to_mm", row.diameter());
                  body.number(step, row.value());
                });
          }
        });
  }

  private static void share(Json json, String key, OptionalDouble share) throws IOException {
    if (share.isPresent()) {
      json.number(key, share.getAsDouble());
    }
  }
}
