package coilwright.spring;

import coilwright.material.Wire;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * An extension spring at all its loads. The numbers that several limits ask for are computed once;
 * the rest follow from them when asked.
 */
public final class ExtensionState implements State {

  /** A length this little below the free one still counts as it [-]. */
  private static final double SAME = 1e-9;

  private final ExtensionSpring spring;
  private final double initialTension;
  private final ExtensionDuty duty;
  private final Optional<ExtensionCurve> curve;
  private final double freeLength;
  private final double rate;
  private final double greatestForce;

  /**
   * Computes a spring at its loads.
   *
   * @param spring the spring
   * @param initialTension F0 [N]; below zero for a spring that cannot be made
   * @param duty the loads, and how stress is reckoned
   */
  public ExtensionState(ExtensionSpring spring, double initialTension, ExtensionDuty duty) {
    this(spring, initialTension, duty, Optional.empty());
  }

  /**
   * Computes a spring of a family at its loads.
   *
   * @param spring the spring
   * @param initialTension F0 [N]; below zero for a spring that cannot be made
   * @param duty the loads, and how stress is reckoned
   * @param curve what the family's springs have in common; empty for a spring of none
   */
  ExtensionState(
      ExtensionSpring spring,
      double initialTension,
      ExtensionDuty duty,
      Optional<ExtensionCurve> curve) {
    this.spring = spring;
    this.initialTension = initialTension;
    this.duty = duty;
    this.curve = curve;
    this.freeLength = spring.freeLength();
    this.rate = spring.rate();
    double greatest = Double.NEGATIVE_INFINITY;
    for (LoadPoint load : duty.loads()) {
      greatest = Math.max(greatest, force(load));
    }
    this.greatestForce = greatest;
  }

  private double force(LoadPoint load) {
    return load.length().isPresent()
        ? forceAt(load.length().getAsDouble())
        : load.force().orElseThrow();
  }

  private double forceAt(double length) {
    return initialTension + rate * (length - freeLength);
  }

  private double lengthUnder(double force) {
    return freeLength + (force - initialTension) / rate;
  }

  /** The spring. */
  public ExtensionSpring spring() {
    return spring;
  }

  /** What it was asked, and how it was reckoned. */
  public ExtensionDuty duty() {
    return duty;
  }

  /** What the springs of its family have in common; empty for a spring of none. */
  public Optional<ExtensionCurve> curve() {
    return curve;
  }

  @Override
  public Wire wire() {
    return spring.wire();
  }

  @Override
  public String endForm() {
    return spring.hooks().type().id();
  }

  @Override
  public double coils() {
    return spring.bodyCoils();
  }

  @Override
  public boolean ground() {
    return false;
  }

  @Override
  public EndWork endWork() {
    return EndWork.HOOK_FORMING;
  }

  @Override
  public double mass() {
    return spring.mass();
  }

  @Override
  public double wireLength() {
    return spring.wireLength();
  }

  /** Rate R once the coils have parted [N/mm]. */
  public double rate() {
    return rate;
  }

  /** Free length L0 inside the hooks [mm]. */
  public double freeLength() {
    return freeLength;
  }

  /** Initial tension F0 [N]; below zero for a spring that cannot be made. */
  public double initialTension() {
    return initialTension;
  }

  /** The torsion stress that the initial tension stands for, uncorrected [MPa]. */
  public double initialTensionStress() {
    return ShearStress.uncorrected(initialTension, spring.meanDiameter(), spring.wireDiameter());
  }

  /**
   * The least of the preferred initial tension for its index.
   *
   * @param relation whose
   * @return F0 [N]
   */
  public double leastPreferred(InitialTension relation) {
    return tension(relation.least(spring.springIndex()));
  }

  /**
   * The greatest of the preferred initial tension for its index.
   *
   * @param relation whose
   * @return F0 [N]
   */
  public double greatestPreferred(InitialTension relation) {
    return tension(relation.greatest(spring.springIndex()));
  }

  private double tension(double stress) {
    return InitialTension.force(stress, spring.meanDiameter(), spring.wireDiameter());
  }

  /** Whether its stresses are known: not where the load is beside the axis. */
  @Override
  public boolean stressAssessed() {
    return spring.hooks().type().onAxis();
  }

  /** The greatest force of its loads [N]. */
  public double greatestForce() {
    return greatestForce;
  }

  /** The force at the overtravel where one is asked beyond the loads, else the greatest [N]. */
  public double extremeForce() {
    return duty.overtravel().isPresent()
        ? Math.max(greatestForce, forceAt(duty.overtravel().getAsDouble()))
        : greatestForce;
  }

  /** The length under the greatest force of its loads [mm]. */
  public double extendedLength() {
    return lengthUnder(greatestForce);
  }

  /** The overtravel where it is beyond the loads, else the length under the greatest force [mm]. */
  public double extremeLength() {
    return Math.max(extendedLength(), duty.overtravel().orElse(Double.NEGATIVE_INFINITY));
  }

  /** The shortest length of its loads [mm]. */
  public double shortestLength() {
    double shortest = Double.POSITIVE_INFINITY;
    for (LoadPoint load : duty.loads()) {
      double length =
          load.length().isPresent()
              ? load.length().getAsDouble()
              : lengthUnder(load.force().orElseThrow());
      shortest = Math.min(shortest, length);
    }
    return shortest;
  }

  /** The loads, in the order asked. */
  public List<ExtensionLoad> loads() {
    List<ExtensionLoad> states = new ArrayList<>(duty.loads().size());
    for (LoadPoint load : duty.loads()) {
      states.add(
          load.length().isPresent()
              ? at(load.length().getAsDouble())
              : under(load.force().orElseThrow()));
    }
    return states;
  }

  /** The forces of the loads [N], in the order asked; none at a length at which it hangs slack. */
  public double[] forces() {
    double[] forces = new double[duty.loads().size()];
    for (int i = 0; i < forces.length; i++) {
      LoadPoint load = duty.loads().get(i);
      double length = load.length().orElse(Double.POSITIVE_INFINITY);
      forces[i] = length < freeLength * (1 - SAME) ? 0 : force(load);
    }
    return forces;
  }

  /** The spring at the overtravel asked, or empty. */
  public Optional<ExtensionLoad> overtravel() {
    return duty.overtravel().isPresent()
        ? Optional.of(at(duty.overtravel().getAsDouble()))
        : Optional.empty();
  }

  /** At a length; shorter than free it hangs slack and bears nothing. */
  private ExtensionLoad at(double length) {
    return length < freeLength * (1 - SAME)
        ? load(length, 0, 0)
        : load(length, forceAt(length), length - freeLength);
  }

  /** Under a force; below the initial tension its coils do not part. */
  private ExtensionLoad under(double force) {
    double length = Math.max(freeLength, lengthUnder(force));
    return load(length, force, length - freeLength);
  }

  private ExtensionLoad load(double length, double force, double deflection) {
    return new ExtensionLoad(
        length,
        force,
        deflection,
        assessed(shearStress(force)),
        assessed(correctedShearStress(force)),
        assessed(hookBendingStress(force)),
        assessed(hookTorsionStress(force)));
  }

  private double assessed(double stress) {
    return stressAssessed() ? stress : Double.NaN;
  }

  /** The uncorrected torsion stress of the body under a force on the axis [N], in MPa. */
  public double shearStress(double force) {
    return ShearStress.uncorrected(force, spring.meanDiameter(), spring.wireDiameter());
  }

  /** The corrected torsion stress of the body under a force on the axis [N], in MPa. */
  public double correctedShearStress(double force) {
    return duty.correction().at(spring.springIndex()) * shearStress(force);
  }

  /** The bending stress of a hook under a force on the axis [N], in MPa. */
  public double hookBendingStress(double force) {
    return HookStress.bending(
        force, 2 * spring.loopArm(), spring.wireDiameter(), spring.bendIndex());
  }

  /** The torsion stress of a hook under a force on the axis [N], in MPa. */
  public double hookTorsionStress(double force) {
    return HookStress.torsion(
        force, spring.meanDiameter(), spring.wireDiameter(), spring.sideIndex());
  }
}
