package coilwright.problem;

import java.util.OptionalDouble;

/**
 * The rules between the hooks of an extension spring and its load line.
 *
 * @param blocks the file
 * @param hooks the hooks
 */
record HookRules(Blocks blocks, HooksAsked hooks) {

  private static final double HALF = 0.5;

  /**
   * Reports what contradicts.
   *
   * @param line the load line
   * @param freeLength L0 inside the hooks [mm], where the file gives it
   */
  void check(LineRead line, OptionalDouble freeLength) {
    coilStep();
    boolean free = hooks.length().rule() == HookLength.Rule.FREE;
    if (freeLength.isPresent() && !free) {
      freeLengthFault(
          blocks.purpose() == Purpose.CHECK
              ? "must be left out: it follows from body and hooks of the spring to check"
              : "must be left out, or go with make.hook_length: free; else it follows from body and"
                  + " hooks");
    } else if (freeLength.isPresent()) {
      onTheLine(line, freeLength.getAsDouble());
    }
    boolean open = line.fixed().isPresent() && line.fixed().get().zero().isEmpty();
    if (free && open) {
      Section make = blocks.make().orElseThrow();
      make.spot(HookKeys.LENGTH)
          .fault(
              "free with every length left open",
              "must be natural or a length, or a load must give its length");
    }
  }

  /**
   * Reports a step of body coils that loop planes leave no choice for: hooks in one plane have
   * whole and half coils between them, hooks at a right angle a quarter or three quarters over.
   */
  private void coilStep() {
    if (blocks.make().isEmpty() || !blocks.make().get().has(MakeKeys.COIL_STEP)) {
      return;
    }
    Section make = blocks.make().get();
    double step = make.read(MakeKeys.COIL_STEP).orElse(HALF);
    Spot spot = make.spot(MakeKeys.COIL_STEP);
    if (hooks.planes() == LoopPlanes.RIGHT_ANGLE) {
      spot.fault(
          "given beside loop_planes right-angle",
          "must be left out: a quarter or three quarters of a coil follow whole ones then");
    } else if (hooks.planes() == LoopPlanes.IN_LINE && step % HALF != 0) {
      spot.fault(
          make.shown(MakeKeys.COIL_STEP) + " beside loop_planes in-line",
          "must be a multiple of 0.5: the body has whole or half coils then");
    }
  }

  private void onTheLine(LineRead line, double freeLength) {
    double shortest = Double.POSITIVE_INFINITY;
    for (LoadEntry load : line.loads()) {
      shortest = Math.min(shortest, load.at().orElse(shortest));
    }
    if (!(freeLength < shortest)) {
      freeLengthFault(
          "must be below the shortest loaded length, " + Range.number(shortest) + " mm");
    }
    double zero =
        line.fixed().isPresent()
            ? line.fixed().get().zero().orElse(freeLength)
            : Double.NEGATIVE_INFINITY;
    if (!(freeLength >= zero)) {
      freeLengthFault(
          "must be at least the "
              + Range.number(zero)
              + " mm at which the load line comes to no force: below, the initial tension would be"
              + " negative");
    }
  }

  private void freeLengthFault(String remedy) {
    ProblemKey<Double> key = LoadKeys.FREE_LENGTH_INSIDE_HOOKS;
    blocks.root().spot(key).fault(blocks.root().shown(key), remedy);
  }
}
