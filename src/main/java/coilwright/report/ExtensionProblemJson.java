package coilwright.report;

import coilwright.problem.Design;
import coilwright.problem.ExtensionAsked;
import coilwright.problem.ExtensionDesign;
import coilwright.problem.HookLength;
import coilwright.problem.HooksAsked;
import coilwright.problem.Problem;
import coilwright.problem.TensionLine;
import coilwright.spring.HookType;
import java.io.IOException;

/** What of a problem only extension springs have, as JSON. */
final class ExtensionProblemJson {

  private ExtensionProblemJson() {}

  /** The load line of one spring, where it is fixed. */
  static void required(Json json, ExtensionAsked asked) throws IOException {
    if (asked.line().isEmpty()) {
      return;
    }
    TensionLine line = asked.line().get();
    json.object(
        "required",
        body -> {
          body.number("rate_n_per_mm", line.rate());
          ProblemValues.optional(body, "zero_force_length_mm", line.zeroForceLength());
          body.string("rule", line.rule());
        });
  }

  /** The hooks that may be made. */
  static void hooks(Json json, HooksAsked hooks) throws IOException {
    json.strings("hooks", hooks.types().stream().map(HookType::id).toList());
    shape(json, hooks);
    json.string("loop_planes", hooks.planes().id());
  }

  private static void shape(Json json, HooksAsked hooks) throws IOException {
    HookLength length = hooks.length();
    switch (length.rule()) {
      case NATURAL -> json.string("hook_length", "natural");
      case FREE -> json.string("hook_length", "free");
      case GIVEN -> json.number("hook_length_mm", length.given().orElseThrow());
    }
    json.number("hook_bend_radius", hooks.bendRadius());
    json.number("hook_side_radius", hooks.sideRadius());
    ProblemValues.optional(json, "hook_active_coils", hooks.activeCoils());
  }

  /** What of a checked spring is not common to all kinds. */
  static void design(Json json, Design design) throws IOException {
    ExtensionDesign spring = (ExtensionDesign) design;
    json.number("body_coils", spring.coils());
    json.number("initial_tension_n", spring.initialTension());
    json.string("hooks", spring.hooks().types().get(0).id());
    shape(json, spring.hooks());
  }

  /** The limits. */
  static void limits(Json json, Problem problem) throws IOException {
    ExtensionAsked asked = problem.extension().orElseThrow();
    ProblemValues.band(json, "spring_index", problem.limits().springIndex());
    ProblemValues.band(json, "active_coils", problem.limits().activeCoils());
    json.string("initial_tension", asked.preferredTension() ? "preferred" : "any");
    json.string("stress_basis", problem.limits().method().id());
    json.string("stress_correction", problem.limits().stressCorrection().id());
    ProblemValues.stress(json, "stress_in_body", asked.stressInBody());
    ProblemValues.stress(json, "hook_bending_stress", asked.hookBending());
    ProblemValues.stress(json, "hook_torsion_stress", asked.hookTorsion());
    ProblemValues.bound(json, "surge_frequency", "min_hz", problem.limits().minSurgeFrequency());
  }
}
