package coilwright.problem;

import java.util.OptionalDouble;

/**
 * The rule that some count of active coils must be left: a multiple of the step within the bounds.
 */
final class CoilStepRule {

  private CoilStepRule() {}

  /**
   * Reports a step above the greatest count.
   *
   * @param root a file for shortlist, without fault so far
   * @param step what active coils are multiples of [-]
   * @param greatest their greatest number [-]; empty for none
   */
  static void check(Section root, double step, OptionalDouble greatest) {
    if (greatest.isEmpty() || step <= greatest.getAsDouble()) {
      return;
    }
    root.read(MakeKeys.MAKE)
        .filter(make -> make.has(MakeKeys.COIL_STEP))
        .ifPresentOrElse(
            make ->
                make.spot(MakeKeys.COIL_STEP)
                    .fault(
                        make.shown(MakeKeys.COIL_STEP),
                        "must not be above the greatest number of active coils, "
                            + Range.number(greatest.getAsDouble())),
            () -> bound(root, step));
  }

  /** The step is the default; so the bound is given. */
  private static void bound(Section root, double step) {
    root.read(LimitKeys.LIMITS)
        .flatMap(limits -> limits.read(LimitKeys.ACTIVE_COILS))
        .flatMap(Setting::value)
        .ifPresent(
            coils ->
                coils
                    .spot(LimitKeys.ACTIVE_COILS_MAX)
                    .fault(
                        coils.shown(LimitKeys.ACTIVE_COILS_MAX),
                        "must not be below make.coil_step, "
                            + Range.number(step)
                            + " (the default)"));
  }
}
