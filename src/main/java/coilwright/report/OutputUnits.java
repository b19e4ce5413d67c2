package coilwright.report;

import coilwright.problem.UnitSystem;
import coilwright.unit.Dimension;
import coilwright.unit.Unit;

/** The unit in which each kind of quantity is written, and how a key names it. */
enum OutputUnits {
  /** Millimetre, newton, gram: all JSON, and metric text and CSV. */
  METRIC,
  /** Inch, pound-force, ksi, ounce: inch text. */
  INCH,
  /** Inch, pound-force, psi, pound: inch CSV. */
  INCH_DATA;

  private final Unit[] units = new Unit[Dimension.values().length];

  /** The units of text. */
  static OutputUnits ofText(UnitSystem system) {
    return system == UnitSystem.INCH ? INCH : METRIC;
  }

  /** The units of CSV. */
  static OutputUnits ofData(UnitSystem system) {
    return system == UnitSystem.INCH ? INCH_DATA : METRIC;
  }

  /** Units are looked up when first needed: a run needs few. */
  private Unit unit(Dimension dimension) {
    Unit known = units[dimension.ordinal()];
    if (known == null) {
      known = dimension.unit(this == METRIC ? metric(dimension) : inch(dimension)).orElseThrow();
      units[dimension.ordinal()] = known;
    }
    return known;
  }

  private static String metric(Dimension dimension) {
    return switch (dimension) {
      case LENGTH -> "mm";
      case FORCE -> "N";
      case RATE -> "N/mm";
      case TORQUE -> "N*mm";
      case ANGULAR_RATE -> "N*mm/deg";
      case STRESS -> "MPa";
      case ANGLE -> "deg";
      case FREQUENCY -> "Hz";
      case DENSITY -> "kg/m^3";
      case MASS -> "g";
      case SHARE -> "%";
      case NUMBER -> "";
    };
  }

  private String inch(Dimension dimension) {
    return switch (dimension) {
      case LENGTH -> "in";
      case FORCE -> "lbf";
      case RATE -> "lbf/in";
      case TORQUE -> "lbf*in";
      case ANGULAR_RATE -> "lbf*in/deg";
      case STRESS -> this == INCH ? "ksi" : "psi";
      case DENSITY -> "lb/in^3";
      case MASS -> this == INCH ? "oz" : "lb";
      default -> metric(dimension);
    };
  }

  /** How the unit of a dimension is written; empty for plain numbers. */
  String symbol(Dimension dimension) {
    return unit(dimension).symbol();
  }

  /** From the dimension's inner unit to the one written. */
  double convert(Dimension dimension, double value) {
    return unit(dimension).fromInner(value);
  }

  /** A number with as many decimals as show the same step of it, near enough, as in metric text. */
  String fixed(Dimension dimension, double value, int metricDecimals) {
    return Numbers.fixed(convert(dimension, value), metricDecimals + finer(dimension));
  }

  /** The same, trailing zeros dropped. */
  String number(Dimension dimension, double value, int metricDecimals) {
    return Numbers.brief(convert(dimension, value), Math.max(0, metricDecimals + finer(dimension)));
  }

  /** The same with its unit: "0.063 in". */
  String brief(Dimension dimension, double value, int metricDecimals) {
    String number = number(dimension, value, metricDecimals);
    String symbol = symbol(dimension);
    return symbol.isEmpty() ? number : number + " " + symbol;
  }

  private int finer(Dimension dimension) {
    if (this == METRIC) {
      return 0;
    }
    return switch (dimension) {
      case LENGTH, FORCE, STRESS -> 1;
      case RATE -> -1;
      case MASS, TORQUE -> 2;
      case DENSITY -> 3;
      default -> 0;
    };
  }

  /** What a key ends in: "_lbf_per_in"; empty for plain numbers and shares. */
  String keySuffix(Dimension dimension) {
    return switch (dimension) {
      case SHARE, NUMBER -> "";
      case ANGLE -> "_deg";
      case FREQUENCY -> "_hz";
      case LENGTH -> this == METRIC ? "_mm" : "_in";
      case FORCE -> this == METRIC ? "_n" : "_lbf";
      case RATE -> this == METRIC ? "_n_per_mm" : "_lbf_per_in";
      case TORQUE -> this == METRIC ? "_n_mm" : "_lbf_in";
      case ANGULAR_RATE -> this == METRIC ? "_n_mm_per_deg" : "_lbf_in_per_deg";
      case STRESS -> this == METRIC ? "_mpa" : "_psi";
      case DENSITY -> this == METRIC ? "_kg_per_m3" : "_lb_per_in3";
      case MASS -> this == METRIC ? "_g" : "_lb";
    };
  }

  /** A value as its key names it; shares and numbers plain. */
  double data(Dimension dimension, double value) {
    return dimension == Dimension.SHARE ? value : convert(dimension, value);
  }

  /** The unit that such a value is in, as a check names it; "-" for plain numbers and shares. */
  String dataSymbol(Dimension dimension) {
    return dimension == Dimension.SHARE || dimension == Dimension.NUMBER ? "-" : symbol(dimension);
  }

  /** What a JSON key ends in. */
  static String suffix(Dimension dimension) {
    return METRIC.keySuffix(dimension);
  }

  /** A value as JSON writes it. */
  static double plain(Dimension dimension, double value) {
    return METRIC.data(dimension, value);
  }
}
