package coilwright.optimisers;

import coilwright.spring.Coil;
import coilwright.spring.CompressionSpring;
import coilwright.spring.CompressionState;
import coilwright.unit.Dimension;

/** Wire as the discrete benchmark reckons it: every coil a flat ring. */
final class FlatWire {

  private static final double MM_PER_INCH = Dimension.LENGTH.unit("in").orElseThrow().factor();

  private FlatWire() {}

  /** Volume of a spring's wire [in^3]. */
  static double volume(CompressionState state) {
    CompressionSpring spring = state.spring();
    double length =
        Coil.wireLength(spring.meanDiameter(), 0, spring.activeCoils(), spring.ends().deadCoils());
    double d = spring.wireDiameter();
    return Math.PI / 4 * d * d * length / (MM_PER_INCH * MM_PER_INCH * MM_PER_INCH);
  }
}
