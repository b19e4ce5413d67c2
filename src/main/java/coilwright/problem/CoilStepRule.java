package coilwright.problem;

import coilwright.spring.Kind;
import java.util.Optional;
import java.util.OptionalDouble;

/** The rules about the step of the coil count: some count must be left, and one rule decides it. */
final class CoilStepRule {

  private CoilStepRule() {}

  /**
   * Reports a step above the greatest count.
   *
   * @param blocks a file for shortlist, without fault so far
   * @param step what active or body coils are multiples of [-]
   * @param greatest their greatest number [-]; empty for none
   */
  static void check(Blocks blocks, double step, OptionalDouble greatest) {
    if (greatest.isEmpty() || step <= greatest.getAsDouble()) {
      return;
    }
    String coils = blocks.kind() == Kind.COMPRESSION ? "active coils" : "body coils";
    blocks
        .make()
        .filter(make -> make.has(MakeKeys.COIL_STEP))
        .ifPresentOrElse(
            make ->
                make.spot(MakeKeys.COIL_STEP)
                    .fault(
                        make.shown(MakeKeys.COIL_STEP),
                        "must not be above the greatest number of "
                            + coils
                            + ", "
                            + Range.number(greatest.getAsDouble())),
            () -> bound(blocks, step));
  }

  /** The step is the default; so the bound is given. */
  private static void bound(Blocks blocks, double step) {
    blocks
        .limits()
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

  /**
   * Reports a step beside legs whose angle fixes the fraction of a coil.
   *
   * @param make what may be made
   * @param legs the legs
   */
  static void besideLegs(Optional<Section> make, LegsAsked legs) {
    if (legs.angle().isPresent() && make.isPresent() && make.get().has(MakeKeys.COIL_STEP)) {
      make.get()
          .spot(MakeKeys.COIL_STEP)
          .fault(
              "given beside legs.angle",
              "must be left out: the leg angle fixes the fraction of a coil beyond whole ones");
    }
  }
}
