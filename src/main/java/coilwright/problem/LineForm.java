package coilwright.problem;

import coilwright.unit.Dimension;

/**
 * How the straight load line of a kind of spring runs, and how messages speak of it: its places are
 * lengths or angles, its loads forces or torques.
 */
enum LineForm {
  /** Force rises as the length falls. */
  COMPRESSION("length", "force", "the free length", "a shorter length needs a greater force"),
  /** Force rises with the length; at the free length it is the initial tension. */
  EXTENSION(
      "length",
      "force",
      "the length at which the load line comes to no force",
      "a longer length needs a greater force"),
  /** Torque rises with the angle. */
  CLOSING("angle", "torque", "the free angle", "closing, a greater angle needs a greater torque"),
  /** Torque rises as the angle falls. */
  OPENING("angle", "torque", "the free angle", "opening, a smaller angle needs a greater torque");

  private final String place;
  private final String load;
  private final String zero;
  private final String order;

  LineForm(String place, String load, String zero, String order) {
    this.place = place;
    this.load = load;
    this.zero = zero;
    this.order = order;
  }

  /** The word for where a load acts: length or angle. */
  String place() {
    return place;
  }

  /** The word for a load: force or torque. */
  String load() {
    return load;
  }

  /** The place without load, in words. */
  String zero() {
    return zero;
  }

  /** Which place needs the greater load, in words. */
  String order() {
    return order;
  }

  /** Whether the load rises as the place falls. */
  boolean falling() {
    return this == COMPRESSION || this == OPENING;
  }

  /** Whether places are angles, which have no sign of their own. */
  boolean turning() {
    return this == CLOSING || this == OPENING;
  }

  /** Whether the place without load is that of the free spring. */
  boolean startsFree() {
    return this != EXTENSION;
  }

  /**
   * A place as messages show it.
   *
   * @param inner in mm or rad
   */
  String shownPlace(double inner) {
    return shown(inner, turning() ? Dimension.ANGLE : Dimension.LENGTH, turning() ? "deg" : "mm");
  }

  /**
   * A load as messages show it.
   *
   * @param inner in N or N mm
   */
  String shownLoad(double inner) {
    return Range.number(inner) + (turning() ? " N*mm" : " N");
  }

  /**
   * A rate as messages show it.
   *
   * @param inner in N/mm or N mm/rad
   */
  String shownRate(double inner) {
    return turning()
        ? shown(inner, Dimension.ANGULAR_RATE, "N*mm/deg")
        : shown(inner, Dimension.RATE, "N/mm");
  }

  private static String shown(double inner, Dimension dimension, String unit) {
    return Range.number(dimension.unit(unit).orElseThrow().fromInner(inner)) + " " + unit;
  }
}
