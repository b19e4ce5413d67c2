package coilwright.report;

import coilwright.material.Wire;
import coilwright.material.WireSeries;

/** Wires in words. */
final class Wires {

  private Wires() {}

  /** The size as its series or the user writes it, with what makes it readable. */
  static String size(Wire wire) {
    String label = wire.size().label();
    return wire.size()
        .series()
        .map(series -> series == WireSeries.METRIC ? label + " mm" : "no. " + label)
        .orElse(label);
  }

  /** Size and material: "1.40 mm music-wire". */
  static String text(Wire wire) {
    return size(wire) + " " + wire.grade().id();
  }
}
