package coilwright.problem;

/** The names of the design limits, as they stand in every output. */
public enum LimitName {
  /** Stress at the greatest load. */
  STRESS_AT_LOAD("stress at load", true),
  /** Stress with the coils pressed together. */
  STRESS_AT_SOLID("stress at solid", true),
  /** Mean diameter over wire diameter. */
  SPRING_INDEX("spring index", true),
  /** Number of active coils. */
  ACTIVE_COILS("active coils", true),
  /** Active coils are multiples of this. */
  COIL_STEP("coil step", true),
  /** Slope of the unloaded coil. */
  PITCH_ANGLE("pitch angle", true),
  /** Clearance to the hole, grown by compression. */
  BORE("bore", true),
  /** Clearance to the shaft. */
  ROD("rod", true),
  /** Nominal outside diameter. */
  OUTSIDE_DIAMETER("outside diameter", true),
  /** Nominal inside diameter. */
  INSIDE_DIAMETER("inside diameter", true),
  /** Unloaded length. */
  FREE_LENGTH("free length", true),
  /** Length with the coils pressed together. */
  SOLID_LENGTH("solid length", true),
  /** Travel left before solid. */
  CLASH_ALLOWANCE("clash allowance", true),
  /** A load at which the coils would already touch, or a pitch below the wire. */
  BEYOND_SOLID("beyond solid", false),
  /** Sideways stability. */
  BUCKLING("buckling", true),
  /** First natural frequency. */
  SURGE_FREQUENCY("surge frequency", true),
  /** Force that holds the coils of an extension spring together. */
  INITIAL_TENSION("initial tension", true),
  /** Torsion stress in the body of an extension spring. */
  BODY_STRESS("body stress", true),
  /** Bending stress at the crown of a hook. */
  HOOK_BENDING_STRESS("hook bending stress", true),
  /** Torsion stress at the bend from the body into a hook. */
  HOOK_TORSION_STRESS("hook torsion stress", true),
  /** Hooks that are by themselves softer than the rate asked. */
  HOOKS("hooks", false),
  /** How far a hook can reach beyond the body. */
  HOOK_LENGTH("hook length", false),
  /** Length of an extension spring at its greatest load. */
  EXTENDED_LENGTH("extended length", true),
  /** A pin that must pass the hook. */
  PIN("pin", true),
  /** Bending stress of a torsion spring. */
  BENDING_STRESS("bending stress", true),
  /** Clearance of the wound-up coil to the shaft in it. */
  ARBOR("arbor", true),
  /** Length of a torsion spring's body at its greatest torque. */
  BODY_LENGTH("body length", true),
  /** Angle between the legs at a load. */
  LEG_ANGLE("leg angle", true),
  /** Legs that are by themselves softer than the rate asked. */
  LEGS("legs", false),
  /** Loads after rounding against the loads asked. */
  NOMINAL_LOAD("nominal load", false),
  /** Diameters for which the grade has data. */
  WIRE_RANGE("wire range", false);

  private final String text;
  private final boolean removable;

  LimitName(String text, boolean removable) {
    this.text = text;
    this.removable = removable;
  }

  /** The name in output, lower case with spaces. */
  public String text() {
    return text;
  }

  /** Whether a designer may drop it; physical facts may not be. */
  public boolean removable() {
    return removable;
  }
}
