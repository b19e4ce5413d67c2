package coilwright.unit;

import java.util.List;
import java.util.Optional;

/**
 * A kind of physical quantity with the units it may be written in.
 *
 * <p>The first unit of each kind is the one used inside the program: mm, N, N/mm, N*mm, N*mm/rad,
 * MPa, rad, Hz, kg/m^3, kg and plain shares. Conversion happens only where files are read and where
 * results are written.
 */
public enum Dimension {
  /** A length; inside, mm. */
  LENGTH(
      "a length",
      new Unit("mm", 1),
      new Unit("um", 1e-3),
      new Unit("cm", 10),
      new Unit("m", 1000),
      new Unit("in", Exact.MM_PER_INCH),
      new Unit("ft", 12 * Exact.MM_PER_INCH)),
  /** A force; inside, N. */
  FORCE(
      "a force",
      new Unit("N", 1),
      new Unit("mN", 1e-3),
      new Unit("kN", 1000),
      new Unit("lbf", Exact.NEWTON_PER_LBF),
      new Unit("ozf", Exact.NEWTON_PER_LBF / 16),
      new Unit("kgf", Exact.STANDARD_GRAVITY)),
  /** A spring rate; inside, N/mm. */
  RATE(
      "a spring rate",
      new Unit("N/mm", 1),
      new Unit("N/m", 1e-3),
      new Unit("N/cm", 0.1),
      new Unit("kN/m", 1),
      new Unit("lbf/in", Exact.NEWTON_PER_LBF / Exact.MM_PER_INCH),
      new Unit("lbf/ft", Exact.NEWTON_PER_LBF / (12 * Exact.MM_PER_INCH)),
      new Unit("kgf/mm", Exact.STANDARD_GRAVITY)),
  /** A torque; inside, N mm. */
  TORQUE(
      "a torque",
      new Unit("N*mm", 1),
      new Unit("N*m", 1000),
      new Unit("lbf*in", Exact.NEWTON_PER_LBF * Exact.MM_PER_INCH),
      new Unit("lbf*ft", Exact.NEWTON_PER_LBF * 12 * Exact.MM_PER_INCH),
      new Unit("ozf*in", Exact.NEWTON_PER_LBF / 16 * Exact.MM_PER_INCH)),
  /** A torque per angle, the rate of a torsion spring; inside, N mm/rad. */
  ANGULAR_RATE(
      "a torque per angle",
      new Unit("N*mm/rad", 1),
      new Unit("N*mm/deg", 180 / Math.PI),
      new Unit("N*m/rad", 1000),
      new Unit("N*m/deg", 1000 * 180 / Math.PI),
      new Unit("lbf*in/rad", Exact.NEWTON_PER_LBF * Exact.MM_PER_INCH),
      new Unit("lbf*in/deg", Exact.NEWTON_PER_LBF * Exact.MM_PER_INCH * 180 / Math.PI),
      new Unit("lbf*in/turn", Exact.NEWTON_PER_LBF * Exact.MM_PER_INCH / (2 * Math.PI))),
  /** A stress or a modulus; inside, MPa. */
  STRESS(
      "a stress",
      new Unit("MPa", 1),
      new Unit("GPa", 1000),
      new Unit("kPa", 1e-3),
      new Unit("N/mm^2", 1),
      new Unit("psi", Exact.MPA_PER_PSI),
      new Unit("ksi", 1000 * Exact.MPA_PER_PSI),
      new Unit("Mpsi", 1e6 * Exact.MPA_PER_PSI)),
  /** A plane angle; inside, rad. */
  ANGLE("an angle", new Unit("rad", 1), new Unit("deg", Math.PI / 180)),
  /** A frequency; inside, Hz. */
  FREQUENCY("a frequency", new Unit("Hz", 1), new Unit("kHz", 1000), new Unit("1/s", 1)),
  /** A mass per volume; inside, kg/m^3. */
  DENSITY(
      "a density",
      new Unit("kg/m^3", 1),
      new Unit("g/cm^3", 1000),
      new Unit("kg/dm^3", 1000),
      new Unit(
          "lb/in^3",
          Exact.KG_PER_LB / (Exact.MM_PER_INCH * Exact.MM_PER_INCH * Exact.MM_PER_INCH) * 1e9)),
  /** A mass; inside, kg. */
  MASS(
      "a mass",
      new Unit("kg", 1),
      new Unit("g", 1e-3),
      new Unit("lb", Exact.KG_PER_LB),
      new Unit("oz", Exact.KG_PER_LB / 16)),
  /** A share of something; inside, a plain number (0.45 for 45 %). */
  SHARE("a share", new Unit("%", 0.01)),
  /** A plain number, such as a count of coils or a spring index. */
  NUMBER("a plain number", new Unit("", 1));

  private final String phrase;
  private final List<Unit> units;

  Dimension(String phrase, Unit... units) {
    this.phrase = phrase;
    this.units = List.of(units);
  }

  /** The dimension in words with its article, as messages need it: "a length". */
  public String phrase() {
    return phrase;
  }

  /** The units it may be written in, the inner one first. */
  public List<Unit> units() {
    return units;
  }

  /**
   * The unit with a symbol.
   *
   * @param symbol as written, such as "lbf/in"
   * @return the unit, or empty where this dimension has none of that symbol
   */
  public Optional<Unit> unit(String symbol) {
    return units.stream().filter(unit -> unit.symbol().equals(symbol)).findFirst();
  }

  /** Exact conversion factors of the international yard and pound agreement (1959) and SI. */
  private static final class Exact {
    static final double MM_PER_INCH = 25.4;
    static final double KG_PER_LB = 0.45359237;
    static final double STANDARD_GRAVITY = 9.80665;
    static final double NEWTON_PER_LBF = KG_PER_LB * STANDARD_GRAVITY;
    static final double MPA_PER_PSI = NEWTON_PER_LBF / (MM_PER_INCH * MM_PER_INCH);

    private Exact() {}
  }
}
