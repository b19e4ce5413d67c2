package coilwright.spring;

import coilwright.published.Published;
import coilwright.published.Published.Column;
import coilwright.unit.Dimension;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/**
 * The benchmark of the lightest tension or compression spring, in the laws of this room: wire
 * diameter d, mean diameter D and coils N of least (N + 2) D d^2 that bear a force with a least
 * deflection, a greatest shear stress, a least natural frequency and a greatest outside diameter.
 *
 * @param shearModulus G [MPa]
 * @param stress allowable shear stress [MPa]
 * @param density rho [kg/m^3]
 * @param directShear what the numerator of the second term of the stress factor has beyond 0.615
 *     [-]
 */
public record WeightBenchmark(
    double shearModulus, double stress, double density, double directShear) {

  /** The force [N]. */
  public static final double FORCE = Dimension.FORCE.unit("lbf").orElseThrow().toInner(10);

  /** The least deflection [mm]. */
  public static final double DEFLECTION = inch(0.5);

  /** The least frequency [Hz]. */
  public static final double FREQUENCY = 100;

  private static final double WIDEST = inch(constant("outside diameter"));
  private static final double DEAD_COILS = 2;
  private static final double MM_PER_M = 1000;
  private static final double PASCAL_PER_MPA = 1e6;

  /**
   * A spring of the benchmark.
   *
   * @param wireDiameter d [mm]
   * @param meanDiameter D [mm]
   * @param coils N [-]
   */
  public record Design(double wireDiameter, double meanDiameter, double coils) {

    /** A spring given in inches. */
    public static Design inInches(double wireDiameter, double meanDiameter, double coils) {
      return new Design(inch(wireDiameter), inch(meanDiameter), coils);
    }

    private double index() {
      return meanDiameter / wireDiameter;
    }
  }

  /**
   * The benchmark as handbooks would have it: 11.5 Mpsi, 80 000 psi, 0.285 lb/in^3, Wahl's factor.
   */
  public static WeightBenchmark handbook() {
    return new WeightBenchmark(
        Dimension.STRESS.unit("Mpsi").orElseThrow().toInner(11.5),
        psi(80_000),
        Dimension.DENSITY.unit("lb/in^3").orElseThrow().toInner(0.285),
        0);
  }

  /**
   * The benchmark as it is printed: the properties and the factor that its constants come to.
   *
   * <p>71785 = G 0.5 in/(8 F), 12566 = pi S/(2 F), 5108 = pi S/(8 F k) where Wahl has k = 0.615,
   * and 140.45 in = sqrt(G/(2 rho))/(2 pi 100 Hz).
   */
  public static WeightBenchmark printed() {
    double modulus = psi(constant("deflection") * 8 * 10 / 0.5);
    double allowable = psi(constant("stress") * 2 * 10 / Math.PI);
    double speed = 2 * Math.PI * FREQUENCY * inch(constant("surge")) / MM_PER_M;
    return new WeightBenchmark(
        modulus,
        allowable,
        modulus * PASCAL_PER_MPA / (2 * speed * speed),
        constant("stress") / (4 * constant("direct shear")) - 0.615);
  }

  /** The same with Wahl's factor as it is. */
  public WeightBenchmark withWahl() {
    return new WeightBenchmark(shearModulus, stress, density, 0);
  }

  /** What is to be least: wire volume over pi^2/4, every coil taken for flat [in^3]. */
  public double weight(Design design) {
    double d = design.wireDiameter;
    double length = Coil.wireLength(design.meanDiameter, 0, design.coils, DEAD_COILS);
    double cubicMetres = Mass.ofWire(density, d, length) / density;
    double inches = cubicMetres * 1e9 / (inch(1) * inch(1) * inch(1));
    return inches / (Math.PI * Math.PI / 4);
  }

  /** The four limits, each met where it is not above zero, in the benchmark's order [-]. */
  public double[] limits(Design design) {
    double d = design.wireDiameter;
    double dia = design.meanDiameter;
    double rate = Rate.of(shearModulus, d, dia, design.coils);
    double frequency = Surge.firstFrequency(d, dia, design.coils, shearModulus, density);
    return new double[] {
      1 - FORCE / rate / DEFLECTION,
      stressUnderForce(design) / stress - 1,
      1 - frequency / FREQUENCY,
      (d + dia) / WIDEST - 1
    };
  }

  private double stressUnderForce(Design design) {
    double factor = StressCorrection.WAHL.at(design.index()) + directShear / design.index();
    return ShearStress.uncorrected(FORCE, design.meanDiameter, design.wireDiameter) * factor;
  }

  /**
   * The lightest spring, by solving: for each wire the widest coil that the stress allows and the
   * fewest coils that deflect enough, then the wire of least weight.
   *
   * <p>With N as D^-3, (N + 2) D falls as D grows while N is above one, so that of one wire no
   * spring is lighter.
   */
  public Design optimum() {
    double d =
        new BrentOptimizer(1e-10, 1e-14)
            .optimize(
                new MaxEval(1000),
                GoalType.MINIMIZE,
                new UnivariateObjectiveFunction(wire -> weight(of(wire))),
                new SearchInterval(inch(0.05), inch(0.07)))
            .getPoint();
    return of(d);
  }

  /** The lightest spring of a wire [mm], from 0.05 to 0.07 in. */
  public Design of(double wireDiameter) {
    double dia =
        new BrentSolver(1e-15, 1e-13)
            .solve(
                1000,
                trial -> limits(new Design(wireDiameter, trial, 1))[1],
                2 * wireDiameter,
                WIDEST);
    double coils = Rate.activeCoils(shearModulus, wireDiameter, FORCE / DEFLECTION, dia);
    return new Design(wireDiameter, dia, coils);
  }

  /** A printed constant. */
  static double constant(String quantity) {
    return Published.rows("weight-benchmark/constants.csv")
        .filter(row -> row.text(Column.QUANTITY).equals(quantity))
        .mapToDouble(row -> row.number(Column.VALUE))
        .findFirst()
        .orElseThrow();
  }

  private static double inch(double value) {
    return Dimension.LENGTH.unit("in").orElseThrow().toInner(value);
  }

  private static double psi(double value) {
    return Dimension.STRESS.unit("psi").orElseThrow().toInner(value);
  }
}
