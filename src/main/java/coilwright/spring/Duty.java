package coilwright.spring;

import coilwright.unit.Require;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** What a compression spring is asked to do, and how its stress and stability are reckoned. */
public final class Duty {

  private final List<LoadPoint> loads;
  private final StressCorrection correction;
  private final Seating seating;
  private final Method method;
  private final double coating;
  private final OptionalDouble overtravel;
  private final Optional<Travel> travel;
  private final OptionalDouble shortestLength;

  /**
   * A duty of a bare wire by the handbooks' method, with nothing beyond its loads.
   *
   * @param loads the loads of one spring, in the order they are reported; at least one
   * @param correction which factor corrects the stress
   * @param seating how the ends are held
   * @throws IllegalArgumentException if there is no load
   */
  public Duty(List<LoadPoint> loads, StressCorrection correction, Seating seating) {
    this(loads, correction, seating, Method.HANDBOOK, 0, OptionalDouble.empty(), Optional.empty());
  }

  /**
   * A duty.
   *
   * @param loads the loads of one spring, in the order they are reported; at least one
   * @param correction which factor corrects the stress
   * @param seating how the ends are held
   * @param method whose conventions apply
   * @param coating thickness of the wire's coating [mm], zero for none
   * @param overtravel a length it must survive beyond its loads [mm], or empty
   * @param travel what the free length follows from, where the lengths are left open
   * @throws IllegalArgumentException if there is no load, or a length is not positive and finite
   */
  public Duty(
      List<LoadPoint> loads,
      StressCorrection correction,
      Seating seating,
      Method method,
      double coating,
      OptionalDouble overtravel,
      Optional<Travel> travel) {
    if (loads.isEmpty()) {
      throw new IllegalArgumentException("loads: none; at least one is needed");
    }
    this.loads = List.copyOf(loads);
    this.correction = correction;
    this.seating = seating;
    this.method = method;
    this.coating = Require.notNegative(coating, "coating", "mm");
    this.overtravel = overtravel;
    this.travel = travel;
    this.shortestLength = shortest(this.loads);
    overtravel.ifPresent(length -> Require.positive(length, "overtravel", "mm"));
  }

  private static OptionalDouble shortest(List<LoadPoint> loads) {
    double shortest = Double.POSITIVE_INFINITY;
    for (LoadPoint load : loads) {
      if (load.length().isEmpty()) {
        return OptionalDouble.empty();
      }
      shortest = Math.min(shortest, load.length().getAsDouble());
    }
    return OptionalDouble.of(shortest);
  }

  /** The loads of one spring, in the order they are reported. */
  public List<LoadPoint> loads() {
    return loads;
  }

  /** Which factor corrects the stress. */
  public StressCorrection correction() {
    return correction;
  }

  /** How the ends are held. */
  public Seating seating() {
    return seating;
  }

  /** Whose conventions apply. */
  public Method method() {
    return method;
  }

  /** Thickness of the wire's coating [mm], zero for none. */
  public double coating() {
    return coating;
  }

  /** A length it must survive beyond its loads [mm], or empty. */
  public OptionalDouble overtravel() {
    return overtravel;
  }

  /** What the free length follows from, where the lengths are left open. */
  public Optional<Travel> travel() {
    return travel;
  }

  /** The shortest length asked [mm]; empty where some load gives no length. */
  public OptionalDouble shortestLength() {
    return shortestLength;
  }

  /** The same where nothing need be kept before solid. */
  Duty keepingNothing() {
    return new Duty(
        loads,
        correction,
        seating,
        method,
        coating,
        overtravel,
        travel.map(Travel::keepingNothing));
  }
}
