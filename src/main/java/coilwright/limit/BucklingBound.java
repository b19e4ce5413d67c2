package coilwright.limit;

import coilwright.problem.LimitName;
import coilwright.spring.Buckling;
import coilwright.spring.CompressionSpring;
import coilwright.spring.CompressionState;
import coilwright.spring.Family;
import coilwright.spring.Seating;
import coilwright.unit.Dimension;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/** Deflection against the deflection at which the spring would buckle. */
final class BucklingBound implements Limit<CompressionState> {

  private static final Check AT_LOAD =
      new Check(
          LimitName.BUCKLING,
          Side.MAX,
          Dimension.LENGTH,
          "deflection at the most compressed load, against the critical deflection");
  private static final Check AT_OVERTRAVEL =
      new Check(
          LimitName.BUCKLING,
          Side.MAX,
          Dimension.LENGTH,
          "deflection at the most compressed load, overtravel included, against the critical"
              + " deflection");
  private static final Check AT_SOLID =
      new Check(
          LimitName.BUCKLING,
          Side.MAX,
          Dimension.LENGTH,
          "deflection at solid, against the critical deflection");

  private static final int MOST_EVALUATIONS = 200;

  private final boolean atSolid;
  private final Check check;

  /**
   * A bound.
   *
   * @param atSolid whether it is held at solid, or else at the most compressed load
   * @param overtravel whether there is an overtravel beyond the loads
   */
  BucklingBound(boolean atSolid, boolean overtravel) {
    this.atSolid = atSolid;
    this.check = atSolid ? AT_SOLID : overtravel ? AT_OVERTRAVEL : AT_LOAD;
  }

  @Override
  public Check check() {
    return check;
  }

  @Override
  public Finding judge(CompressionState state) {
    double critical = state.criticalDeflection();
    if (critical == Double.POSITIVE_INFINITY) {
      return Finding.cannotFail(check, Buckling.CITATION);
    }
    double deflection = (atSolid ? state.solid() : state.extreme()).deflection();
    return Finding.of(check, deflection, critical, Buckling.CITATION);
  }

  /**
   * {@inheritDoc}
   *
   * <p>Up to some coil count the coil is wide enough never to buckle. Beyond it the deflection that
   * the loads ask stays and the critical one falls; but the deflection to solid falls too, so that
   * its ratio to the critical one first rises, then falls to zero. Where the lengths follow from
   * the travel the spring grows longer as the coil grows narrower: once it can buckle it can do so
   * ever more easily.
   */
  @Override
  public double[] turns(Family<CompressionState> family) {
    AlongFamily along = new AlongFamily(family);
    double wide =
        along.lengthsOpen()
            ? stableUpTo(along, family)
            : along.coilsAt(alwaysStable(along.any(), along.any().spring().freeLength()));
    double justBeyond = wide * (1 + 1e-9);
    double solid = along.coilsSolidWhenFree();
    if (!atSolid || along.lengthsOpen() || !(solid > justBeyond)) {
      return new double[] {wide, justBeyond};
    }
    return new double[] {wide, justBeyond, worst(along, justBeyond, solid), solid};
  }

  @Override
  public double expected(Family<CompressionState> family, double from, double to) {
    AlongFamily along = new AlongFamily(family);
    return ClosedForm.solve(coils -> share(along, coils), 1 + Finding.TOLERANCE, from, to);
  }

  /** Deflection over the critical one; zero where the spring can never buckle. */
  private double share(AlongFamily along, double coils) {
    double deflection = atSolid ? along.deflectionToSolid(coils) : along.deflectionAtExtreme(coils);
    CompressionSpring spring = along.any().spring();
    return deflection
        / Buckling.criticalDeflection(
            along.meanDiameterAt(coils),
            along.freeLengthAt(coils),
            along.any().seating().factor(),
            spring.wire().shearModulus(),
            spring.wire().elasticModulus());
  }

  /** The coil count up to which the coil is wide enough never to buckle. */
  private static double stableUpTo(AlongFamily along, Family<CompressionState> family) {
    UnivariateFunction tooNarrow =
        coils -> alwaysStable(along.any(), along.freeLengthAt(coils)) - along.meanDiameterAt(coils);
    double few = family.fewestCoils();
    double many = family.mostCoils();
    if (!(tooNarrow.value(few) < 0 && tooNarrow.value(many) > 0)) {
      return tooNarrow.value(few) < 0 ? many : few;
    }
    return new BrentSolver(1e-14, 1e-14).solve(MOST_EVALUATIONS, tooNarrow, few, many);
  }

  private static double alwaysStable(CompressionState state, double freeLength) {
    return Buckling.alwaysStableMeanDiameter(
        freeLength,
        state.seating().factor(),
        state.wire().shearModulus(),
        state.wire().elasticModulus());
  }

  private static double worst(AlongFamily along, double from, double to) {
    CompressionSpring spring = along.any().spring();
    Seating seating = along.any().seating();
    return new BrentOptimizer(1e-6, 1e-9)
        .optimize(
            new MaxEval(200),
            GoalType.MAXIMIZE,
            new SearchInterval(from, to),
            new UnivariateObjectiveFunction(
                coils ->
                    along.deflectionToSolid(coils)
                        / Buckling.criticalDeflection(
                            along.meanDiameterAt(coils),
                            spring.freeLength(),
                            seating.factor(),
                            spring.wire().shearModulus(),
                            spring.wire().elasticModulus())))
        .getPoint();
  }
}
