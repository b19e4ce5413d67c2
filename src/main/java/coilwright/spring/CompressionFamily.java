package coilwright.spring;

import coilwright.material.Wire;
import coilwright.unit.Require;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The compression springs of one wire and one end type that have a rate, and either lie on one load
 * line or, where the lengths are left open, are each as short as the travel allows.
 *
 * @param wire grade and diameter
 * @param ends how the end coils are formed
 * @param rate R [N/mm]
 * @param freeLength L0 [mm]; empty where it follows from the duty's travel
 * @param duty the loads, and how stress and stability are reckoned
 * @param rounding the steps of mean diameter and free length
 */
public record CompressionFamily(
    Wire wire, EndType ends, double rate, OptionalDouble freeLength, Duty duty, Rounding rounding)
    implements Family<CompressionState> {

  private static final double FEWEST_COILS = 0.01;
  private static final double TIGHTEST_INDEX = 1 + 1e-6;
  private static final double SAFETY = 1.25;
  private static final double LEAST_SLOPE = 0.02;

  /** Refuses a family whose free length is neither given nor follows from a travel. */
  public CompressionFamily {
    Require.positive(rate, "rate", "N/mm");
    if (freeLength.isPresent() == duty.travel().isPresent()) {
      throw new IllegalArgumentException("free length: must be given or follow from the travel");
    }
  }

  /**
   * The springs on one load line.
   *
   * @param wire grade and diameter
   * @param ends how the end coils are formed
   * @param line rate and free length
   * @param duty the loads, and how stress and stability are reckoned
   * @param rounding the steps of mean diameter and free length
   */
  public CompressionFamily(Wire wire, EndType ends, LoadLine line, Duty duty, Rounding rounding) {
    this(wire, ends, line.rate(), OptionalDouble.of(line.freeLength()), duty, rounding);
  }

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
    return coilsAt(TIGHTEST_INDEX * coatedDiameter());
  }

  /**
   * The coil count at which the family has a mean diameter.
   *
   * @param meanDiameter D [mm]
   * @return n [-]
   */
  public double coilsAt(double meanDiameter) {
    return Rate.activeCoils(wire.shearModulus(), wire.diameter(), rate, meanDiameter);
  }

  /**
   * The mean diameter that a coil count needs.
   *
   * @param coils n [-]
   * @return D [mm]
   */
  public double meanDiameterAt(double coils) {
    return Rate.meanDiameter(wire.shearModulus(), wire.diameter(), rate, coils);
  }

  @Override
  public CompressionState at(double coils) {
    double meanDiameter = meanDiameterAt(coils);
    return state(meanDiameter, coils, freeLengthAt(meanDiameter, coils));
  }

  @Override
  public Optional<CompressionState> rounded(double coils) {
    double exact = meanDiameterAt(coils);
    double meanDiameter = Rounding.toStep(exact, rounding.diameterStepAt(exact));
    if (!(meanDiameter > coatedDiameter())) {
      return Optional.empty();
    }
    double step = rounding.lengthStepAt(exact);
    double length =
        freeLength.isPresent()
            ? Rounding.toStep(freeLength.getAsDouble(), step)
            : Rounding.upToStep(freeLengthAt(meanDiameter, coils), step);
    return length > 0 ? Optional.of(state(meanDiameter, coils, length)) : Optional.empty();
  }

  private double coatedDiameter() {
    return wire.diameter() + 2 * duty.coating();
  }

  /** The free length given, or the shortest that the travel allows [mm]. */
  private double freeLengthAt(double meanDiameter, double coils) {
    if (freeLength.isPresent()) {
      return freeLength.getAsDouble();
    }
    return duty.method().solidLength(ends, coils, wire, duty.coating())
        + duty.travel().orElseThrow().toSolid(meanDiameter, wire.diameter(), coils);
  }

  @Override
  public Family<CompressionState> keepingNothing() {
    return freeLength.isPresent()
        ? this
        : new CompressionFamily(wire, ends, rate, freeLength, duty.keepingNothing(), rounding);
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
    double moved = rounding.lengthStepAt(meanDiameter) * (freeLength.isPresent() ? 0.5 : 1);
    double fitting = moved / wire.diameter();
    return SAFETY * (coils * shareAt(meanDiameter) / slope(meanDiameter) + fitting);
  }

  private double greatestDeflection() {
    return freeLength.isPresent()
        ? freeLength.getAsDouble() - duty.shortestLength().orElseThrow()
        : duty.travel().orElseThrow().deflection();
  }

  /** d ln(K D) / d ln D with the factor (4C + 2)/(4C - 3), kept away from zero. */
  private double slope(double meanDiameter) {
    double c = meanDiameter / wire.diameter();
    return Math.max(LEAST_SLOPE, Math.abs(1 + 4 * c / (4 * c + 2) - 4 * c / (4 * c - 3)));
  }
}
