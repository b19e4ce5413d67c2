package coilwright.problem;

import java.util.OptionalDouble;

/**
 * The rules between the hooks of an extension spring and its load line.
 *
 * @param blocks the file
 * @param hooks the hooks
 */
record HookRules(Blocks blocks, HooksAsked hooks) {

  /**
   * Reports what contradicts.
   *
   * @param line the load line
   * @param freeLength L0 inside the hooks [mm], where the file gives it
   */
  void check(LineRead line, OptionalDouble freeLength) {
    boolean free = hooks.length().rule() == HookLength.Rule.FREE;
    if (freeLength.isPresent() && !free) {
      freeLengthFault(
          "must be left out, or go with make.hook_length: free; else it follows from body and"
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
