package coilwright.report;

import coilwright.unit.Dimension;
import coilwright.unit.Unit;
import java.util.EnumMap;
import java.util.Map;
import java.util.function.Function;

/** The unit in which each kind of quantity is written, and how a key names it. */
enum OutputUnits {
  /** Millimetre, newton, gram: all JSON, and metric text. */
  METRIC(OutputUnits::metric);

  private final Map<Dimension, Unit> units = new EnumMap<>(Dimension.class);

  OutputUnits(Function<Dimension, String> symbols) {
    for (Dimension dimension : Dimension.values()) {
      units.put(dimension, dimension.unit(symbols.apply(dimension)).orElseThrow());
    }
  }

  private static String metric(Dimension dimension) {
    return switch (dimension) {
      case LENGTH -> "mm";
      case FORCE -> "N";
      case RATE -> "N/mm";
      case STRESS -> "MPa";
      case ANGLE -> "deg";
      case FREQUENCY -> "Hz";
      case DENSITY -> "kg/m^3";
      case MASS -> "g";
      case SHARE -> "%";
      case NUMBER -> "";
    };
  }

  /** How the unit of a dimension is written; empty for plain numbers. */
  String symbol(Dimension dimension) {
    return units.get(dimension).symbol();
  }

  /** From the dimension's inner unit to the one written. */
  double convert(Dimension dimension, double value) {
    return units.get(dimension).fromInner(value);
  }

  /** What a key ends in: "_n_per_mm"; empty for plain numbers and shares. */
  static String suffix(Dimension dimension) {
    return switch (dimension) {
      case LENGTH -> "_mm";
      case FORCE -> "_n";
      case RATE -> "_n_per_mm";
      case STRESS -> "_mpa";
      case ANGLE -> "_deg";
      case FREQUENCY -> "_hz";
      case DENSITY -> "_kg_per_m3";
      case MASS -> "_g";
      case SHARE, NUMBER -> "";
    };
  }

  /** A value as JSON writes it: in the unit its key names; shares and numbers plain. */
  static double plain(Dimension dimension, double value) {
    return dimension == Dimension.SHARE ? value : METRIC.convert(dimension, value);
  }

  /** The unit that a JSON value is in, as a check names it; "-" for plain numbers and shares. */
  static String plainSymbol(Dimension dimension) {
    return dimension == Dimension.SHARE || dimension == Dimension.NUMBER
        ? "-"
        : METRIC.symbol(dimension);
  }
}
