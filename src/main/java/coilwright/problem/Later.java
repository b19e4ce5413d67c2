package coilwright.problem;

import java.util.List;

/** Keys that problem files will have, and that are not available yet. */
final class Later {

  /** What a message says of them. */
  static final String WORDS = "not available yet";

  private static final List<String> KEYS =
      List.of(
          "loading",
          "loads[].torque",
          "loads[].arm",
          "loads[].angle",
          "envelope.max_extended_length",
          "envelope.pin",
          "envelope.max_body_length",
          "make.hooks",
          "make.hook_length",
          "make.hook_bend_radius",
          "make.hook_side_radius",
          "make.loop_planes",
          "make.hook_active_coils",
          "make.legs",
          "design.initial_tension",
          "design.body_coils",
          "design.hooks",
          "design.hook_length",
          "design.hook_bend_radius",
          "design.hook_side_radius",
          "design.legs",
          "limits.initial_tension",
          "limits.stress_in_body",
          "limits.hook_bending_stress",
          "limits.hook_torsion_stress",
          "limits.bending_stress_at_load",
          "limits.rate_constant");

  private Later() {}

  /**
   * Whether a key will be available later.
   *
   * @param path its path, indices left out
   * @return true if it will
   */
  static boolean has(String path) {
    return KEYS.contains(path);
  }
}
