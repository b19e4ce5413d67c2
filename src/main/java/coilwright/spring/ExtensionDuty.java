package coilwright.spring;

import coilwright.unit.Require;
import java.util.List;
import java.util.OptionalDouble;

/**
 * What an extension spring is asked to do, and how its stress is reckoned.
 *
 * @param loads the loads of one spring, in the order they are reported; at least one
 * @param correction which factor corrects the stress of the body
 * @param overtravel a length inside the hooks it must survive beyond its loads [mm], or empty
 */
public record ExtensionDuty(
    List<LoadPoint> loads, StressCorrection correction, OptionalDouble overtravel) {

  /** Refuses a duty without loads, and an overtravel that is not positive and finite. */
  public ExtensionDuty {
    loads = List.copyOf(loads);
    if (loads.isEmpty()) {
      throw new IllegalArgumentException("loads: none; at least one is needed");
    }
    overtravel.ifPresent(length -> Require.positive(length, "overtravel", "mm"));
  }
}
