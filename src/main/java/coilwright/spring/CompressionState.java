package coilwright.spring;

import coilwright.material.Wire;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * A compression spring at all its loads. The numbers that several limits ask for are computed once;
 * the rest follow from them when asked.
 */
public final class CompressionState implements State {

  private final CompressionSpring spring;
  private final Duty duty;
  private final double rate;
  private final double solidLength;
  private final double correctionFactor;
  private final LoadState mostCompressed;
  private final LoadState extreme;
  private final LoadState solid;

  /**
   * Computes a spring at its loads.
   *
   * @param spring the spring
   * @param duty the loads, and how stress and stability are reckoned
   */
  public CompressionState(CompressionSpring spring, Duty duty) {
    this.spring = spring;
    this.duty = duty;
    this.rate = spring.rate();
    this.solidLength =
        duty.method()
            .solidLength(spring.ends(), spring.activeCoils(), spring.wire(), duty.coating());
    this.correctionFactor = duty.correction().at(spring.springIndex());
    this.mostCompressed = mostCompressedOf(duty);
    double overtravel = duty.overtravel().orElse(mostCompressed.length());
    this.extreme = overtravel < mostCompressed.length() ? at(overtravel) : mostCompressed;
    this.solid = at(solidLength);
  }

  private LoadState mostCompressedOf(Duty duty) {
    if (duty.shortestLength().isPresent()) {
      return at(duty.shortestLength().getAsDouble());
    }
    return duty.travel().isPresent()
        ? at(spring.freeLength() - duty.travel().get().deflection())
        : shortest(loads());
  }

  private static LoadState shortest(List<LoadState> loads) {
    LoadState shortest = loads.get(0);
    for (LoadState load : loads) {
      if (load.length() < shortest.length()) {
        shortest = load;
      }
    }
    return shortest;
  }

  /** At a length; a spring shorter than that length bears nothing. */
  private LoadState at(double length) {
    double deflection = Math.max(0, spring.freeLength() - length);
    double force = rate * deflection;
    double stress = ShearStress.uncorrected(force, spring.meanDiameter(), spring.wireDiameter());
    return new LoadState(length, force, deflection, stress, stress * correctionFactor);
  }

  /** The spring. */
  public CompressionSpring spring() {
    return spring;
  }

  @Override
  public Wire wire() {
    return spring.wire();
  }

  @Override
  public String endForm() {
    return spring.ends().id();
  }

  @Override
  public boolean ground() {
    return spring.ends().ground();
  }

  @Override
  public double coils() {
    return spring.activeCoils();
  }

  @Override
  public double mass() {
    return spring.mass();
  }

  @Override
  public double wireLength() {
    return spring.wireLength();
  }

  /** Rate R [N/mm]. */
  public double rate() {
    return rate;
  }

  /** Solid length Ls [mm]. */
  public double solidLength() {
    return solidLength;
  }

  /** The stress correction factor K [-]. */
  public double correctionFactor() {
    return correctionFactor;
  }

  /** How the ends are held. */
  public Seating seating() {
    return duty.seating();
  }

  /** The factor's author. */
  public StressCorrection correction() {
    return duty.correction();
  }

  /** The loads, in the order asked. */
  public List<LoadState> loads() {
    List<LoadState> states = new ArrayList<>(duty.loads().size());
    for (LoadPoint point : duty.loads()) {
      states.add(at(length(point)));
    }
    return states;
  }

  private double length(LoadPoint point) {
    if (point.length().isPresent()) {
      return point.length().getAsDouble();
    }
    return spring.freeLength()
        - (point.deflection().isPresent()
            ? point.deflection().getAsDouble()
            : point.force().orElseThrow() / rate);
  }

  /** The load at the shortest length. */
  public LoadState mostCompressed() {
    return mostCompressed;
  }

  /** The overtravel where one is asked beyond the loads, else the load at the shortest length. */
  public LoadState extreme() {
    return extreme;
  }

  /** The spring at the overtravel asked, or empty. */
  public Optional<LoadState> overtravel() {
    return duty.overtravel().isPresent()
        ? Optional.of(at(duty.overtravel().getAsDouble()))
        : Optional.empty();
  }

  /** The spring pressed to solid. */
  public LoadState solid() {
    return solid;
  }

  /** Travel left between the most compressed load and solid, of the deflection there [-]. */
  public double clashAllowance() {
    return travelLeft() / mostCompressed.deflection();
  }

  /** The least sum of gaps that EN 13906-1 keeps at the most compressed load [mm]. */
  public double leastGapSum() {
    return GapSum.least(spring.meanDiameter(), spring.wireDiameter(), spring.activeCoils());
  }

  /** Travel left between the most compressed load and solid [mm]. */
  public double travelLeft() {
    return mostCompressed.length() - solidLength;
  }

  /** Wire diameter over its coating [mm]. */
  public double coatedDiameter() {
    return spring.wireDiameter() + 2 * duty.coating();
  }

  /** Outside diameter over the coating when pressed to solid [mm]. */
  public double outsideDiameterAtSolid() {
    return duty.method()
        .outsideDiameterAtSolid(
            spring.meanDiameter(), spring.pitch(), spring.wireDiameter(), duty.coating());
  }

  /** Inside diameter within the coating, free [mm]. */
  public double clearInsideDiameter() {
    return spring.meanDiameter() - coatedDiameter();
  }

  /** What it was asked, and how it was reckoned. */
  public Duty duty() {
    return duty;
  }

  /** The deflection at which the spring buckles [mm]; positive infinity where it never can. */
  public double criticalDeflection() {
    return spring.criticalDeflection(duty.seating());
  }

  /**
   * Whether the spring stands at a load without buckling.
   *
   * @param load one of its loads, or solid
   * @return true if its deflection there is not above the critical one
   */
  public boolean stableAt(LoadState load) {
    return load.deflection() <= criticalDeflection();
  }
}
