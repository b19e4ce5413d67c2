package coilwright.spring;

import java.util.List;

/**
 * What a compression spring is asked to do, and how its stress and stability are reckoned.
 *
 * @param loads the loads of one spring, in the order they are reported; at least one
 * @param correction which factor corrects the stress
 * @param seating how the ends are held
 */
public record Duty(List<LoadPoint> loads, StressCorrection correction, Seating seating) {

  /** Copies the list and refuses an empty one. */
  public Duty {
    loads = List.copyOf(loads);
    if (loads.isEmpty()) {
      throw new IllegalArgumentException("loads: none; at least one is needed");
    }
  }
}
