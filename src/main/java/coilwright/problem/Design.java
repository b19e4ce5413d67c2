package coilwright.problem;

import coilwright.material.WireSize;
import coilwright.spring.Hand;

/** The one spring that a check judges. */
public sealed interface Design permits CompressionDesign, ExtensionDesign, TorsionDesign {

  /** Id of its grade, catalogue's or own. */
  String material();

  /** Its wire. */
  WireSize wireSize();

  /** Mean diameter D when free [mm]. */
  double meanDiameter();

  /** Active coils of a compression spring, body coils of the other kinds [-]. */
  double coils();

  /** Direction of winding. */
  Hand hand();

  /** Whether it was pressed solid once before use; only a compression spring can be. */
  default boolean setRemoved() {
    return false;
  }

  /** Thickness of what covers the wire [mm], zero for bare wire. */
  double coating();
}
