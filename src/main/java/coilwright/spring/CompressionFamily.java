package coilwright.spring;

import coilwright.material.Wire;
import java.util.Optional;

/**
 * The compression springs of one wire and one end type that lie on a load line.
 *
 * @param wire grade and diameter
 * @param ends how the end coils are formed
 * @param line rate and free length
 * @param duty the loads, and how stress and stability are reckoned
 * @param rounding the steps of mean diameter and free length
 */
public record CompressionFamily(
    Wire wire, EndType ends, LoadLine line, Duty duty, Rounding rounding)
    implements Family<CompressionState> {

  private static final double FEWEST_COILS = 0.01;
  private static final double TIGHTEST_INDEX = 1 + 1e-6;
  private static final double SAFETY = 1.25;
  private static final double LEAST_SLOPE = 0.02;

  @Override
  public String endForm() {
    return ends.id();
  }

  @Override
  public double fewestCoils() {
    return Math.min(FEWEST_COILS, mostCoils() / 2);
  }

  @Override
  public double mostCoils() {
    return coilsAt(TIGHTEST_INDEX * wire.diameter());
  }

  /**
   * The coil count at which the family has a mean diameter.
   *
   * @param meanDiameter D [mm]
   * @return n [-]
   */
  public double coilsAt(double meanDiameter) {
    return Rate.activeCoils(wire.shearModulus(), wire.diameter(), line.rate(), meanDiameter);
  }

  /**
   * The mean diameter that a coil count needs.
   *
   * @param coils n [-]
   * @return D [mm]
   */
  public double meanDiameterAt(double coils) {
    return Rate.meanDiameter(wire.shearModulus(), wire.diameter(), line.rate(), coils);
  }

  @Override
  public CompressionState at(double coils) {
    return state(meanDiameterAt(coils), coils, line.freeLength());
  }

  @Override
  public Optional<CompressionState> rounded(double coils) {
    double exact = meanDiameterAt(coils);
    double meanDiameter = Rounding.toStep(exact, rounding.diameterStepAt(exact));
    double freeLength = Rounding.toStep(line.freeLength(), rounding.lengthStepAt(exact));
    return meanDiameter > wire.diameter() && freeLength > 0
        ? Optional.of(state(meanDiameter, coils, freeLength))
        : Optional.empty();
  }

  private CompressionState state(double meanDiameter, double coils, double freeLength) {
    return new CompressionState(
        new CompressionSpring(wire, meanDiameter, coils, freeLength, ends), duty);
  }

  /**
   * {@inheritDoc}
   *
   * <p>Half a step of the mean diameter moves a force by 3 dD/D and a stress by little less, so
   * that twice that covers both; half a step of the free length moves a force by dL/s.
   */
  @Override
  public double roundingShare(double coils) {
    return shareAt(meanDiameterAt(coils));
  }

  private double shareAt(double meanDiameter) {
    return 6 * rounding.diameterStepAt(meanDiameter) / 2 / meanDiameter
        + 3 * rounding.lengthStepAt(meanDiameter) / 2 / greatestDeflection();
  }

  /**
   * {@inheritDoc}
   *
   * <p>Along the family a stress goes with K D, and D with the cube root of n: a share of stress is
   * that share over the slope of K D, in coils. A length moves the coils that fit it by dL/d.
   */
  @Override
  public double play(double coils) {
    double meanDiameter = meanDiameterAt(coils);
    double fitting = rounding.lengthStepAt(meanDiameter) / 2 / wire.diameter();
    return SAFETY * (coils * shareAt(meanDiameter) / slope(meanDiameter) + fitting);
  }

  private double greatestDeflection() {
    return line.freeLength() - duty.shortestLength().orElseThrow();
  }

  /** d ln(K D) / d ln D with the factor (4C + 2)/(4C - 3), kept away from zero. */
  private double slope(double meanDiameter) {
    double c = meanDiameter / wire.diameter();
    return Math.max(LEAST_SLOPE, Math.abs(1 + 4 * c / (4 * c + 2) - 4 * c / (4 * c - 3)));
  }
}
