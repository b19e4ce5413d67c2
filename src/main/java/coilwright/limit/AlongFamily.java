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
    return Math.max(0, freeLengthAt(coils) - solidLengthAt(coils));
  }

  /** The free length [mm] at a coil count: the same for all, unless it follows from the travel. */
  double freeLengthAt(double coils) {
    return end.duty().travel().isPresent()
        ? solidLengthAt(coils)
            + end.duty()
                .travel()
                .get()
                .toSolid(meanDiameterAt(coils), end.spring().wireDiameter(), coils)
        : end.spring().freeLength();
  }

  /** The pitch [mm] at a coil count. */
  double pitchAt(double coils) {
    return end.spring().ends().pitch(freeLengthAt(coils), end.spring().wireDiameter(), coils);
  }

  private double solidLengthAt(double coils) {
    return end.duty()
        .method()
        .solidLength(end.spring().ends(), coils, end.wire(), end.duty().coating());
  }

  /**
   * The coil count at which the coils touch when free [-]; positive infinity where the free length
   * grows with the coils.
   */
  double coilsSolidWhenFree() {
    double none = solidLengthAt(0);
    return lengthsOpen()
        ? Double.POSITIVE_INFINITY
        : (end.spring().freeLength() - none) / (solidLengthAt(1) - none);
  }

  /** Whether the lengths follow from the travel. */
  boolean lengthsOpen() {
    return end.duty().travel().isPresent();
  }

  /**
   * What a stress at some deflection is proportional to: deflection times factor times index [mm].
   */
  double stress(double coils, double deflection, StressMeaning meaning) {
    double index = meanDiameterAt(coils) / end.spring().wireDiameter();
    return deflection * meaning.factor(end.correction(), index) * index;
  }

  /** The stress [MPa] at some deflection [mm]. */
  double shearStress(double coils, double deflection, StressMeaning meaning) {
    double wire = end.spring().wireDiameter();
    return 8 * end.rate() / (Math.PI * wire * wire) * stress(coils, deflection, meaning);
  }

  /** The deflection of the extreme load [mm]. */
  double deflectionAtExtreme(double coils) {
    if (!lengthsOpen()) {
      return end.extreme().deflection();
    }
    double asked = end.duty().travel().orElseThrow().deflection();
    double overtravel = end.duty().overtravel().orElse(Double.POSITIVE_INFINITY);
    return Math.max(asked, freeLengthAt(coils) - overtravel);
  }

  /** Any spring of the family, for what all have in common. */
  CompressionState any() {
    return end;
  }
}
