package coilwright.spring;

import coilwright.material.Wire;
import java.util.ArrayList;
import java.util.List;

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
    this.solidLength = spring.solidLength();
    this.correctionFactor = duty.correction().at(spring.springIndex());
    this.mostCompressed =
        duty.shortestLength().isPresent()
            ? at(duty.shortestLength().getAsDouble())
            : shortest(loads());
    this.solid = at(solidLength);
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
      states.add(
          at(
              point.length().isPresent()
                  ? point.length().getAsDouble()
                  : spring.freeLength() - point.force().orElseThrow() / rate));
    }
    return states;
  }

  /** The load at the shortest length. */
  public LoadState mostCompressed() {
    return mostCompressed;
  }

  /** The spring pressed to solid. */
  public LoadState solid() {
    return solid;
  }

  /** Travel left between the most compressed load and solid, of the deflection there [-]. */
  public double clashAllowance() {
    return (mostCompressed.length() - solidLength) / mostCompressed.deflection();
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
