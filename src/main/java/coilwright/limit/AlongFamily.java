package coilwright.limit;

import coilwright.spring.CompressionState;
import coilwright.spring.Family;

/**
 * What is known of a compression family without computing its springs one by one: the mean diameter
 * goes with the cube root of 1/n, and the solid length grows by a wire for each coil.
 */
final class AlongFamily {

  private final CompressionState end;

  AlongFamily(Family<CompressionState> family) {
    this.end = family.at(family.mostCoils());
  }

  /** The coil count at which the mean diameter is D [mm]. */
  double coilsAt(double meanDiameter) {
    double ratio = end.spring().meanDiameter() / meanDiameter;
    return end.coils() * ratio * ratio * ratio;
  }

  /** The mean diameter [mm] at a coil count. */
  double meanDiameterAt(double coils) {
    return end.spring().meanDiameter() * StrictMath.cbrt(end.coils() / coils);
  }

  /** The coil count at which the spring index is C [-]. */
  double coilsAtIndex(double springIndex) {
    return coilsAt(springIndex * end.spring().wireDiameter());
  }

  /**
   * Deflection from free to solid [mm] at a coil count; zero where the coils do not even fit free.
   */
  double deflectionToSolid(double coils) {
    return Math.max(
        0,
        end.spring().freeLength()
            - end.spring().ends().solidLength(coils, end.spring().wireDiameter()));
  }

  /** The coil count at which the coils touch when free [-]. */
  double coilsSolidWhenFree() {
    double d = end.spring().wireDiameter();
    return (end.spring().freeLength() - end.spring().ends().solidLength(0, d)) / d;
  }

  /**
   * What the corrected stress at solid is proportional to: deflection times factor times index
   * [mm].
   */
  double stressAtSolid(double coils) {
    double index = meanDiameterAt(coils) / end.spring().wireDiameter();
    return deflectionToSolid(coils) * end.correction().at(index) * index;
  }

  /** Any spring of the family, for what all have in common. */
  CompressionState any() {
    return end;
  }
}
