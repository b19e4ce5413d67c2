package coilwright.report;

import coilwright.material.Wire;
import coilwright.material.WireSeries;
import coilwright.source.Evidence;
import coilwright.unit.Dimension;

/** Wires in words. */
final class Wires {

  private Wires() {}

  /** The size as its series or the user writes it, with what makes it readable. */
  static String size(Wire wire) {
    String label = wire.size().label();
    return wire.size().series().map(series -> inSeries(series, label)).orElse(label);
  }

  /** A number of a gauge, or a diameter where the series or its decimal sizes give one. */
  static String inSeries(WireSeries series, String label) {
    if (series == WireSeries.METRIC) {
      return label + " mm";
    }
    return label.startsWith("0.") ? label + " in" : "no. " + label;
  }

  /** The size with its diameter, where the size does not say it: "no. 24 = 1.397 mm". */
  static String sizeWithDiameter(Wire wire, OutputUnits units) {
    String size = size(wire);
    String unit = " " + units.symbol(Dimension.LENGTH);
    return size.endsWith(unit)
        ? size
        : size + " = " + units.fixed(Dimension.LENGTH, wire.diameter(), 3) + unit;
  }

  /** The material, marked where strength, moduli or size are from memory. */
  static String markedGrade(Wire wire) {
    return wire.grade().id() + (wire.evidence() == Evidence.MEMORY ? " (memory)" : "");
  }

  /** Size and material: "1.40 mm music-wire". */
  static String text(Wire wire) {
    return size(wire) + " " + wire.grade().id();
  }
}
