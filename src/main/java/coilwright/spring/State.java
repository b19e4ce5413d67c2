package coilwright.spring;

import coilwright.material.Wire;

/** Every number of one spring at all its loads, whatever its kind. */
public interface State {

  /** The wire it is made of. */
  Wire wire();

  /** How its ends are formed, as it stands in ids and output: an end type or a hook. */
  String endForm();

  /** The coil count that varies along its family: active coils, or body coils [-]. */
  double coils();

  /** Whether its ends are ground. */
  boolean ground();

  /** What is done to its ends after coiling. */
  default EndWork endWork() {
    return ground() ? EndWork.GRINDING : EndWork.NONE;
  }

  /**
   * Whether its stresses are known; where they are not, it is no match for springs held to them.
   */
  default boolean stressAssessed() {
    return true;
  }

  /** Mass [kg]. */
  double mass();

  /** Developed wire length [mm]. */
  double wireLength();

  /**
   * Whether springs of one wire that differ in their coil count alone hardly differ in mass, so
   * that mass is no reason to prefer one of them.
   */
  default boolean massHardlyVaries() {
    return false;
  }
}
