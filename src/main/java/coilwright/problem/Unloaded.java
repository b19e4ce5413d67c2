package coilwright.problem;

import java.util.List;
import java.util.OptionalDouble;

/** Reports loads at places at which the spring carries nothing. */
final class Unloaded {

  private Unloaded() {}

  /**
   * Reports them.
   *
   * @param form how the line runs
   * @param loads the loads
   * @param zero the place without load [mm or rad], where it is known
   */
  static void check(LineForm form, List<LoadEntry> loads, OptionalDouble zero) {
    if (zero.isEmpty()) {
      return;
    }
    double from = zero.getAsDouble();
    for (LoadEntry load : loads) {
      boolean carries =
          load.at().isEmpty() || (form.falling() ? load.place() < from : load.place() > from);
      if (!carries) {
        load.placeFault(
            "must be "
                + (form.falling() ? "below " : "above ")
                + form.zero()
                + ", "
                + form.shownPlace(from)
                + ": there the spring carries no load");
      }
    }
  }
}
