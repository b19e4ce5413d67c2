package coilwright.material;

import coilwright.source.Evidence;
import coilwright.unit.Require;
import java.util.Optional;

/**
 * A diameter that wire is drawn to.
 *
 * @param series the series it belongs to; empty for a size given explicitly
 * @param label how the series or the user writes it: "1.40", "24", "0.063 in"
 * @param diameter d [mm]
 * @param evidence whether the size was seen in a publication or is remembered
 */
public record WireSize(
    Optional<WireSeries> series, String label, double diameter, Evidence evidence) {

  /** Refuses a diameter that is not positive and finite. */
  public WireSize {
    Require.positive(diameter, "wire diameter", "mm");
  }

  /**
   * A size given in a problem file.
   *
   * @param label as typed
   * @param diameter d [mm]
   * @return the size, in no series
   */
  public static WireSize explicit(String label, double diameter) {
    return new WireSize(Optional.empty(), label, diameter, Evidence.SEEN);
  }
}
