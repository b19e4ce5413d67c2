package coilwright.spring;

import java.util.List;
import java.util.OptionalDouble;

/** What a compression spring is asked to do, and how its stress and stability are reckoned. */
public final class Duty {

  private final List<LoadPoint> loads;
  private final StressCorrection correction;
  private final Seating seating;
  private final OptionalDouble shortestLength;

  /**
   * A duty.
   *
   * @param loads the loads of one spring, in the order they are reported; at least one
   * @param correction which factor corrects the stress
   * @param seating how the ends are held
   * @throws IllegalArgumentException if there is no load
   */
  public Duty(List<LoadPoint> loads, StressCorrection correction, Seating seating) {
    if (loads.isEmpty()) {
      throw new IllegalArgumentException("loads: none; at least one is needed");
    }
    this.loads = List.copyOf(loads);
    this.correction = correction;
    this.seating = seating;
    this.shortestLength =
        loads.stream().allMatch(load -> load.length().isPresent())
            ? loads.stream().mapToDouble(load -> load.length().getAsDouble()).min()
            : OptionalDouble.empty();
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

  /** The shortest length asked [mm]; empty where some load gives only its force. */
  public OptionalDouble shortestLength() {
    return shortestLength;
  }
}
