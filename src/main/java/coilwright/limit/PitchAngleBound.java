package coilwright.limit;

import coilwright.problem.LimitName;
import coilwright.source.Citation;
import coilwright.spring.Coil;
import coilwright.spring.CompressionState;
import coilwright.spring.EndType;
import coilwright.spring.Family;
import coilwright.unit.Dimension;

/**
 * The slope of the free coil against the greatest one.
 *
 * @param greatest the bound [rad]
 * @param source where the bound comes from
 */
record PitchAngleBound(double greatest, Citation source) implements Limit<CompressionState> {

  private static final Check CHECK =
      new Check(LimitName.PITCH_ANGLE, Side.MAX, Dimension.ANGLE, "free state");

  @Override
  public Check check() {
    return CHECK;
  }

  @Override
  public Finding judge(CompressionState state) {
    return Finding.of(CHECK, state.spring().pitchAngle(), greatest, source);
  }

  @Override
  public double expected(Family<CompressionState> family, double from, double to) {
    AlongFamily along = new AlongFamily(family);
    return ClosedForm.solve(
        coils -> Coil.pitchAngle(along.pitchAt(coils), along.meanDiameterAt(coils)),
        greatest * (1 + Finding.TOLERANCE),
        from,
        to);
  }

  /**
   * {@inheritDoc}
   *
   * <p>The pitch angle falls along a family, but for plain and ground ends it rises up to half a
   * coil: it goes with the cube root of n over n + 1. Where the lengths follow from the travel, the
   * pitch falls to the wire's and then the coil's narrowing tells.
   */
  @Override
  public double[] turns(Family<CompressionState> family) {
    AlongFamily along = new AlongFamily(family);
    if (along.lengthsOpen()) {
      return Extremes.between(
          family.fewestCoils(),
          family.mostCoils(),
          coils -> along.pitchAt(coils) / along.meanDiameterAt(coils));
    }
    boolean rises = family.endForm().equals(EndType.PLAIN_GROUND.id());
    return rises ? new double[] {0.5} : new double[0];
  }
}
